import type { Block, Link, PackageView } from "../../document/index.js";

export interface ContentsEntry extends Link {
  readonly level: 1 | 2;
}

/** The headings of a package in the order in which they stand. */
export function contentsOf(view: PackageView): ContentsEntry[] {
  const one = (to: string, text: string): ContentsEntry => ({ to, text, level: 1 });
  return [
    one("purpose", "Purpose"),
    one("conclusions", "Conclusions"),
    ...view.conclusions.map((c): ContentsEntry => ({
      to: c.anchor,
      text: `${c.number} ${c.title}`,
      level: 2,
    })),
    one("cautions", "Limits and cautions"),
    one("inputs", "Inputs"),
    one("assumptions", "Assumptions"),
    one("methods", "Methods"),
    ...view.sections.map((s) => one(s.anchor, s.title)),
    one("exhibits", "Figures and tables"),
    one("alternates", "Alternate calculations"),
    one("uncertainty", "Uncertainty and sensitivity"),
    one("open", "Open items and review comments"),
    one("references", "References"),
    one("software", "Software, versions and hashes"),
  ];
}

/** The numbered figures and tables. */
export const exhibitsOf = (view: PackageView): Link[] =>
  view.sections
    .flatMap((s): readonly Block[] => s.blocks)
    .flatMap((b) =>
      (b.kind === "figure" || b.kind === "table") && b.number !== null
        ? [{ to: b.anchor, text: `${b.number}. ${b.caption}` }]
        : [],
    );
