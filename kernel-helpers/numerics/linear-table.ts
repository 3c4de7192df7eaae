import { assertTablePoints, intervalOf, placeWithin, type TablePoints } from "./table-points.js";

/** A function known at points and straight between them. */
export interface LinearTable {
  (x: number): number;
  readonly low: number;
  readonly high: number;
}

/**
 * Straight lines between points. The points are copied and checked once; a value outside them is
 * refused with `outside-table`.
 */
export function linearTable(points: TablePoints): LinearTable {
  assertTablePoints(points);
  const x = [...points.x];
  const y = [...points.y];
  const { where } = points;
  const at = (place: number): number => {
    const here = placeWithin({ x, where }, place);
    const i = intervalOf(x, here);
    return between(x[i] as number, y[i] as number, x[i + 1] as number, y[i + 1] as number, here);
  };
  return Object.assign(at, { low: x[0] as number, high: x[x.length - 1] as number });
}

/**
 * One value by straight lines between points, which are checked at every call; in a loop use
 * `linearTable`. A value outside the points is refused with `outside-table`.
 */
export const interpolate = (points: TablePoints, x: number): number => linearTable(points)(x);

// Exact at both ends, and never outside the two ordinates.
function between(x0: number, y0: number, x1: number, y1: number, x: number): number {
  const t = (x - x0) / (x1 - x0);
  return t === 1 ? y1 : y0 * (1 - t) + y1 * t;
}
