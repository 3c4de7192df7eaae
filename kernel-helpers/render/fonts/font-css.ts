import { fontFace, packageFile } from "./font-file.js";
import { touchesRange } from "./unicode-range.js";

interface Face {
  readonly package: "source-serif-4" | "source-sans-3";
  readonly family: string;
  readonly weight: 400 | 600;
  readonly style: "normal" | "italic";
}

const serif = { package: "source-serif-4", family: "'Source Serif 4'" } as const;
const sans = { package: "source-sans-3", family: "'Source Sans 3'" } as const;
const faces: readonly Face[] = [
  { ...serif, weight: 400, style: "normal" },
  { ...serif, weight: 400, style: "italic" },
  { ...serif, weight: 600, style: "normal" },
  { ...sans, weight: 400, style: "normal" },
  { ...sans, weight: 600, style: "normal" },
];

const signs = "U+2190-21FF,U+2200-22FF,U+27F5-27FA";

/**
 * `@font-face` rules, the fonts inlined, that cover the characters of a page (its HTML, or any text):
 * the Latin faces always, the others as its characters ask for them.
 */
export function fontCss({ covering }: { covering: string }): string {
  const characters = new Set<number>();
  for (const c of withReferences(covering)) characters.add(c.codePointAt(0) ?? 0);
  const rules = faces.flatMap((face) =>
    Object.entries(subsets(face.package))
      .filter(([name, range]) => name === "latin" || touchesRange(characters, range))
      .map(([name, range]) =>
        fontFace({
          family: face.family,
          weight: face.weight,
          style: face.style,
          file: `@fontsource/${face.package}/files/${face.package}-${name}-${face.weight}-${face.style}.woff2`,
          range,
        }),
      ),
  );
  // A page with equations has this face from mathCss.
  if (!covering.includes(`class="katex"`) && touchesRange(characters, signs))
    rules.push(
      fontFace({
        family: "KaTeX_Main",
        weight: 400,
        style: "normal",
        file: "katex/dist/fonts/KaTeX_Main-Regular.woff2",
      }),
    );
  return rules.join("\n");
}

function subsets(name: Face["package"]): Readonly<Record<string, string>> {
  const parsed: unknown = JSON.parse(packageFile(`@fontsource/${name}/unicode.json`, "utf8"));
  const ranges: Record<string, string> = {};
  if (typeof parsed === "object" && parsed !== null)
    for (const [subset, range] of Object.entries(parsed))
      if (typeof range === "string") ranges[subset] = range;
  return ranges;
}

/** Numeric character references count as the characters they stand for. */
const withReferences = (html: string): string =>
  html.replace(/&#(x[0-9a-f]{1,6}|\d{1,7});/gi, (whole, code: string) => {
    const n = /^x/i.test(code) ? parseInt(code.slice(1), 16) : parseInt(code, 10);
    return n <= 0x10ffff ? String.fromCodePoint(n) : whole;
  });
