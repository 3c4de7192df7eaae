import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  crisisOnset,
  freeRodHoelzerSommerfeld,
  freeRodNewton,
  sphereLaws,
  terminalVelocitySphere,
  type SphereLaw,
} from "../../../kernel-helpers/physics/settling/index.js";
import { SEED } from "../arguments.js";

const names = Object.keys(sphereLaws) as SphereLaw[];
const g = 9.80665;
const decades = (low: number, high: number) =>
  fc.double({ min: low, max: high, noNaN: true }).map((w) => 10 ** w);
const ball = fc.record({
  d: decades(-7, 0),
  rho: decades(-1, 3.3),
  excess: decades(-3, 4.3),
  mu: decades(-6, 3),
});

describe.each(names)("the terminal velocity by %s", (law) => {
  const drag = sphereLaws[law];
  it("carries the weight, over fifteen decades of Archimedes number", () => {
    fc.assert(
      fc.property(ball, ({ d, rho, excess, mu }) => {
        const rhoS = rho + excess;
        const v = terminalVelocitySphere.si({ d, rho, rhoS, mu, law });
        const Re = (rho * v * d) / mu;
        const force = (Re: number) => drag.si({ Re }) * Re ** 2;
        const weight = (4 / 3) * ((d ** 3 * rho * (rhoS - rho) * g) / mu ** 2);
        // at a jump between segments the weight lies between the two sides
        const side = 1e-9;
        const low = Math.min(force(Re * (1 - side)), force(Re * (1 + side)));
        const high = Math.max(force(Re * (1 - side)), force(Re * (1 + side)));
        expect(weight).toBeGreaterThan(low * (1 - 1e-8));
        expect(weight).toBeLessThan(high * (1 + 1e-8));
      }),
      { ...SEED, numRuns: 1000 },
    );
  });
  it("rises with the sphere and the solid's density, over the whole range but the crisis", () => {
    fc.assert(
      fc.property(ball, ({ d, rho, excess, mu }) => {
        const at = (d: number, more: number) =>
          terminalVelocitySphere.si({ d, rho, rhoS: rho + more, mu, law });
        expect(at(1.05 * d, excess)).toBeGreaterThan(at(d, excess));
        expect(at(d, 1.05 * excess)).toBeGreaterThan(at(d, excess));
      }),
      SEED,
    );
  });
  it("is nothing for a sphere as heavy as the fluid", () => {
    expect(terminalVelocitySphere.si({ d: 0.01, rho: 1000, rhoS: 1000, mu: 1e-3, law })).toBe(0);
  });
});

describe("a drag crisis", () => {
  it.each(["clift-grace-weber-1978", "morrison-2013"] as const)(
    "gives the lowest of three velocities by %s",
    (law) => {
      const drag = sphereLaws[law];
      const force = (Re: number) => drag.si({ Re }) * Re ** 2;
      const onset = crisisOnset[law];
      for (const share of [0.72, 0.8, 0.9, 0.99]) {
        const weight = share * force(onset);
        // d and µ such that 4/3 Ar is the weight
        const rho = 1000;
        const rhoS = 7850;
        const mu = 1e-3;
        const d = ((0.75 * weight * mu ** 2) / (rho * (rhoS - rho) * g)) ** (1 / 3);
        const v = terminalVelocitySphere.si({ d, rho, rhoS, mu, law });
        const Re = (rho * v * d) / mu;
        expect(Re).toBeLessThan(onset);
        expect(force(Re) / weight).toBeCloseTo(1, 9);
        // a scan from below meets no crossing before it
        for (let x = Re / 100; x < Re * 0.999; x *= 1.002) expect(force(x)).toBeLessThan(weight);
        // and there is a higher one
        let crossings = 0;
        for (let x = Re * 1.001; x < 5e6; x *= 1.001)
          if (force(x) < weight !== force(x * 1.001) < weight) crossings += 1;
        expect(crossings).toBe(2);
      }
    },
  );
  it.each(["clift-grace-weber-1978", "morrison-2013"] as const)(
    "begins where the force by %s first stops rising",
    (law) => {
      const force = (Re: number) => sphereLaws[law].si({ Re }) * Re ** 2;
      const onset = crisisOnset[law];
      for (let Re = 1e-3; Re < onset * 0.9999; Re *= 1.001)
        expect(force(Math.min(Re * 1.001, onset))).toBeGreaterThan(force(Re));
      expect(force(onset * 1.002)).toBeLessThan(force(onset));
    },
  );
  it("is not fallen into by the laws that end below it", () => {
    expect(names.filter((n) => crisisOnset[n] === Infinity)).toHaveLength(names.length - 2);
  });
  it("is told of by a finding", () => {
    const given = { d: 0.1, rho: 1000, rhoS: 11_340, mu: 1e-3, law: "brown-lawler-2003" } as const;
    const [finding] = terminalVelocitySphere.findings(given as never);
    expect(finding?.group).toBe("Re of brown-lawler-2003");
    expect(finding?.worst).toBeGreaterThan(3e5);
  });
});

describe("a free rod", () => {
  const rod = { d: 0.05, rho: 1000, rhoS: 7850, mu: 1e-3 };
  it("falls faster end-on than broadside, by either relation", () => {
    for (const L of [0.1, 0.5, 1]) {
      for (const method of [freeRodNewton, freeRodHoelzerSommerfeld]) {
        const { d, rho, rhoS, mu } = rod;
        expect(method.si({ d, L, rho, rhoS, mu, attitude: "axial" })).toBeGreaterThan(
          method.si({ d, L, rho, rhoS, mu, attitude: "broadside" }),
        );
      }
    }
  });
  it("tends to the creeping law (8/√ψ∥ + 16/√ψ)/Re in thick oil", () => {
    const { d, rho, rhoS } = rod;
    const slow = freeRodHoelzerSommerfeld.si({ d, L: 0.2, rho, rhoS, mu: 1e6, attitude: "axial" });
    const slower = freeRodHoelzerSommerfeld.si({
      d,
      L: 0.2,
      rho,
      rhoS,
      mu: 1e7,
      attitude: "axial",
    });
    expect(slow / slower).toBeCloseTo(10, 2);
  });
  it("falls as √L end-on at high Reynolds number when Cd is held", () => {
    const { d, rho, rhoS, mu } = rod;
    const at = (L: number) => freeRodNewton.si({ d, L, rho, rhoS, mu, attitude: "axial" });
    expect(at(1.6) / at(0.4)).toBeCloseTo(2, 12);
  });
});
