import type { Stated } from "../study/index.js";
import { formatTyped, unitOf } from "../units/index.js";
import type { Context } from "./context.js";
import { textOf } from "./show.js";
import type { AssumptionView, InputView } from "./view.js";

/** A stated value as it was typed, with its source and what uses it. */
export function inputView(ctx: Context, item: Stated): InputView {
  const base = {
    number: ctx.numbering.of(item.id),
    anchor: ctx.numbering.anchor(item.id),
    title: item.title,
    symbol: item.symbol,
    because: item.because,
    usedBy: ctx.usedBy(item.id),
    file: null,
    details: [],
    spread: null,
  };
  if (item.form === "number") {
    const { symbol } = unitOf(item.type, item.unit, item.id);
    const unit = symbol === "1" ? "" : symbol;
    return {
      ...base,
      value: formatTyped(item.typed),
      unit,
      spread:
        item.spread &&
        `${formatTyped(item.spread.low)} to ${formatTyped(item.spread.high)}${unit && ` ${unit}`} (${item.spread.says})`,
    };
  }
  if (item.form === "choice") return { ...base, value: textOf(item.result.value), unit: "" };
  const { text } = ctx.show({ type: item.type, value: item.result.value });
  return {
    ...base,
    value: text,
    unit: "",
    file: item.file && `${item.file.name}, SHA-256 ${item.file.sha256}`,
    details: ctx.rows(item.args, ctx.resolver.fieldsOf(item.use)),
  };
}

export function assumptionView(ctx: Context, item: Stated): AssumptionView {
  return {
    ...inputView(ctx, item),
    how: item.verify?.how ?? "",
    by: item.verify?.by ?? "",
    required: item.verify?.required ?? false,
    state: "not verified",
  };
}
