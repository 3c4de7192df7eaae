import type { Comparison } from "../study/index.js";
import { formatNumber } from "../units/index.js";
import { aligned } from "./align.js";
import { split, type Context } from "./context.js";
import { sentenceCase } from "./sentence-case.js";
import type { ComparisonView, Row } from "./view.js";

/** A result calculated a second way. */
export function comparisonView(ctx: Context, item: Comparison): ComparisonView {
  const side = (name: "main" | "alternate"): Row => {
    const node = item.args[name] ?? { absent: true as const };
    const title = "ref" in node ? ctx.resolver.item(node.ref).title : name;
    return {
      symbol: null,
      meaning: title,
      ...split(ctx.showNode(node, item.of)),
      from: ctx.from(node),
      padding: "",
    };
  };
  const { result } = item;
  const [main, alternate] = aligned([side("main"), side("alternate")]);
  if (!main || !alternate) throw new Error(`${item.id} has no two sides`);
  return {
    kind: "comparison",
    number: ctx.numbering.of(item.id),
    anchor: ctx.numbering.anchor(item.id),
    title: sentenceCase(item.title),
    main,
    alternate,
    difference:
      "stop" in result
        ? `not defined: ${result.because}`
        : `${formatNumber(100 * (result.value as number), 3)}\u00a0%`,
    because: item.because,
  };
}
