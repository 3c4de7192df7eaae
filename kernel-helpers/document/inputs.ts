import type { Stated } from "../study/index.js";
import { formatTyped, unitOf } from "../units/index.js";
import { split, type Context } from "./context.js";
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
    padding: "",
  };
  if (item.form === "number") {
    const { symbol } = unitOf(item.type, item.unit, item.id);
    const unit = symbol === "1" ? "" : symbol;
    return {
      ...base,
      value: formatTyped(item.typed),
      unit,
      form: "number",
      spread:
        item.spread &&
        `${formatTyped(item.spread.low)} to ${formatTyped(item.spread.high)}${unit && ` ${unit}`} (${item.spread.says})`,
    };
  }
  const value = split(ctx.show({ type: item.type, value: item.result.value }));
  if (item.form === "choice") return { ...base, ...value };
  return {
    ...base,
    ...value,
    file: item.file && `${item.file.name}, SHA-256 ${item.file.sha256}`,
    // What the name and the source say already is not said again.
    details: ctx
      .rows(item.args, ctx.resolver.fieldsOf(item.use))
      .filter((r) => r.value !== value.value && r.value !== item.because),
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
