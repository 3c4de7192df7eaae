import { InputError } from "../errors/index.js";

const superscript = (n: number): string =>
  String(n).replace(/[-\d]/g, (c) => (c === "-" ? "⁻" : "⁰¹²³⁴⁵⁶⁷⁸⁹".charAt(Number(c))));

/**
 * A number for people: `digits` significant digits, no loss before the decimal point, a true minus
 * sign, thousands parted by a narrow no-break space from 10 000 up, powers of ten outside 1e-4..1e7.
 * Infinity, which a ratio outside its range can be, is ∞; what is not a number is refused.
 */
export function formatNumber(x: number, digits = 4): string {
  if (x === 0) return "0";
  const size = Math.abs(assertNumber(x));
  const sign = x < 0 ? "−" : "";
  if (size === Infinity) return `${sign}∞`;
  if (size < 1e-4 || size >= 1e7) {
    const [mantissa = "", power = "0"] = size.toExponential(digits - 1).split("e");
    return `${sign}${mantissa} × 10${superscript(Number(power))}`;
  }
  return sign + group(size.toFixed(decimalsFor(size, digits)));
}

/** Decimals that show `digits` significant digits of a size; a column uses those of its largest. */
export function decimalsFor(size: number, digits: number): number {
  if (size === 0) return 0;
  const power = Number(size.toExponential(digits - 1).split("e")[1]);
  return Math.min(Math.max(digits - 1 - power, 0), 12);
}

/** A number with fixed decimals, for columns aligned on the decimal point. */
export const formatFixed = (x: number, decimals: number): string => {
  const text = group(Math.abs(assertNumber(x)).toFixed(decimals));
  return x < 0 && /[1-9]/.test(text) ? `−${text}` : text;
};

/** A number exactly as it was typed: no digit is added or lost. */
export const formatTyped = (x: number | string): string =>
  typeof x === "string"
    ? x
    : String(assertNumber(x))
        .replace("-", "−")
        .replace(/^(−?)(\d{5,})/, (_, s: string, d: string) => s + group(d));

function group(text: string): string {
  const [whole = "", rest] = text.split(".");
  const grouped = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, "\u202f") : whole;
  return rest === undefined ? grouped : `${grouped}.${rest}`;
}

function assertNumber(x: number): number {
  if (!Number.isNaN(x)) return x;
  throw new InputError({
    code: "not-a-number",
    where: "number to show",
    problem: "is NaN",
    expected: "a number",
  });
}
