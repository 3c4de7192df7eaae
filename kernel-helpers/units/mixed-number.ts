/**
 * `"9 5/8"`, `"9-5/8"`, `"5/8"`, `"12.25"`, `"-3"`, `"1.2e-3"` as a number; NaN when it is none of
 * these. The fraction of a mixed number is proper: `"9 58/8"` is a slip.
 */
export function parseMixedNumber(text: string): number {
  const t = text.trim();
  const mixed = /^([+-]?)(?:(\d+)(?:\s+|-))?(\d+)\/(\d+)$/.exec(t);
  if (mixed) {
    const [, sign, whole, over, under] = mixed;
    const part = Number(over) / Number(under);
    if (!Number.isFinite(part) || (whole !== undefined && part >= 1)) return NaN;
    const size = Number(whole ?? 0) + part;
    return sign === "-" ? -size : size;
  }
  if (!/^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(t)) return NaN;
  const x = Number(t);
  return Number.isFinite(x) ? x : NaN;
}
