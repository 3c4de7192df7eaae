import { InputError, SolveError } from "../errors/index.js";
import { finiteAt } from "./finite-at.js";

// Kronrod's 15 nodes on [-1, 1] (the negative half mirrors them), their weights, and the weights of
// the 7 Gauss nodes among them: Piessens et al., QUADPACK (1983), table for qk15.
const NODES = [
  0, 0.20778495500789848, 0.4058451513773972, 0.5860872354676911, 0.7415311855993945,
  0.8648644233597691, 0.9491079123427585, 0.9914553711208126,
] as const;
const KRONROD = [
  0.20948214108472782, 0.20443294007529889, 0.1903505780647854, 0.1690047266392679,
  0.14065325971552592, 0.10479001032225019, 0.06309209262997856, 0.022935322010529224,
] as const;
const GAUSS = [
  0.4179591836734694, 0, 0.3818300505051189, 0, 0.27970539148927664, 0, 0.1294849661688697, 0,
] as const;

/** How close an integral must be. */
export interface QuadratureOptions {
  /** Error relative to the integral; 1e-10 unless given. */
  readonly relative?: number;
  /** Error, for integrals at or near zero; 0 unless given (rounding is always allowed for). */
  readonly absolute?: number;
  /** Intervals the range may be cut into; 500 unless given. */
  readonly maxIntervals?: number;
  /** What is being integrated. */
  readonly where?: string;
}

interface Piece {
  readonly low: number;
  readonly high: number;
  readonly value: number;
  readonly size: number;
  readonly error: number;
}

/**
 * The integral of a function between two finite ends, by the 7-15 point Gauss-Kronrod pair; the
 * interval with the largest error estimate is halved until the sum of the estimates is within the
 * tolerance. The ends themselves are never evaluated, so that an integrable singularity may lie there.
 *
 * Throws SolveError: `not-finite`, `no-convergence` (with the place where the error sits).
 * Piessens et al., QUADPACK (1983).
 */
export function integrate(
  f: (x: number) => number,
  low: number,
  high: number,
  options: QuadratureOptions = {},
): number {
  const { relative = 1e-10, absolute = 0, maxIntervals = 500, where = "integral" } = options;
  if (!Number.isFinite(low) || !Number.isFinite(high)) {
    throw new InputError({
      code: "bad-range",
      where,
      problem: `cannot be taken from ${low} to ${high}`,
      expected: "two finite ends",
    });
  }
  if (low === high) return 0;
  const pieces = [evaluate(f, low, high, where)];
  for (;;) {
    let value = 0;
    let error = 0;
    let size = 0;
    let worst = 0;
    pieces.forEach((p, i) => {
      value += p.value;
      error += p.error;
      size += p.size;
      if (p.error > (pieces[worst] as Piece).error) worst = i;
    });
    const rounding = 50 * Number.EPSILON * size;
    if (error <= Math.max(absolute, relative * Math.abs(value), rounding)) return value;
    const { low: a, high: b } = pieces[worst] as Piece;
    const middle = a + 0.5 * (b - a);
    if (pieces.length >= maxIntervals || middle === a || middle === b) {
      throw new SolveError({
        code: "no-convergence",
        where,
        problem: `is ${value} ± ${error} in ${pieces.length} intervals, the worst from ${a} to ${b}`,
        remedy: "split the range where the function jumps, or widen the tolerance",
      });
    }
    pieces[worst] = evaluate(f, a, middle, where);
    pieces.push(evaluate(f, middle, b, where));
  }
}

function evaluate(f: (x: number) => number, low: number, high: number, where: string): Piece {
  const centre = low + 0.5 * (high - low);
  const half = 0.5 * (high - low);
  const values: number[] = [];
  let kronrod = 0;
  let gauss = 0;
  let size = 0;
  for (let i = 0; i < NODES.length; i++) {
    for (const side of i === 0 ? [1] : [-1, 1]) {
      const x = centre + side * half * (NODES[i] as number);
      const y = finiteAt(f(x), x, where);
      values.push(y);
      kronrod += (KRONROD[i] as number) * y;
      gauss += (GAUSS[i] as number) * y;
      size += (KRONROD[i] as number) * Math.abs(y);
    }
  }
  // The difference of the two rules overstates the error of the better one; QUADPACK scales it by
  // the function's variation about its mean.
  const mean = kronrod / 2;
  let variation = 0;
  for (let i = 0; i < values.length; i++)
    variation += (KRONROD[(i + 1) >> 1] as number) * Math.abs((values[i] as number) - mean);
  const raw = Math.abs(kronrod - gauss);
  const scaled = variation > 0 ? variation * Math.min(1, ((200 * raw) / variation) ** 1.5) : raw;
  const width = Math.abs(half);
  return { low, high, value: half * kronrod, size: width * size, error: width * scaled };
}
