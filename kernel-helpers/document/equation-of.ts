const SOLVED = /^([^=]+?):\\ ([\s\S]+)$/;

/** The equation of a method: `symbol = right-hand side`, or the whole relation where it is solved for its output. */
export function equationOf(symbol: string, tex: string): string {
  const [, , relation] = SOLVED.exec(tex) ?? [];
  return relation === undefined
    ? `${symbol}=${tex}`
    : String.raw`${relation}\qquad\text{solved for }${symbol}`;
}

/**
 * The same with the numbers put in, and the result. Where further relations follow the first ("…, λ = d/D")
 * or the output stands on no side alone, the result is said apart: behind them it would read as theirs.
 */
export function putInOf(symbol: string, tex: string, result: string): string {
  const [, , relation] = SOLVED.exec(tex) ?? [];
  if (relation !== undefined) return String.raw`${relation}\qquad ${symbol}${result}`;
  return /\\q?quad|=|\\begin|\\text/.test(tex)
    ? String.raw`${symbol}=${tex}\qquad ${symbol}${result}`
    : `${symbol}=${tex}${result}`;
}
