import { InputError, SolveError } from "../errors/index.js";
import { finiteAt } from "./finite-at.js";

/** How far and how fast a bracket may grow. */
export interface BracketOptions {
  /** The function is never asked below this: a pressure has a floor. */
  readonly least?: number;
  /** The function is never asked above this. */
  readonly most?: number;
  /** Growth of the bracket's width at each step; 2 unless given. */
  readonly factor?: number;
  /** Function values after the first two; 60 unless given. */
  readonly maxIterations?: number;
  /** What is being solved for. */
  readonly where?: string;
}

/** Two points between which a function changes sign. */
export interface Bracket {
  readonly low: number;
  readonly high: number;
}

/**
 * Grows a guessed interval geometrically, towards the end where the function is smaller, until its
 * sign changes over the newest piece; that piece is returned, for `findRoot`.
 *
 * Throws SolveError `no-bracket` when both limits are reached, or the steps are spent, without a
 * change of sign, and `not-finite`.
 */
export function expandBracket(
  f: (x: number) => number,
  low: number,
  high: number,
  options: BracketOptions = {},
): Bracket {
  const { least = -Infinity, most = Infinity, factor = 2, maxIterations = 60 } = options;
  const { where = "root" } = options;
  if (!(low < high && least <= low && high <= most && factor > 1) || !Number.isFinite(high - low)) {
    throw new InputError({
      code: "bad-bracket",
      where,
      problem: `a bracket cannot grow from ${low} to ${high} within ${least} to ${most} by ${factor}`,
      expected: "a lower end below the upper, both within the limits, and a factor above 1",
    });
  }
  let fLow = finiteAt(f(low), low, where);
  let fHigh = finiteAt(f(high), high, where);
  if (differ(fLow, fHigh)) return { low, high };
  for (let i = 0; i < maxIterations; i++) {
    if (low === least && high === most) break;
    const grow = (factor - 1) * (high - low);
    if (high === most || (low !== least && Math.abs(fLow) < Math.abs(fHigh))) {
      const next = Math.max(least, low - grow);
      const fNext = finiteAt(f(next), next, where);
      if (differ(fNext, fLow)) return { low: next, high: low };
      low = next;
      fLow = fNext;
    } else {
      const next = Math.min(most, high + grow);
      const fNext = finiteAt(f(next), next, where);
      if (differ(fHigh, fNext)) return { low: high, high: next };
      high = next;
      fHigh = fNext;
    }
  }
  throw new SolveError({
    code: "no-bracket",
    where,
    problem: `no change of sign from ${low} to ${high}: the function is ${fLow} and ${fHigh} there`,
    remedy: "check that a solution exists, or widen the limits",
  });
}

const differ = (a: number, b: number): boolean => a === 0 || b === 0 || a > 0 !== b > 0;
