import { findRoot } from "../numerics/index.js";

/** Bounds on d ln f/d ln x within which a secant step is trusted. */
const FLATTEST = 0.25;
const STEEPEST = 8;
/** Longest secant step in ln x. */
const LONGEST = 5;
/** How far from 1 a root is sought, in ln x: squares of it stay finite. */
const FARTHEST = 300;

export interface RisingRoot {
  /** Positive, and rising like a power of x: drag, friction, the gradient of a pack. */
  readonly f: (x: number) => number;
  readonly target: number;
  /** A first x of the right order. */
  readonly guess: number;
  /** Highest x sought, where f stops rising; none when left out. */
  readonly limit?: number;
  readonly where: string;
}

/**
 * The x at which a rising power-like function reaches a positive target.
 *
 * Secant steps on ln f against ln x, where such functions are nearly straight: five or six values
 * of f for full precision. Where the function jumps or bends too much, a bracket is widened from the
 * guess and the root finder takes over. Throws SolveError as the root finder does.
 */
export function risingRoot({ f, target, guess, limit = Infinity, where }: RisingRoot): number {
  const end = Math.log(limit);
  let s = Math.min(Math.log(guess), end);
  let r = Math.log(f(Math.exp(s)) / target);
  let slope = 1.5;
  for (let i = 0; i < 25 && slope > FLATTEST && slope < STEEPEST; i++) {
    const step = Math.max(-LONGEST, Math.min(-r / slope, LONGEST, end - s));
    if (Math.abs(step) < 1e-15 * Math.max(1, Math.abs(s))) {
      if (Math.abs(r) < 1e-12) return Math.exp(s);
      break;
    }
    s += step;
    const before = r;
    r = Math.log(f(Math.exp(s)) / target);
    if (Math.abs(r) < 4e-15) return Math.exp(s);
    if (Math.abs(r - before) > 1e-13) slope = (r - before) / step;
    else if (Math.abs(r) < 1e-12) return Math.exp(s);
    else break;
  }
  return bracketed(f, target, Math.min(guess, limit), limit, where);
}

function bracketed(
  f: (x: number) => number,
  target: number,
  guess: number,
  limit: number,
  where: string,
): number {
  const g = (s: number): number => Math.log(f(Math.exp(s)) / target);
  const end = Math.min(Math.log(limit), FARTHEST);
  let low = Math.log(guess);
  let high = low;
  for (let i = 0; i < 60 && low > -FARTHEST && g(low) > 0; i++) low -= 2 ** Math.min(i, 5);
  for (let i = 0; i < 60 && high < end && g(high) < 0; i++)
    high = Math.min(high + 2 ** Math.min(i, 5), end);
  return Math.exp(findRoot(g, low, high, { relative: 1e-15, absolute: 1e-14, where }));
}
