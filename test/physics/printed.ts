import type { AnyCheck } from "../../kernel-helpers/physics/any-method.js";

type Row = AnyCheck["rows"][number];

/** Half of the last digit of a number as printed: 0.005 for "2.39", 50 for "2.4e3". */
export function halfLastDigit(printed: string): number {
  const [, decimals = "", power = "0"] = /^[-+]?\d+\.?(\d*)(?:e([-+]?\d+))?$/.exec(printed) ?? [];
  return 0.5 * 10 ** (Number(power) - decimals.length);
}

/** What a check row prints, and how far off a value may be, in the row's unit. */
export function target(row: Row): { readonly value: number; readonly tolerance: number } {
  const value = Number(row.printed);
  // a tie in the last digit is a matter of rounding
  const tolerance =
    row.within === undefined
      ? halfLastDigit(row.printed) * (1 + 1e-9)
      : Math.abs(value) * row.within;
  return { value, tolerance };
}

export const inRowUnit = (si: number, row: Row): number =>
  row.in ? (si - row.in.offset) / row.in.scale : si;
