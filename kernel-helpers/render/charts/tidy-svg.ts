import { raiseInSvg } from "../lettering/typeset.js";

const needless = / (?:role|class|pointer-events|aria-[a-z]+|version|xmlns:xlink)="[^"]*"/g;

/**
 * Vega's drawing made fit for a document: ids that no other drawing on the page has (vega counts them
 * from when it was loaded), no inner roles (one figure is one image), coordinates rounded to 0.01 px
 * (the last digits differ between engines), raised and lowered digits set as such.
 */
export function tidySvg(svg: string, prefix: string): string {
  const ids = new Map<string, string>();
  const newId = (id: string): string => {
    const known = ids.get(id);
    if (known !== undefined) return known;
    const made = `c${prefix}-${ids.size + 1}`;
    ids.set(id, made);
    return made;
  };
  return svg
    .replace(/<path[^>]* display="none"\/>/g, "")
    .replace(/<text[^>]* opacity="0"[^>]*>[^<]*<\/text>/g, "")
    .replace(/<[^>]+>/g, (tag) =>
      tag
        .replace(needless, "")
        .replace(/ opacity="1"/g, "")
        .replace(/\bid="([^"]*)"/g, (_, id: string) => `id="${newId(id)}"`)
        .replace(/url\(#([^)]*)\)/g, (_, id: string) => `url(#${newId(id)})`)
        .replace(/-?\d+\.\d{3,}(?:e-?\d+)?/g, (n) => String(Math.round(Number(n) * 100) / 100 + 0)),
    )
    .replace(
      /(<text[^>]*>)([^<]*)(<\/text>)/g,
      (_, open: string, text: string, end: string) => open + raiseInSvg(text) + end,
    );
}
