import { isComputed, literals, nodesOf, type Item, type StudyRecord } from "../study/index.js";
import { joined, showNumber } from "./show.js";
import type { Context } from "./context.js";
import type { OpenItem } from "./view.js";

/** What stands between this record and an approved package, and what a checker should look at. */
export function openItems(ctx: Context, record: StudyRecord): OpenItem[] {
  const { items } = record.body;
  const out: OpenItem[] = [];
  const add = (text: string, id: string | null, blocksApproval: boolean): void =>
    void out.push({ text, at: id === null ? null : ctx.numbering.titled(id), blocksApproval });
  if (!record.run.clean)
    add(
      "The record is a draft: it does not come from a clean run of the whole notebook.",
      null,
      true,
    );
  for (const id of record.run.stale)
    add("Stale: something it stands on was recorded again or withdrawn after it.", id, true);
  for (const i of items) {
    if (i.op === "assumed" && i.verify?.required)
      add(`Assumption not verified. To verify: ${i.verify.how} (${i.verify.by}).`, i.id, true);
    if (i.op === "check" && !("stop" in i.result) && i.result.value === "fail")
      add(`The check fails; ${takenUp(items, i.id, ctx)}.`, i.id, false);
    if (i.op === "check" && "stop" in i.result)
      add(`The check could not be evaluated; ${takenUp(items, i.id, ctx)}.`, i.id, false);
    if (isComputed(i)) {
      const stated = nodesOf(i).flatMap(([name, node]) => literals(node, name));
      if (stated.length > 0)
        add(
          `States ${stated.length === 1 ? "a number" : `${stated.length} numbers`} in place, without a source: ${stated
            .slice(0, 6)
            .map((l) => `${l.where} = ${joined(showNumber(l.kind, l.si, ctx.system))}`)
            .join(", ")}${stated.length > 6 ? " …" : ""}.`,
          i.id,
          true,
        );
      for (const f of i.findings)
        if (f.code === "pass-the-reference") add(`${f.says}.`, i.id, false);
    }
  }
  return out;
}

/** Which conclusions take a check up: a failing check that none speaks of is what a checker must see. */
function takenUp(items: readonly Item[], check: string, ctx: Context): string {
  const all = items.flatMap((i) =>
    i.op === "conclude" && i.checks.includes(check) ? [ctx.numbering.of(i.id)] : [],
  );
  return all.length === 0
    ? "no conclusion takes it up"
    : `taken up in ${all.length === 1 ? "conclusion" : "conclusions"} ${all.join(", ")}`;
}
