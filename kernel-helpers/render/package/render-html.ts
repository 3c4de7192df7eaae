import { charts, packageView, type Block, type PackageView } from "../../document/index.js";
import type { Environment } from "nunjucks";
import { RenderError } from "../../errors/index.js";
import { reference } from "../../method/index.js";
import type { StudyRecord } from "../../study/index.js";
import { formatReference } from "../citations/index.js";
import { fontCss, mathCss } from "../fonts/index.js";
import { typesetHtml } from "../lettering/index.js";
import { mathRenderer } from "../math/index.js";
import type { PaperSize } from "../pdf/page-css.js";
import { contentsOf, exhibitsOf, headingsOf } from "./contents.js";
import { drawingSvg } from "./drawing-svg.js";
import { strictView } from "./strict-view.js";
import { packageStyles } from "./styles.js";
import { templatesFolder } from "./templates-folder.js";

export interface RenderedHtml {
  readonly html: string;
  readonly view: PackageView;
}

/** Where the fonts go once the characters of the page are known. */
const FONTS = "/*fonts*/";

/** A record → one self-contained HTML file. */
export async function renderHtml(record: StudyRecord, paper: PaperSize): Promise<RenderedHtml> {
  const view = packageView(record, charts);
  const folder = templatesFolder();
  const [{ default: nunjucks }, math, drawings] = await Promise.all([
    import("nunjucks"),
    mathRenderer(),
    drawingsOf(view),
  ]);
  const environment = new nunjucks.Environment(new nunjucks.FileSystemLoader(folder), {
    autoescape: true,
    throwOnUndefined: true,
    trimBlocks: true,
    lstripBlocks: true,
  });
  const { SafeString } = nunjucks.runtime as { SafeString: new (html: string) => object };
  const safe = (html: string): object => new SafeString(html);
  const numbers = new Map(view.references.map((r) => [r.id, r.number]));
  environment.addFilter("math", (tex: string, isDisplay?: boolean) =>
    safe(math({ tex, isDisplay: isDisplay === true })),
  );
  // Values and units: raised and lowered figures that the text faces lack become real ones.
  environment.addFilter("set", (text: string) => safe(typesetHtml(text)));
  environment.addFilter("cite", (id: string) =>
    safe(`<a href="#ref-${id}">[${numbers.get(id) ?? "?"}]</a>`),
  );
  environment.addFilter("reference", (id: string) =>
    safe(formatReference(record.body.references.find((r) => r.id === id) ?? reference(id))),
  );
  environment.addFilter("drawing", (anchor: string) => safe(drawings.get(anchor) ?? ""));
  const html = fill(environment, {
    pkg: strictView(view, "pkg"),
    contents: strictView(contentsOf(view), "contents"),
    headings: strictView(headingsOf(view), "headings"),
    exhibits: strictView(exhibitsOf(view), "exhibits"),
    styles: `${FONTS}\n${packageStyles(folder, view, paper)}`,
  });
  const fonts = `${fontCss({ covering: html })}\n${mathCss({ covering: html })}`;
  return { html: html.replace(FONTS, () => fonts), view };
}

function fill(environment: Environment, context: object): string {
  try {
    return environment.render("package.njk", context);
  } catch (cause) {
    throw new RenderError({
      code: "template",
      where: "templates",
      problem: (cause instanceof Error ? cause.message : String(cause)).replace(/\s+/g, " "),
      remedy: "mend the template; the view it is given is described in document/view.ts",
      cause,
    });
  }
}

/** Every drawing of a package, by the anchor of its figure. */
async function drawingsOf(view: PackageView): Promise<ReadonlyMap<string, string>> {
  const out = new Map<string, string>();
  for (const b of view.sections.flatMap((s): readonly Block[] => s.blocks))
    if (b.kind === "figure" && b.drawing)
      out.set(b.anchor, await drawingSvg(b.drawing, `${b.number}. ${b.caption}`));
  return out;
}
