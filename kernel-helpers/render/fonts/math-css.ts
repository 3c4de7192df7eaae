import { fontFace, packageFile } from "./font-file.js";

interface FaceOfRule {
  /** Each entry is one selector's classes; the face is needed if all of one entry occur. */
  readonly classes: readonly (readonly string[])[];
  readonly family: string;
  readonly isBold: boolean;
  readonly isItalic: boolean;
}

const always: readonly FaceOfRule[] = [
  { classes: [[]], family: "KaTeX_Main", isBold: false, isItalic: false },
];

/**
 * The style sheet of the equations on a page (its HTML), with the faces inlined that they use; empty
 * for a page without any.
 */
export function mathCss({ covering }: { covering: string }): string {
  if (!covering.includes(`class="katex"`)) return "";
  const { rules, faces, files } = styleSheet();
  const present = new Set<string>();
  for (const match of covering.matchAll(/class="([^"]*)"/g))
    for (const name of (match[1] ?? "").split(/\s+/)) present.add(name);
  const needed = new Set<string>();
  for (const face of [...always, ...faces])
    if (face.classes.some((all) => all.every((name) => present.has(name))))
      needed.add(faceKey(face));
  const inlined = [...files]
    .filter(([key]) => needed.has(key))
    .map(([key, file]) => {
      const [family = "", weight, style] = key.split(" ");
      return fontFace({
        family,
        weight: weight === "700" ? 700 : 400,
        style: style === "italic" ? "italic" : "normal",
        file,
      });
    });
  return [...inlined, rules].join("\n");
}

const faceKey = (face: FaceOfRule): string =>
  `${face.family} ${face.isBold ? "700" : "400"} ${face.isItalic ? "italic" : "normal"}`;

interface StyleSheet {
  readonly rules: string;
  readonly faces: readonly FaceOfRule[];
  /** From "family weight style" to the font file. */
  readonly files: ReadonlyMap<string, string>;
}

let parsed: StyleSheet | undefined;

/** The rules of KaTeX, and which of them ask for which face. */
function styleSheet(): StyleSheet {
  if (parsed) return parsed;
  const css = packageFile("katex/dist/katex.min.css", "utf8");
  const files = new Map<string, string>();
  const rules = css.replace(/@font-face\{([^}]*)\}/g, (_, body: string) => {
    const value = (name: string): string =>
      new RegExp(`${name}:([^;]+)`).exec(body)?.[1]?.replace(/"/g, "") ?? "";
    const url = /url\((fonts\/[\w-]+\.woff2)\)/.exec(body)?.[1];
    if (url)
      files.set(
        `${value("font-family")} ${value("font-weight")} ${value("font-style")}`,
        `katex/dist/${url}`,
      );
    return "";
  });
  const faces: FaceOfRule[] = [];
  for (const [, selectors = "", body = ""] of rules.matchAll(/([^{}]+)\{([^{}]*)\}/g)) {
    const family = /font-family:"?(KaTeX_\w+)/.exec(body)?.[1];
    const isBold = /font-weight:(700|bold)/.test(body);
    const isItalic = /font-style:italic/.test(body);
    // Text in bold or italics keeps its family, which is the main one.
    if (family === undefined && !isBold && !isItalic) continue;
    faces.push({
      classes: selectors
        .split(",")
        .map((selector) => [...selector.matchAll(/\.([\w-]+)/g)].map((m) => m[1] ?? "")),
      family: family ?? "KaTeX_Main",
      isBold,
      isItalic,
    });
  }
  parsed = { rules, faces, files };
  return parsed;
}
