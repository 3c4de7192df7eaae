import { RenderError } from "../../errors/index.js";
import { escapeHtml } from "../lettering/escape-html.js";
import { simpleMath } from "./simple-math.js";
import { texToWords } from "./tex-to-words.js";

export interface MathInput {
  readonly tex: string;
  /** On a line of its own, or within a line of text. */
  readonly isDisplay: boolean;
  /** What a reader who cannot see it hears; read off the TeX if not given. */
  readonly label?: string;
}

export type MathRenderer = (input: MathInput) => string;

const cache = new Map<string, string>();
const cacheSize = 2000;

/**
 * Gives the function that sets equations, once the library is loaded: TeX to HTML that needs `mathCss`.
 * Each equation is one image with a text for screen readers; in a tagged PDF, one figure.
 *
 * The function throws RenderError `bad-tex`, which names the TeX.
 */
export async function mathRenderer(): Promise<MathRenderer> {
  const { default: katex } = await import("katex");
  const set = (tex: string, isDisplay: boolean): string => {
    const key = `${isDisplay ? "display" : "inline"} ${tex}`;
    const known = cache.get(key);
    if (known !== undefined) return known;
    const html = katexHtml(
      () =>
        katex.renderToString(tex, {
          displayMode: isDisplay,
          output: "html",
          throwOnError: true,
          strict: "ignore",
          trust: false,
          maxExpand: 200,
          maxSize: 20,
        }),
      tex,
    );
    if (cache.size >= cacheSize) cache.clear();
    cache.set(key, html);
    return html;
  };
  return ({ tex, isDisplay, label }) => {
    const tag = isDisplay ? "div" : "span";
    const text = escapeHtml(label ?? texToWords(tex));
    const simple = isDisplay ? null : simpleMath(tex);
    if (simple !== null)
      return `<span class="symbol" role="img" aria-label="${text}">${simple}</span>`;
    return `<${tag} class="math" role="img" aria-label="${text}">${set(tex, isDisplay)}</${tag}>`;
  };
}

/** One equation; see {@link mathRenderer} for many. */
export const renderMath = async (input: MathInput): Promise<string> =>
  (await mathRenderer())(input);

function katexHtml(render: () => string, tex: string): string {
  let html: string;
  try {
    html = render();
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error);
    throw new RenderError({
      code: "bad-tex",
      where: `TeX ${tex}`,
      problem: reason.replace(/^KaTeX parse error:\s*/, ""),
      expected: "mathematics that KaTeX can set",
      cause: error,
    });
  }
  // The library hides this half from readers in favour of MathML, which is not made here.
  return html.replaceAll(` aria-hidden="true"`, "");
}
