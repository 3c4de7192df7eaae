import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  liftVelocity,
  packLaws,
  packWeightGradient,
  wenYu,
  type PackLaw,
} from "../../../kernel-helpers/physics/bed/index.js";
import { SEED } from "../arguments.js";

const names = Object.keys(packLaws) as PackLaw[];
const grains = fc.record({
  d: fc.double({ min: 5e-5, max: 0.05, noNaN: true }),
  eps: fc.double({ min: 0.33, max: 0.6, noNaN: true }),
  rho: fc.double({ min: 1, max: 2000, noNaN: true }),
  rhoS: fc.double({ min: 2500, max: 19_000, noNaN: true }),
  mu: fc.double({ min: 1e-5, max: 1, noNaN: true }),
  D: fc.double({ min: 0.1, max: 0.5, noNaN: true }),
  theta: fc.double({ min: 0, max: 0.3, noNaN: true }),
});
const steel = { eps: 0.4, rho: 1000, rhoS: 7850, mu: 1e-3, D: 10, theta: 0 };

describe.each(names)("the lift velocity by %s", (law) => {
  it("is where the gradient carries the weight", () => {
    fc.assert(
      fc.property(grains, ({ d, eps, rho, rhoS, mu, D, theta }) => {
        const u = liftVelocity.si({ d, eps, rho, rhoS, mu, D, theta, law });
        const gradient = packLaws[law].si({ u, d, eps, rho, mu, D });
        const weight = packWeightGradient.si({ eps, rho, rhoS, theta });
        expect(Math.abs(gradient / weight - 1)).toBeLessThan(1e-11);
      }),
      SEED,
    );
  });
  it("rises with the grain, the solid's density and the voidage, and falls with lean", () => {
    fc.assert(
      fc.property(grains, ({ d, eps, rho, rhoS, mu, theta }) => {
        const at = (d: number, eps: number, rhoS: number, theta: number) =>
          liftVelocity.si({ d, eps, rho, rhoS, mu, D: 10, theta, law });
        const here = at(d, eps, rhoS, theta);
        expect(at(1.1 * d, eps, rhoS, theta)).toBeGreaterThan(here);
        expect(at(d, eps + 0.02, rhoS, theta)).toBeGreaterThan(here);
        expect(at(d, eps, 1.1 * rhoS, theta)).toBeGreaterThan(here);
        expect(at(d, eps, rhoS, theta + 0.1)).toBeLessThan(here);
      }),
      SEED,
    );
  });
  it("is nothing for grains as heavy as the fluid", () => {
    expect(
      liftVelocity.si({ d: 1e-3, eps: 0.4, rho: 1000, rhoS: 1000, mu: 1e-3, D: 1, theta: 0, law }),
    ).toBe(0);
  });
});

describe("the lift velocity", () => {
  const { eps, rho, rhoS, mu, D, theta } = steel;
  const of20mm = (law: PackLaw) => liftVelocity.si({ d: 0.02, eps, rho, rhoS, mu, D, theta, law });
  it("of 20 mm steel in water is that worked apart from this program (g = 9.81)", () => {
    expect(of20mm("ergun-1952")).toBeCloseTo(0.2204, 4);
    expect(of20mm("kta-1981")).toBeCloseTo(0.2647, 3);
    expect(of20mm("erdim-2015")).toBeCloseTo(0.2688, 3);
  });
  it("is lower by the law with the higher gradient", () => {
    expect(of20mm("ergun-1952")).toBeLessThan(of20mm("kta-1981"));
  });
  it("reports the chosen law's ranges at the velocity found, and no other's", () => {
    const given = { d: 0.05, eps, rho, rhoS, mu, D: 0.155, theta, law: "erdim-2015" } as const;
    const groups = liftVelocity.findings(given as never).map((f) => f.group);
    expect(groups).toEqual(["Re_m of erdim-2015", "D/d of erdim-2015"]);
  });
  it("of Wen and Yu is Ergun's at the voidages their constants stand for", () => {
    for (const [d, eps] of [
      [1e-4, 0.3828],
      [3e-2, 0.4149],
    ] as const) {
      const theirs = wenYu.si({ d, eps, rho, rhoS, mu, D, theta });
      const ergun = liftVelocity.si({ d, eps, rho, rhoS, mu, D, theta, law: "ergun-1952" });
      expect(Math.abs(theirs / ergun - 1)).toBeLessThan(0.03);
    }
  });
  it("of Wen and Yu keeps its digits for dust", () => {
    const d = 1e-7;
    const Ar = (d ** 3 * rho * (rhoS - rho) * 9.80665) / mu ** 2;
    const u = wenYu.si({ d, eps, rho, rhoS, mu, D, theta });
    expect((u * rho * d) / mu / ((0.0408 * Ar) / (2 * 33.7))).toBeCloseTo(1, 9);
  });
});
