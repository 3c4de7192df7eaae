import { cssString } from "./css-string.js";
import { fontStacks } from "../fonts/font-stacks.js";

/** A piece of a running line: text, or the number of the page or of all pages. */
export type RunningPart = string | { readonly counter: "page" | "pages" };

/** What stands at one place of the header or footer. */
export type Running = string | readonly RunningPart[];

export interface RunningLine {
  readonly left?: Running;
  readonly center?: Running;
  readonly right?: Running;
}

export type PaperSize = "A4" | "Letter";

/** "Page 3 of 46". */
export const pageOfPages: Running = ["Page ", { counter: "page" }, " of ", { counter: "pages" }];

const sheet: Readonly<Record<PaperSize, string>> = { A4: "210mm 297mm", Letter: "8.5in 11in" };
const places = ["left", "center", "right"] as const;

/** The `@page` rule of a package: sheet, margins, and the running header and footer in its margins. */
export function pageCss({
  size,
  header,
  footer,
}: {
  size: PaperSize;
  header: RunningLine;
  footer: RunningLine;
}): string {
  const line = (edge: "top" | "bottom", running: RunningLine): string =>
    places
      .map((place) => {
        const align = edge === "top" ? "bottom" : "top";
        return `@${edge}-${place}{content:${content(running[place] ?? "")};text-align:${place};vertical-align:${align};${rule[edge]}${lettering}}`;
      })
      .join("");
  return `@page{size:${sheet[size]};margin:25mm 20mm 23mm 22mm;${line("top", header)}${line("bottom", footer)}}`;
}

const lettering = `font:400 7.5pt/1.3 ${fontStacks.sans};color:#3f4a4d`;
const rule = {
  top: "padding-bottom:1.5mm;margin-bottom:6mm;border-bottom:0.4pt solid #7d8a8d;",
  bottom: "padding-top:1.5mm;margin-top:6mm;border-top:0.4pt solid #7d8a8d;",
};

function content(running: Running): string {
  const parts = typeof running === "string" ? [running] : running;
  return parts
    .map((part) => (typeof part === "string" ? cssString(part) : `counter(${part.counter})`))
    .join(" ");
}
