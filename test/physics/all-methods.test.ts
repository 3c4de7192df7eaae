import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { InputError } from "../../kernel-helpers/errors/index.js";
import { methods } from "../../kernel-helpers/physics/registry.js";
import { argumentsOf, SEED } from "./arguments.js";

/** The result; undefined where the arguments do not fit together, as a rod that cannot lean so far. */
function attempt(run: () => unknown): number | undefined {
  try {
    return run() as number;
  } catch (e) {
    if (e instanceof InputError) return undefined;
    throw e;
  }
}

describe.each(methods.map((m) => [m.id, m] as const))("%s", (id, m) => {
  it("is finite over random input", () => {
    let refused = 0;
    fc.assert(
      fc.property(argumentsOf(m), (args) => {
        const x = attempt(() => m.apply(args).live);
        if (x === undefined) refused += 1;
        else expect(Number.isFinite(x)).toBe(true);
      }),
      SEED,
    );
    expect(refused).toBeLessThan(SEED.numRuns / 2);
  });

  it("notices each of its ranges, and is silent inside them", () => {
    const loud = new Set<string>();
    const silent = new Set<string>();
    fc.assert(
      fc.property(argumentsOf(m), (args) => {
        const found = attempt(() => new Set(m.findings(args).map((f) => f.group))) as unknown as
          Set<string> | undefined;
        if (found === undefined) return;
        for (const { group } of m.rules) (found.has(group) ? loud : silent).add(group);
      }),
      { ...SEED, numRuns: 3000 },
    );
    const groups = m.rules.map((r) => r.group).sort();
    expect([...loud].sort()).toEqual(groups);
    expect([...silent].sort()).toEqual(groups);
  });

  const some = fc.sample(argumentsOf(m), { seed: 1, numRuns: 1 })[0] ?? {};
  for (const [name, field] of Object.entries(m.inputs)) {
    const { possible } = field;
    const wrong: unknown[] = [NaN, Infinity, "12", undefined, null];
    if (possible?.above !== undefined) wrong.push(possible.above, possible.above - 1);
    if (possible?.from !== undefined) wrong.push(possible.from - 1);
    if (possible?.below !== undefined) wrong.push(possible.below);
    if (possible?.to !== undefined) wrong.push(possible.to + 1);
    it(`refuses an impossible ${name} by its name`, () => {
      for (const x of wrong)
        expect(() => m.apply({ ...some, [name]: x }), String(x)).toThrow(
          expect.objectContaining({ name: "InputError", where: `${id}.${name}` }) as Error,
        );
    });
  }
  it("refuses an input that it does not have", () => {
    expect(() => m.apply({ ...some, colour: 1 })).toThrow(
      expect.objectContaining({ code: "unknown-field", where: `${id}.colour` }) as Error,
    );
  });
  const { d, D, rho, rhoS } = m.inputs as { readonly [name: string]: unknown };
  if (d !== undefined && D !== undefined && !m.family.includes("bed") && !/pack/.test(m.family))
    it("refuses a body wider than the bore", () => {
      expect(() => m.apply({ ...some, d: 0.2, D: 0.1 })).toThrow(
        expect.objectContaining({ code: "out-of-bounds", where: `${id}.d` }) as Error,
      );
    });
  if (rho !== undefined && rhoS !== undefined)
    it("refuses a solid lighter than the fluid", () => {
      expect(() => m.apply({ ...some, rho: 1000, rhoS: 900 })).toThrow(
        expect.objectContaining({ code: "out-of-bounds", where: `${id}.rhoS` }) as Error,
      );
    });
});
