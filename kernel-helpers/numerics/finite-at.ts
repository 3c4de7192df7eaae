import { SolveError } from "../errors/index.js";

/** The value of a function at a point, refused when it is NaN or infinite. */
export function finiteAt(y: number, x: number, where: string): number {
  if (Number.isFinite(y)) return y;
  throw new SolveError({
    code: "not-finite",
    where,
    problem: `the function is ${y} at ${x}`,
    expected: "a finite value over the whole range",
  });
}
