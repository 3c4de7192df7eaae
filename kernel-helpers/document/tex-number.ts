/** A number in TeX, five significant digits at most. */
export function texNumber(x: number): string {
  if (x === 0) return "0";
  const size = Math.abs(x);
  if (size >= 1e-3 && size < 1e5) return String(Number(x.toPrecision(5)));
  const [mantissa = "", power = "0"] = x.toExponential(4).split("e");
  return String.raw`${String(Number(mantissa))}\times 10^{${Number(power)}}`;
}
