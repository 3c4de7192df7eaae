import type { Block, Link, PackageView } from "../../document/index.js";

/** A numbered heading: the templates set it, the contents list it. */
export interface Heading extends Link {
  readonly number: string;
}
export interface ContentsEntry extends Heading {
  readonly level: 1 | 2;
}

const PARTS = [
  ["purpose", "Purpose"],
  ["conclusions", "Conclusions"],
  ["cautions", "Limits and cautions"],
  ["inputs", "Inputs"],
  ["assumptions", "Assumptions"],
  ["methods", "Methods"],
  ["calculation", "Calculation"],
  ["exhibits", "Figures and tables"],
  ["alternates", "Alternate calculations"],
  ["uncertainty", "Uncertainty and sensitivity"],
  ["open", "Open items and review comments"],
  ["references", "References"],
  ["software", "Software, versions and hashes"],
] as const;

/** The headings of a package in the order in which they stand. */
export function contentsOf(view: PackageView): ContentsEntry[] {
  return PARTS.flatMap(([to, text], i): ContentsEntry[] => {
    const number = String(i + 1);
    const inner: Heading[] =
      to === "conclusions"
        ? view.conclusions.map((c) => ({ to: c.anchor, number: c.number, text: c.title }))
        : to === "calculation"
          ? view.sections.map((s, k) => ({
              to: s.anchor,
              number: `${number}.${k + 1}`,
              text: s.title,
            }))
          : [];
    return [
      { to, text, number, level: 1 },
      ...inner.map((h): ContentsEntry => ({ ...h, level: 2 })),
    ];
  });
}

/** The same by anchor, for the places where they stand. */
export const headingsOf = (view: PackageView): { readonly [anchor: string]: Heading } =>
  Object.fromEntries(contentsOf(view).map(({ to, text, number }) => [to, { to, text, number }]));

/** The numbered figures and tables. */
export const exhibitsOf = (view: PackageView): Link[] =>
  view.sections
    .flatMap((s): readonly Block[] => s.blocks)
    .flatMap((b) =>
      (b.kind === "figure" || b.kind === "table") && b.number !== null
        ? [{ to: b.anchor, text: `${b.number}. ${b.caption}` }]
        : [],
    );
