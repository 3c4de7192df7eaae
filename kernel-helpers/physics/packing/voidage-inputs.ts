import { InputError } from "../../errors/index.js";
import { positive } from "../../method/index.js";
import { bore } from "../fields.js";

export const sphereBedInputs = {
  d: { kind: "length", symbol: "d", note: "diameter of the spheres", possible: positive },
  D: bore,
} as const;

export const sphereBedFamily = "voidage of a bed of spheres in a bore";

export const bedVoidage = {
  kind: "dimensionless",
  symbol: String.raw`\varepsilon`,
  note: "mean voidage over the whole bore",
} as const;

export interface Pair {
  readonly d: number;
  readonly D: number;
}

/** d/D, refused when the grain does not fit the bore. */
export function fittingRatio(where: string, { d, D }: Pair): number {
  if (d <= D) return d / D;
  throw new InputError({
    code: "out-of-bounds",
    where: `${where}.d`,
    problem: `cannot be ${d} m in a bore of ${D} m`,
    expected: "a diameter of at most that of the bore",
  });
}
