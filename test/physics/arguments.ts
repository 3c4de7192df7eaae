import fc from "fast-check";
import type { AnyArguments, AnyMethod } from "../../kernel-helpers/physics/any-method.js";

/** What an input may be in a well, in SI and wider than the ranges of most laws; d is always below D. */
const SPANS: {
  readonly [name: string]: readonly [low: number, high: number, how: "log" | "flat"];
} = {
  Re: [1e-2, 1e7, "log"],
  Ar: [1e-1, 1e10, "log"],
  D: [0.06, 0.5, "log"],
  J: [-3, 3, "flat"],
  L: [0.02, 30, "log"],
  d: [1e-4, 0.0599, "log"],
  eD: [1e-7, 0.2, "log"],
  eps: [0.25, 0.95, "flat"],
  f: [0.005, 0.1, "log"],
  lean: [0, 0.9, "flat"],
  mu: [1e-5, 3, "log"],
  n: [2, 8, "flat"],
  psi: [0.1, 1, "flat"],
  psiPar: [0.1, 10, "log"],
  psiPerp: [0.1, 10, "log"],
  q: [-1, 1, "flat"],
  rho: [1, 2200, "log"],
  rhoS: [2500, 19_500, "log"],
  theta: [0, 1.5, "flat"],
  u: [-10, 10, "flat"],
  v: [-10, 10, "flat"],
};

/** Evenly spread, which floating-point arbitraries are not. */
const STEPS = 2 ** 30;

const span = (name: string, isPositive: boolean): fc.Arbitrary<number> => {
  const found = SPANS[name];
  if (!found) throw new Error(`no span for the input ${name}: add one`);
  const [low, high, how] = found;
  const from = isPositive ? Math.max(low, high / 1e5) : low;
  return fc
    .integer({ min: 0, max: STEPS })
    .map((i) => i / STEPS)
    .map((x) => (how === "log" ? low * (high / low) ** x : from + (high - from) * x));
};

/** Random arguments of a method. */
export function argumentsOf(method: AnyMethod): fc.Arbitrary<AnyArguments> {
  const fields = Object.entries(method.inputs).map(([name, field]) => {
    if (typeof field.kind === "string")
      return [name, span(name, field.possible?.above === 0)] as const;
    if (field.kind.type === "oneOf") return [name, fc.constantFrom(...field.kind.among)] as const;
    throw new Error(`${method.id}.${name}: no arbitrary for ${field.kind.type}`);
  });
  return fc.record(Object.fromEntries(fields) as { [n: string]: fc.Arbitrary<number | string> });
}

export const SEED = { seed: 20_240_601, numRuns: 300 };
