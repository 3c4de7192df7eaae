import { findRoot } from "../numerics/index.js";

/** Bounds on d ln f/d ln x within which a secant step is trusted. */
const FLATTEST = 0.25;
const STEEPEST = 8;
/** Longest secant step in ln x. */
const LONGEST = 5;
/** How far from 1 a root is sought, in ln x: squares of it stay finite. */
const FARTHEST = 300;

/** The product of the last three residuals below which an inverse quadratic step is the last. */
const LAST_PRODUCT = 1e-14;

export interface RisingRoot {
  /** Positive, and rising like a power of x: drag, friction, the gradient of a pack. */
  readonly f: (x: number) => number;
  readonly target: number;
  /** A first x of the right order. */
  readonly guess: number;
  /** d ln f/d ln x near it. */
  readonly rise: number;
  /** Highest x sought, where f stops rising; none when left out. */
  readonly limit?: number;
  readonly where: string;
}

/**
 * The x at which a rising power-like function reaches a positive target.
 *
 * Works on ln f against ln x, where such functions are nearly straight: a secant step, then inverse
 * quadratic ones, four or five values of f for full precision. Where the function jumps or bends too
 * much, a bracket is widened from the guess and the root finder takes over. Throws SolveError as the
 * root finder does.
 */
export function risingRoot(parts: RisingRoot): number {
  const { f, target, guess, rise, limit = Infinity } = parts;
  let x = Math.min(guess, limit);
  // r = ln f/target at the last three points; q = d ln x/d ln f between the last two, and before
  let r = Math.log(f(x) / target);
  let r1 = 1;
  let r2 = 1;
  let q = 1 / rise;
  let q1 = q;
  for (let i = 0; i < 20; i++) {
    let step = -r * q;
    if (i > 1) {
      const bend = (r * r1 * (q - q1)) / (r - r2);
      if (Math.abs(bend) < 0.5 * Math.abs(step)) step += bend;
    }
    if (!(Math.abs(step) < LONGEST)) break;
    let next = x * Math.exp(step);
    if (next > limit) {
      if (x === limit) break;
      next = limit;
      step = Math.log(next / x);
    }
    if (i > 1 && Math.abs(r * r1 * r2) < LAST_PRODUCT) return next;
    x = next;
    r2 = r1;
    r1 = r;
    r = Math.log(f(x) / target);
    if (Math.abs(r) < 1e-15) return x;
    q1 = q;
    q = step / (r - r1);
    if (!(q > 1 / STEEPEST && q < 1 / FLATTEST)) break;
  }
  return Math.abs(r) < 1e-14 ? x : bracketed(parts);
}

function bracketed({ f, target, guess, limit = Infinity, where }: RisingRoot): number {
  const g = (s: number): number => Math.log(f(Math.exp(s)) / target);
  const end = Math.min(Math.log(limit), FARTHEST);
  let low = Math.min(Math.log(guess), end);
  let high = low;
  for (let i = 0; i < 60 && low > -FARTHEST && g(low) > 0; i++) low -= 2 ** Math.min(i, 5);
  for (let i = 0; i < 60 && high < end && g(high) < 0; i++)
    high = Math.min(high + 2 ** Math.min(i, 5), end);
  return Math.exp(findRoot(g, low, high, { relative: 1e-15, absolute: 1e-14, where }));
}
