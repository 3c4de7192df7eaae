import { describe, expect, it } from "vitest";
import {
  axialCylinder,
  broadsideCylinder,
  brownLawler,
  cliftGauvin,
  cliftGraceWeber,
  haiderLevenspielSphere,
  hoelzerSommerfeld,
  morrison,
  schillerNaumann,
} from "../../../kernel-helpers/physics/drag/index.js";
import { m } from "../../../kernel-helpers/units/index.js";
import { rodShape } from "../../../kernel-helpers/physics/settling/rod-shape.js";

const smooth = [
  brownLawler,
  cliftGauvin,
  haiderLevenspielSphere,
  morrison,
  schillerNaumann,
] as const;

describe("sphere drag laws", () => {
  it.each([...smooth, cliftGraceWeber].map((law) => [law.id, law] as const))(
    "%s tends to Stokes' law in creeping flow",
    (_, law) => {
      expect((law({ Re: 1e-8 }) * 1e-8) / 24).toBeCloseTo(1, 3);
    },
  );
  it.each([...smooth, cliftGraceWeber].map((law) => [law.id, law] as const))(
    "%s has a drag force that rises with speed up to Re 2e5",
    (_, law) => {
      let last = 0;
      for (let w = -3; w < 5.3; w += 0.001) {
        const Re = 10 ** w;
        const force = law.si({ Re }) * Re ** 2;
        expect(force).toBeGreaterThan(last);
        last = force;
      }
    },
  );
  it("stays at the Newton plateau between 1e3 and 1e5", () => {
    for (const law of smooth)
      for (const Re of [1e3, 3e3, 1e4, 3e4, 1e5]) {
        expect(law({ Re })).toBeGreaterThan(0.37);
        expect(law({ Re })).toBeLessThan(0.5);
      }
  });
});

describe("the segments of Clift, Grace and Weber", () => {
  it.each([0.01, 20, 260, 1500, 1.2e4, 4.4e4, 3.38e5, 1e6])("meet within 1.1 %% at Re %d", (Re) => {
    const below = cliftGraceWeber({ Re: Re * (1 - 1e-12) });
    const above = cliftGraceWeber({ Re: Re * (1 + 1e-12) });
    expect(Math.abs(above / below - 1)).toBeLessThan(0.011);
  });
  it("fall by about a fifth at 4e5 and never rise to the misprint's 0.57", () => {
    const below = cliftGraceWeber({ Re: 4e5 * (1 - 1e-12) });
    const above = cliftGraceWeber({ Re: 4e5 });
    expect(above / below).toBeGreaterThan(0.75);
    expect(above / below).toBeLessThan(0.85);
    for (let Re = 4e5; Re < 1e7; Re *= 1.01) expect(cliftGraceWeber({ Re })).toBeLessThan(0.19);
  });
  it("tend to 0.19 beyond the crisis", () => {
    expect(cliftGraceWeber({ Re: 1e12 })).toBeCloseTo(0.19, 6);
  });
});

describe("the law for any shape", () => {
  const rod = (e: number, attitude: "axial" | "broadside") => {
    const { psi, psiPar, psiPerp } = rodShape(1, e, attitude);
    return { psi, psiPar, psiPerp };
  };
  const at = (e: number, attitude: "axial" | "broadside", Re: number) => {
    const { psi, psiPar, psiPerp } = rod(e, attitude);
    return hoelzerSommerfeld.si({ Re, psi, psiPar, psiPerp }) * psiPerp;
  };
  it("has the printed cross-check values of a rod, L/d 10 end-on", () => {
    const { psi, psiPar, psiPerp } = rod(10, "axial");
    expect(psi).toBeCloseTo(0.57926, 5);
    expect(psiPerp).toBeCloseTo(6.0822, 4);
    expect(psiPar).toBeCloseTo(0.73567, 5);
  });
  it("is within 12 % of the tables of cylinders at high Reynolds number, both ways", () => {
    for (const e of [4, 5, 8, 10]) {
      const table = { L: m(e), d: m(1) };
      expect(Math.abs(at(e, "axial", 1e5) / axialCylinder(table) - 1)).toBeLessThan(0.12);
      expect(Math.abs(at(e, "broadside", 1e5) / broadsideCylinder(table) - 1)).toBeLessThan(0.12);
    }
  });
  it("drags less end-on than broadside", () => {
    for (const Re of [0.1, 10, 1e3, 1e5]) {
      const axial = rod(10, "axial");
      const broad = rod(10, "broadside");
      expect(hoelzerSommerfeld({ Re, ...axial })).toBeLessThan(hoelzerSommerfeld({ Re, ...broad }));
    }
  });
});

describe("the tables of cylinders", () => {
  const e = (L: number) => ({ L: m(L), d: m(1) });
  it("hold their ends, with a finding", () => {
    expect(axialCylinder(e(20))).toBe(0.99);
    expect(axialCylinder(e(0.1))).toBe(1.15);
    expect(axialCylinder.findings(e(20))).toHaveLength(1);
    expect(broadsideCylinder(e(0.5))).toBe(0.64);
    expect(broadsideCylinder.findings(e(0.5))).toHaveLength(1);
  });
  it("run straight between their rows", () => {
    expect(axialCylinder(e(6))).toBeCloseTo((0.87 + 0.99) / 2, 12);
    expect(broadsideCylinder(e(7.5))).toBeCloseTo((0.74 + 0.82) / 2, 12);
  });
  it("rise from 0.98 at 40 to 1.20 for an endless cylinder without a step", () => {
    expect(broadsideCylinder(e(40 * (1 + 1e-12)))).toBeCloseTo(0.98, 10);
    expect(broadsideCylinder(e(80))).toBeCloseTo(1.09, 12);
    expect(broadsideCylinder(e(1e12))).toBeCloseTo(1.2, 10);
  });
});
