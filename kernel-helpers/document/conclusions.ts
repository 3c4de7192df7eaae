import type { CheckItem, Conclusion } from "../study/index.js";
import { aligned } from "./align.js";
import { assumptionsUnder, checkView, inputsUnder, unverifiedUnder } from "./checks.js";
import type { Context } from "./context.js";
import { joined } from "./show.js";
import { sentenceCase } from "./sentence-case.js";
import type { CheckView, ConclusionView, TextRun } from "./view.js";

export function conclusionView(ctx: Context, item: Conclusion): ConclusionView {
  const checks = item.checks.map((id) => checkView(ctx, ctx.resolver.item(id) as CheckItem));
  return {
    number: ctx.numbering.of(item.id),
    anchor: ctx.numbering.anchor(item.id),
    title: sentenceCase(item.title),
    sentence: item.parts.map((p): TextRun => {
      if (typeof p === "string") return { text: p, to: null, strong: false };
      return {
        text: verdictWords(joined(ctx.showNode(p.node, "dimensionless", p.unit))),
        to: ctx.from(p.node)?.to ?? null,
        strong: true,
      };
    }),
    standing: standingOf(checks),
    stands: checks.every((c) => c.verdict === "passes"),
    checks: linedUp(checks),
    assumptions: assumptionsUnder(ctx, item.id),
    unverified: unverifiedUnder(ctx, item.id),
    inputs: inputsUnder(ctx, item.id),
  };
}
const verdictWords = (text: string): string =>
  text === "pass" ? "passes" : text === "fail" ? "fails" : text;

const linedUp = (checks: readonly CheckView[]): CheckView[] => {
  const shown = aligned(checks.map((c) => c.shown));
  return checks.map((c, i) => ({ ...c, shown: shown[i] ?? c.shown }));
};

/** How the checks of a conclusion stand, in one clause that names those that do not pass. */
function standingOf(checks: readonly CheckView[]): string {
  const named = (verdict: CheckView["verdict"]): string[] =>
    checks.filter((c) => c.verdict === verdict).map((c) => c.number);
  const [fail, unknown] = [named("fails"), named("not evaluated")];
  const bad = [
    ...(fail.length > 0 ? [`${listed(fail)} ${fail.length === 1 ? "fails" : "fail"}`] : []),
    ...(unknown.length > 0 ? [`${listed(unknown)} could not be evaluated`] : []),
  ].join(", ");
  const passed = checks.length - fail.length - unknown.length;
  if (checks.length === 0) return "it rests on no check";
  if (bad === "")
    return checks.length === 1 ? "its check passes" : `all ${checks.length} checks pass`;
  if (checks.length === 1) return `its check ${bad}`;
  return passed === 0
    ? `none of its ${checks.length} checks passes: ${bad}`
    : `${passed} of its ${checks.length} checks ${passed === 1 ? "passes" : "pass"}: ${bad}`;
}
const listed = (all: readonly string[]): string =>
  all.length < 2 ? all.join("") : `${all.slice(0, -1).join(", ")} and ${all.at(-1) ?? ""}`;
