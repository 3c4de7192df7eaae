import type { CheckItem, Conclusion } from "../study/index.js";
import { assumptionsUnder, checkView, inputsUnder } from "./checks.js";
import type { Context } from "./context.js";
import { joined } from "./show.js";
import type { ConclusionView, TextRun } from "./view.js";

export function conclusionView(ctx: Context, item: Conclusion): ConclusionView {
  const checks = item.checks.map((id) => checkView(ctx, ctx.resolver.item(id) as CheckItem));
  const bad = checks.filter((c) => c.verdict !== "passes");
  return {
    number: ctx.numbering.of(item.id),
    anchor: ctx.numbering.anchor(item.id),
    title: item.title,
    sentence: item.parts.map((p): TextRun => {
      if (typeof p === "string") return { text: p, to: null, strong: false };
      return {
        text: verdictWords(joined(ctx.showNode(p.node, "dimensionless", p.unit))),
        to: ctx.from(p.node)?.to ?? null,
        strong: true,
      };
    }),
    standing:
      checks.length === 0
        ? "rests on no check"
        : bad.length === 0
          ? checks.length === 1
            ? "its check passes"
            : `all ${checks.length} checks pass`
          : bad
              .map(
                (c) =>
                  `check ${c.number} ${c.verdict === "fails" ? "fails" : "could not be evaluated"}`,
              )
              .join("; "),
    stands: bad.length === 0,
    checks,
    assumptions: assumptionsUnder(ctx, item.id),
    inputs: inputsUnder(ctx, item.id),
  };
}
const verdictWords = (text: string): string =>
  text === "pass" ? "passes" : text === "fail" ? "fails" : text;
