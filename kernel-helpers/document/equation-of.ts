const SOLVED = /^([^=]+?):\\ ([\s\S]+)$/;

/** The equation of a method: `symbol = right-hand side`, or the whole relation where it is solved for its output. */
export function equationOf(symbol: string, tex: string): string {
  const [, , relation] = SOLVED.exec(tex) ?? [];
  return relation === undefined
    ? `${symbol}=${tex}`
    : String.raw`${relation}\qquad\text{solved for }${symbol}`;
}

/** The same with the numbers put in, and the result. */
export function putInOf(symbol: string, tex: string, result: string): string {
  const [, , relation] = SOLVED.exec(tex) ?? [];
  return relation === undefined
    ? `${symbol}=${tex}${result}`
    : String.raw`${relation}\qquad ${symbol}${result}`;
}
