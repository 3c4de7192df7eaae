import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { InputError } from "../../kernel-helpers/errors/index.js";
import { brownLawler } from "../../kernel-helpers/physics/drag/brown-lawler-2003.js";
import { methods } from "../../kernel-helpers/physics/registry.js";
import type { AnyArguments, AnyMethod } from "../../kernel-helpers/physics/any-method.js";
import { argumentsOf, SEED } from "./arguments.js";

type Numbers = { readonly [name: string]: number };

interface Band {
  /** Largest over smallest result of the members that have no finding. */
  readonly ratio: number;
  readonly why: string;
  /** Where the band holds, when not over the whole common range. */
  readonly when?: (args: Numbers) => boolean;
  /** Makes random arguments fit each other. */
  readonly fit?: (args: Numbers) => Numbers;
}

/** How far methods for the same thing may part over their common range. */
const BANDS: { readonly [family: string]: Band } = {
  "pipe friction factor (Darcy)": {
    ratio: 1.04,
    why: "explicit fits, each within 2-3 % of the implicit one",
  },
  "sphere drag coefficient": {
    ratio: 1.2,
    when: ({ Re = 0 }) => Re < 1e5,
    why: "the hump near Re 1e5, which one of the fits does not follow",
  },
  "terminal velocity of a free rod": {
    ratio: 1.3,
    why: "14 % mean error of the general law; tables hold their ends for thin rods",
  },
  "hindered settling exponent": {
    ratio: 1.15,
    fit: (args) => ({
      ...args,
      Ar: 0.75 * brownLawler.si({ Re: args.Re ?? 1 }) * (args.Re ?? 1) ** 2,
    }),
    when: ({ d = 1, D = 1 }) => d / D < 0.02,
    why: "the wall, which one leaves out and two judge differently",
  },
  "wall factor on the slip velocity of a sphere": {
    ratio: 1.15,
    when: ({ d = 1, D = 1 }) => d / D < 0.6,
    why: "empirical and approximate laws",
  },
  "voidage of a bed of spheres in a bore": {
    ratio: 1.25,
    why: "loose and shaken beds, and the zigzag that one law does not know",
  },
  "packed-bed pressure gradient": {
    ratio: 1.6,
    when: ({ eps = 1 }) => eps < 0.5,
    why: "smooth and average grains, wall or none",
  },
  "lift velocity of a pack": { ratio: 2, why: "one law does not know the voidage" },
};
/** Families whose members hold on two sides of one Reynolds number, or are a bound and a middle: see their tests. */
const APART = [
  "velocity of a rod in a bore",
  "flow that holds a rod still in a bore",
  "velocity of a leaning rod in a bore",
];

const families = new Map<string, AnyMethod[]>();
for (const m of methods) families.set(m.family, [...(families.get(m.family) ?? []), m]);
const shared = [...families].filter(([, members]) => members.length > 1);

/** Result and silence of each member; a member that lacks a choice ignores it. */
function silentResults(members: readonly AnyMethod[], args: AnyArguments): number[] {
  return members.flatMap((m) => {
    const own = Object.fromEntries(Object.entries(args).filter(([n]) => n in m.inputs));
    try {
      return m.findings(own).length === 0 ? [Math.abs(m.si(own))] : [];
    } catch (e) {
      if (e instanceof InputError) return [];
      throw e;
    }
  });
}

/** The member with the most inputs: the others may lack the choice of a law. */
const widest = (members: readonly AnyMethod[]): AnyMethod =>
  members.reduce((a, b) => (Object.keys(b.inputs).length > Object.keys(a.inputs).length ? b : a));

describe("methods for the same thing", () => {
  it("have a stated band each, and no band is left over", () => {
    const known = [...Object.keys(BANDS), ...APART].sort();
    expect(shared.map(([family]) => family).sort()).toEqual(known);
  });
  it.each(shared)("take the same inputs: %s", (_, members) => {
    const names = members.map((m) =>
      Object.keys(m.inputs)
        .filter((n) => n !== "law")
        .sort()
        .join(),
    );
    expect(new Set(names).size).toBe(1);
    expect(new Set(members.map((m) => m.result.kind)).size).toBe(1);
  });
  it.each(shared.filter(([family]) => family in BANDS))(
    "agree within their band: %s",
    (family, members) => {
      const band = BANDS[family];
      const ratio = band?.ratio ?? 1;
      let compared = 0;
      let worst = 1;
      fc.assert(
        fc.property(argumentsOf(widest(members)), (args) => {
          const numbers = args as Numbers;
          if (band?.when && !band.when(numbers)) return;
          const found = silentResults(members, band?.fit ? band.fit(numbers) : args);
          if (found.length < 2) return;
          compared += 1;
          worst = Math.max(worst, Math.max(...found) / Math.min(...found));
        }),
        { ...SEED, numRuns: 4000 },
      );
      expect(compared).toBeGreaterThan(20);
      expect(worst).toBeLessThan(ratio);
      expect(worst, "the band is no wider than it need be").toBeGreaterThan(1 + (ratio - 1) / 3);
    },
  );
});
