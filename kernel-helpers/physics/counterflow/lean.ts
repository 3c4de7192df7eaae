import { InputError } from "../../errors/index.js";
import { broadsideCylinder } from "../drag/broadside-cylinder-table.js";
import { refuseTooWide } from "../refuse.js";
import type { Lean } from "./rod-balance.js";
import type { Rod } from "./rod-inputs.js";
import { rodLeanLimit } from "./rod-lean-limit.js";

export const leanInput = {
  kind: "angle",
  symbol: "t",
  note: "angle of the rod from the axis of the bore",
  possible: { from: 0, to: Math.PI / 2 },
  range: [0, Math.PI / 6],
  stated: false,
} as const;

export const leanFamily = "velocity of a leaning rod in a bore";

/** Rounding of an angle that another step has computed. */
const SLACK = 1e-9;

/** What a leaning rod blocks and shows; `exponent` of sin t is 1 for its projected area, 3 for the cross-flow principle. */
export function leanOf(where: string, rod: Rod, t: number, exponent: 1 | 3): Lean {
  const { d, D, L } = rod;
  refuseTooWide(where, d, D);
  const limit = rodLeanLimit.si({ d, D, L });
  if (t > limit + SLACK)
    throw new InputError({
      code: "out-of-bounds",
      where: `${where}.lean`,
      problem: `cannot be ${t} rad: the rod touches the bore on both sides at ${limit} rad`,
      expected: "an angle of at most the largest lean",
    });
  const Cd = broadsideCylinder.si({ L, d });
  return {
    blockedArea: midSection(d, L, t),
    sideDrag: Cd * L * d * Math.sin(t) ** exponent,
  };
}

/** Area that the rod's middle cuts from the bore: an ellipse, cut short by the ends of a rod far over. */
function midSection(d: number, L: number, t: number): number {
  const a = d / 2 / Math.cos(t);
  const h = L / 2 / Math.sin(t);
  if (h >= a) return (Math.PI * a * d) / 2;
  const x = h / a;
  return d * (h * Math.sqrt(1 - x ** 2) + a * Math.asin(x));
}
