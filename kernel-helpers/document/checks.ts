import type { CheckItem, Stated } from "../study/index.js";
import { isKind } from "../units/index.js";
import { split, type Context } from "./context.js";
import { joined, showNumber } from "./show.js";
import { formatNumber } from "../units/index.js";
import { sentenceCase } from "./sentence-case.js";
import type { CheckView, Link } from "./view.js";

export function checkView(ctx: Context, item: CheckItem): CheckView {
  const value = item.args["value"] ?? { absent: true as const };
  const limit = item.args["limit"] ?? { absent: true as const };
  const shown = ctx.showNode(value, item.of);
  const y = ctx.resolver.resolve(limit, item.of);
  return {
    kind: "check",
    number: ctx.numbering.of(item.id),
    anchor: ctx.numbering.anchor(item.id),
    title: sentenceCase(item.title),
    value: joined(shown),
    shown: { ...split(shown), padding: "" },
    sense: item.sense,
    limit: joined(ctx.showNode(limit, item.of)),
    valueFrom: ctx.from(value),
    limitFrom: ctx.from(limit),
    verdict:
      "stop" in item.result ? "not evaluated" : item.result.value === "pass" ? "passes" : "fails",
    margin: margin(ctx, item, "stop" in y ? null : y.value),
    because: item.because,
    assumptions: grounds(ctx, item.id, "assumed").map((g) => ctx.numbering.link(g.id)),
  };
}

function margin(ctx: Context, item: CheckItem, limit: unknown): string {
  if (item.margin === null || !isKind(item.of)) return "–";
  // A margin is a difference: temperatures and absolute pressures have their own kind for that.
  const kind =
    item.of === "temperature"
      ? "temperatureDifference"
      : item.of === "pressure"
        ? "pressureDifference"
        : item.of;
  const shown = joined(showNumber(kind, item.margin, ctx.system));
  const percent =
    typeof limit === "number" && limit !== 0 && item.of !== "temperature"
      ? (100 * item.margin) / Math.abs(limit)
      : null;
  // A share of a limit that is small beside the value tells nothing.
  const share =
    percent === null || Math.abs(percent) > 300
      ? ""
      : ` (${formatNumber(percent, 2)}\u00a0% of the limit)`;
  return shown + share;
}

/** The assumptions under an item that approval has to wait for. */
export const unverifiedUnder = (ctx: Context, id: string): Link[] =>
  ctx.lineage
    .groundsOf(id)
    .filter((g) => g.verify?.required === true)
    .map((g) => ctx.numbering.link(g.id));
export const assumptionsUnder = (ctx: Context, id: string): Link[] =>
  grounds(ctx, id, "assumed").map((g) => ctx.numbering.titled(g.id));
export const inputsUnder = (ctx: Context, id: string): Link[] =>
  grounds(ctx, id, "given").map((g) => ctx.numbering.link(g.id));
const grounds = (ctx: Context, id: string, op: Stated["op"]): Stated[] =>
  ctx.lineage.groundsOf(id).filter((g) => g.op === op);
