/** `"9 5/8"`, `"5/8"`, `"12.25"`, `"-3"`, `"1.2e-3"` as a number; NaN when it is none of these. */
export function parseMixedNumber(text: string): number {
  const t = text.trim();
  const mixed = /^(-?)(?:(\d+)\s+)?(\d+)\/(\d+)$/.exec(t);
  if (mixed) {
    const [, sign, whole = "0", over, under] = mixed;
    const size = Number(whole) + Number(over) / Number(under);
    return sign ? -size : size;
  }
  return /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(t) ? Number(t) : NaN;
}
