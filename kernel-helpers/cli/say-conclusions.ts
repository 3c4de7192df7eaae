import type { PackageView } from "../document/index.js";

/** The conclusions in plain text, each with how its checks stand. */
export function sayConclusions(view: PackageView): string[] {
  return view.conclusions.flatMap((c) => [
    `${c.number}  ${c.sentence.map((r) => r.text).join("")}`,
    `    ${c.standing}`,
  ]);
}
