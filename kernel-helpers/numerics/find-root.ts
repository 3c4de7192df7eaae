import { InputError, SolveError } from "../errors/index.js";
import { finiteAt } from "./finite-at.js";

/** How close a root must be, and what it is called in a message. */
export interface RootOptions {
  /** Width of the final bracket relative to the root; 1e-12 unless given. */
  readonly relative?: number;
  /** Width of the final bracket, for roots at or near zero; 1e-30 unless given. */
  readonly absolute?: number;
  /** Function values after the two ends; 200 unless given. */
  readonly maxIterations?: number;
  /** What is being solved for: `"bottomhole pressure"`. */
  readonly where?: string;
}

/**
 * The root of a continuous function between two points where its signs differ.
 *
 * Inverse quadratic interpolation where the last three points lie on a curve that allows it,
 * bisection otherwise, so that a hard function costs little more than bisection. The result lies
 * within max(absolute, relative·|x|) of a change of sign, and an end that is a root is returned
 * exactly. Allocates nothing while it runs.
 *
 * Throws SolveError: `no-bracket` (the signs at the ends agree), `not-finite` (f is NaN or
 * infinite), `no-convergence`, `pole` (f changes sign through infinity, not through zero).
 * Chandrupatla, Advances in Engineering Software 28 (1997) 145.
 */
export function findRoot(
  f: (x: number) => number,
  low: number,
  high: number,
  options: RootOptions = {},
): number {
  const { relative = 1e-12, absolute = 1e-30, maxIterations = 200, where = "root" } = options;
  assertBracket(low, high, where);

  // The root lies between a, the newest point, and b; c is the point that was dropped last.
  let b = low;
  let fb = finiteAt(f(b), b, where);
  if (fb === 0) return b;
  let a = high;
  let fa = finiteAt(f(a), a, where);
  if (fa === 0) return a;
  if (fa > 0 === fb > 0) throw noBracket(low, fb, high, fa, where);
  const largest = Math.max(Math.abs(fa), Math.abs(fb));
  let part = 0.5;

  for (let i = 0; i < maxIterations; i++) {
    const x = a + part * (b - a);
    const fx = finiteAt(f(x), x, where);
    if (fx === 0) return x;
    let c = a;
    let fc = fa;
    if (fx > 0 !== fa > 0) {
      c = b;
      fc = fb;
      b = a;
      fb = fa;
    }
    a = x;
    fa = fx;

    const isNewestBest = Math.abs(fa) < Math.abs(fb);
    const best = isNewestBest ? a : b;
    const size = Math.abs(best);
    const tolerance = 2 * Number.EPSILON * size + 0.5 * Math.max(absolute, relative * size);
    const width = Math.abs(b - a);
    if (width < 2 * tolerance) {
      const fBest = isNewestBest ? fa : fb;
      if (Math.abs(fBest) > largest) throw pole(best, fBest, where);
      return best;
    }
    const xi = (a - b) / (c - b);
    const phi = (fa - fb) / (fc - fb);
    part = 0.5;
    if (phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi) {
      part =
        (fa / (fb - fa)) * (fc / (fb - fc)) +
        ((c - a) / (b - a)) * (fa / (fc - fa)) * (fb / (fc - fb));
    }
    const least = tolerance / width;
    part = Math.min(1 - least, Math.max(least, part));
  }
  throw new SolveError({
    code: "no-convergence",
    where,
    problem: `is not found in ${maxIterations} iterations: the last bracket is ${Math.min(a, b)} to ${Math.max(a, b)}`,
    remedy: "allow more iterations, or a wider tolerance",
  });
}

function assertBracket(low: number, high: number, where: string): void {
  if (Number.isFinite(low) && Number.isFinite(high) && low <= high) return;
  throw new InputError({
    code: "bad-bracket",
    where,
    problem: `cannot be sought from ${low} to ${high}`,
    expected: "two finite ends, the lower first",
  });
}

const noBracket = (low: number, fLow: number, high: number, fHigh: number, where: string) =>
  new SolveError({
    code: "no-bracket",
    where,
    problem: `no change of sign: the function is ${fLow} at ${low} and ${fHigh} at ${high}`,
    expected: "values of opposite sign at the two ends",
  });

const pole = (x: number, y: number, where: string) =>
  new SolveError({
    code: "pole",
    where,
    problem: `the function changes sign at ${x} without passing zero: it is ${y} there`,
    expected: "a continuous function",
  });
