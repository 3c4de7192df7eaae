/** A number in TeX, six significant digits at most: enough to repeat a calculation to the four that are told. */
export function texNumber(x: number): string {
  if (x === 0) return "0";
  const size = Math.abs(x);
  if (size >= 1e-3 && size < 1e6) return String(Number(x.toPrecision(6)));
  const [mantissa = "", power = "0"] = x.toExponential(5).split("e");
  return String.raw`${String(Number(mantissa))}\times 10^{${Number(power)}}`;
}
