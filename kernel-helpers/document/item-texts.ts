import type { AppliedUse, FormulaItem, Result } from "../study/index.js";
import { sayStop, type Context } from "./context.js";
import { groupText, limitsText } from "./range-text.js";

export const stopText = (result: Result): string | null =>
  "stop" in result ? `${sayStop(result.stop)}: ${result.because}.` : null;

/** What is said about an item: a method by its number and title, a group by its meaning. */
export const saysOf = (ctx: Context, item: AppliedUse | FormulaItem): string[] =>
  item.findings.map((f) => findingText(ctx, f));

type Finding = AppliedUse["findings"][number];

export function findingText(ctx: Context, { by, says, group }: Finding): string {
  const method = ctx.numbering.method(by);
  const lead = `${by}: `;
  if (!method || !says.startsWith(lead)) return says;
  const said = says.slice(lead.length);
  const declared = ctx.resolver.declaration(by);
  const rule =
    declared.role === "method" ? declared.ranges.find((r) => r.group === group) : undefined;
  if (!rule || !said.startsWith(rule.group)) return `${method.text}: ${said}`;
  const found = said.slice(rule.group.length, said.lastIndexOf(";")).trim();
  const whose = rule.stated ? "the source states" : "advised is";
  return `${method.text}: ${groupText(rule)} ${/^[\d−]/.test(found) ? "is " : ""}${found}; ${whose} ${limitsText(rule)}`;
}
