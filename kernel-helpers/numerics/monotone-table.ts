import { InputError } from "../errors/index.js";
import { assertTablePoints, intervalOf, placeWithin, type TablePoints } from "./table-points.js";

/** A smooth monotone function through points. */
export interface MonotoneTable {
  (x: number): number;
  /** The first derivative, which is continuous. */
  readonly slope: (x: number) => number;
  readonly low: number;
  readonly high: number;
}

/**
 * A cubic through each pair of points, with a continuous slope, that never turns back: it stays
 * within the two ordinates of its interval. Slopes are those of a parabola through three points,
 * limited to the circle α² + β² ≤ 9 in units of the secant. A parabola that is monotone is reproduced
 * where no limit acts; a value outside the points is refused with `outside-table`, ordinates that turn
 * back with `not-monotone`.
 * Fritsch and Carlson, SIAM J. Numer. Anal. 17 (1980) 238.
 */
export function monotoneTable(points: TablePoints): MonotoneTable {
  assertTablePoints(points);
  const x = [...points.x];
  const y = [...points.y];
  const { where } = points;
  const step: number[] = [];
  const secant: number[] = [];
  for (let i = 0; i + 1 < x.length; i++) {
    step.push((x[i + 1] as number) - (x[i] as number));
    secant.push(((y[i + 1] as number) - (y[i] as number)) / (step[i] as number));
  }
  assertMonotone(secant, where);
  const slopes = limited(parabolic(step, secant), secant);

  const evaluate = (place: number, derivative: boolean): number => {
    const at = placeWithin({ x, where }, place);
    const i = intervalOf(x, at);
    const h = step[i] as number;
    const t = (at - (x[i] as number)) / h;
    const d = secant[i] as number;
    const m0 = slopes[i] as number;
    const m1 = slopes[i + 1] as number;
    // y = y0 + h·t·(m0 + t·(c2 + t·c3))
    const c2 = 3 * d - 2 * m0 - m1;
    const c3 = m0 + m1 - 2 * d;
    if (derivative) return m0 + t * (2 * c2 + 3 * t * c3);
    const y0 = y[i] as number;
    const y1 = y[i + 1] as number;
    if (t === 1) return y1;
    // Rounding may step past an ordinate by one unit in the last place.
    const value = y0 + h * t * (m0 + t * (c2 + t * c3));
    return Math.min(Math.max(value, Math.min(y0, y1)), Math.max(y0, y1));
  };
  return Object.assign((at: number) => evaluate(at, false), {
    slope: (at: number) => evaluate(at, true),
    low: x[0] as number,
    high: x[x.length - 1] as number,
  });
}

function assertMonotone(secant: readonly number[], where: string): void {
  const rise = secant.findIndex((d) => d > 0);
  const fall = secant.findIndex((d) => d < 0);
  if (rise < 0 || fall < 0) return;
  throw new InputError({
    code: "not-monotone",
    where,
    problem: `rises after point ${rise} and falls after point ${fall}`,
    expected: "ordinates that only rise or only fall",
  });
}

function parabolic(step: readonly number[], secant: readonly number[]): number[] {
  const last = secant.length - 1;
  const h = (i: number): number => step[i] as number;
  const d = (i: number): number => secant[i] as number;
  if (last === 0) return [d(0), d(0)];
  const atEnd = (near: number, next: number): number => {
    const m = ((2 * h(near) + h(next)) * d(near) - h(near) * d(next)) / (h(near) + h(next));
    return m * d(near) > 0 ? m : 0;
  };
  const inner = secant
    .slice(1)
    .map((_, i) => (h(i) * d(i + 1) + h(i + 1) * d(i)) / (h(i) + h(i + 1)));
  return [atEnd(0, 1), ...inner, atEnd(last, last - 1)];
}

function limited(start: readonly number[], secant: readonly number[]): number[] {
  const m = [...start];
  secant.forEach((d, i) => {
    if (d === 0) {
      m[i] = m[i + 1] = 0;
      return;
    }
    const alpha = (m[i] as number) / d;
    const beta = (m[i + 1] as number) / d;
    const length = Math.hypot(alpha, beta);
    if (length <= 3) return;
    m[i] = ((3 * alpha) / length) * d;
    m[i + 1] = ((3 * beta) / length) * d;
  });
  return m;
}
