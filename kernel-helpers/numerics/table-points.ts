import { InputError } from "../errors/index.js";

/** The points of a table of one variable. */
export interface TablePoints {
  /** Strictly increasing. */
  readonly x: readonly number[];
  readonly y: readonly number[];
  /** What the table is, for messages: `"gas viscosity"`. */
  readonly where: string;
}

/** Throws unless there are at least two finite points with strictly increasing abscissae. */
export function assertTablePoints({ x, y, where }: TablePoints): void {
  if (x.length !== y.length || x.length < 2) {
    throw new InputError({
      code: "bad-table",
      where,
      problem: `has ${x.length} abscissae and ${y.length} ordinates`,
      expected: "as many of both, and at least two",
    });
  }
  for (let i = 0; i < x.length; i++) {
    const xi = x[i] as number;
    const yi = y[i] as number;
    if (!Number.isFinite(xi) || !Number.isFinite(yi)) {
      throw new InputError({
        code: "not-a-number",
        where: `${where}[${i}]`,
        problem: `cannot be the point (${xi}, ${yi})`,
        expected: "two finite numbers",
      });
    }
    if (i > 0 && !(xi > (x[i - 1] as number))) {
      throw new InputError({
        code: "not-increasing",
        where: `${where}.x[${i}]`,
        problem: `${xi} follows ${x[i - 1] as number}`,
        expected: "strictly increasing abscissae",
      });
    }
  }
}

/**
 * A place within the table. One outside by less than 1e-12 of its span, as the rounding of a grid
 * leaves it, is the end; any other is refused.
 */
export function placeWithin({ x, where }: Pick<TablePoints, "x" | "where">, at: number): number {
  const low = x[0] as number;
  const high = x[x.length - 1] as number;
  if (at >= low && at <= high) return at;
  const slack = 1e-12 * (high - low);
  if (at < low && at >= low - slack) return low;
  if (at > high && at <= high + slack) return high;
  throw new InputError({
    code: "outside-table",
    where,
    problem: `is not known at ${at}`,
    expected: `${low} to ${high}`,
    remedy: "a table is not extrapolated: extend it from its source",
  });
}

/** The index of the interval that holds a place within the table. */
export function intervalOf(x: readonly number[], at: number): number {
  let left = 0;
  let right = x.length - 1;
  while (right - left > 1) {
    const middle = (left + right) >> 1;
    if ((x[middle] as number) <= at) left = middle;
    else right = middle;
  }
  return left;
}
