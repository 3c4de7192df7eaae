import { charts, packageView, type PackageView } from "../document/index.js";
import type { StudyRecord } from "../study/index.js";
import type { Presenter } from "./presenter.js";

/** A study, told by what it can do: the package may be loaded twice. */
interface Shown {
  record(): StudyRecord;
}

/** Where a study stands: what it holds, its checks and conclusions, and what is open. */
export const presentStudy: Presenter = {
  claims: isStudy,
  bundle: (x) => {
    if (!isStudy(x)) return {};
    const record = x.record();
    const view = packageView(record, charts);
    const lines = board(view, record);
    return {
      "text/plain": lines.join("\n"),
      "text/html": `<pre style="font-family:inherit;white-space:pre-wrap">${lines.map(escape).join("\n")}</pre>`,
    };
  },
};

function board(view: PackageView, { run, body }: StudyRecord): string[] {
  const checks = view.sections.flatMap((s) => s.blocks).filter((b) => b.kind === "check");
  const count = (n: number, what: string): string => `${n} ${what}${n === 1 ? "" : "s"}`;
  return [
    `${view.cover.number} rev. ${view.cover.revision}: ${view.cover.title}`,
    `  ${count(view.inputs.length, "input")}, ${count(view.assumptions.length, "assumption")}, ${count(body.items.length, "item")} in all`,
    ...checks.map(
      (c) =>
        `  ${c.number} ${c.title}: ${c.verdict}${c.margin === "–" ? "" : `, margin ${c.margin}`}`,
    ),
    ...view.conclusions.map(
      (c) => `  ${c.number} ${c.sentence.map((r) => r.text).join("")} (${c.standing})`,
    ),
    ...(run.stale.length > 0 ? [`  stale, run their cells again: ${run.stale.join(", ")}`] : []),
    `  before approval: ${count(view.open.filter((o) => o.blocksApproval && o.at !== null).length, "open item")}`,
  ];
}

function isStudy(x: unknown): x is Shown {
  return (
    typeof x === "object" &&
    x !== null &&
    "facts" in x &&
    "record" in x &&
    typeof x.record === "function" &&
    "stale" in x
  );
}
const escape = (text: string): string =>
  text.replace(/[&<>]/g, (c) => ({ "&": "&amp;", "<": "&lt;", ">": "&gt;" })[c] ?? c);
