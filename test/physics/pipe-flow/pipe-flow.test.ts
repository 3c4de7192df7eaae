import { describe, expect, it } from "vitest";
import {
  annulusMeanVelocity,
  churchill,
  colebrookWhite,
  frictionalGradient,
  haaland,
  laminarFriction,
  meanVelocity,
  pipeReynolds,
} from "../../../kernel-helpers/physics/pipe-flow/index.js";
import { m, m3ps } from "../../../kernel-helpers/units/index.js";

describe("the mean velocity", () => {
  it("of an annulus tends to that of the bore as the body shrinks", () => {
    const q = m3ps(0.02);
    const D = m(0.15);
    expect(annulusMeanVelocity({ q, d: m(1e-9), D })).toBeCloseTo(meanVelocity({ q, D }), 12);
  });
  it("keeps the sign of the rate", () => {
    const up = meanVelocity({ q: m3ps(0.02), D: m(0.15) });
    expect(meanVelocity({ q: m3ps(-0.02), D: m(0.15) }) + up).toBe(0);
  });
});

describe("the Darcy friction factor", () => {
  it("of Churchill is laminar below 1500 and within 4 % of Colebrook's above 5000", () => {
    for (const Re of [1, 100, 1500])
      expect(churchill({ Re, eD: 1e-3 }) / laminarFriction({ Re, eD: 0 })).toBeCloseTo(1, 4);
    for (const eD of [0, 1e-5, 1e-3, 0.03])
      for (let Re = 5e3; Re < 1e8; Re *= 3)
        expect(Math.abs(churchill({ Re, eD }) / colebrookWhite({ Re, eD }) - 1)).toBeLessThan(0.04);
  });
  it("of Haaland is within 2 % of Colebrook's", () => {
    for (const eD of [0, 1e-6, 1e-4, 1e-2, 0.05])
      for (let Re = 4e3; Re < 1e8; Re *= 3)
        expect(Math.abs(haaland({ Re, eD }) / colebrookWhite({ Re, eD }) - 1)).toBeLessThan(0.02);
  });
  it("of Colebrook solves its own equation", () => {
    for (const eD of [0, 1e-6, 1e-3, 0.05, 0.5])
      for (const Re of [10, 4e3, 1e5, 1e8, 1e12]) {
        const x = 1 / Math.sqrt(colebrookWhite({ Re, eD }));
        expect(x + 2 * Math.log10(eD / 3.7 + (2.51 * x) / Re)).toBeCloseTo(0, 11);
      }
  });
  it("of a smooth pipe follows Blasius within 3 % from 5e3 to 1e5", () => {
    for (const Re of [5e3, 1e4, 3e4, 1e5])
      expect(Math.abs(colebrookWhite({ Re, eD: 0 }) / (0.3164 * Re ** -0.25) - 1)).toBeLessThan(
        0.03,
      );
  });
  it("rises with roughness", () => {
    for (const law of [haaland, colebrookWhite, churchill])
      expect(law({ Re: 1e6, eD: 1e-3 })).toBeGreaterThan(law({ Re: 1e6, eD: 1e-4 }));
  });
});

describe("the frictional gradient", () => {
  it("is Hagen and Poiseuille's 32µv/D² in laminar flow, signed as the flow", () => {
    const v = 0.05 as never;
    const D = m(0.1);
    const rho = 900 as never;
    const mu = 0.05;
    const Re = pipeReynolds({ v, D, rho, mu: mu as never });
    const f = laminarFriction({ Re, eD: 0 });
    expect(frictionalGradient({ f, v, D, rho })).toBeCloseTo((32 * mu * 0.05) / 0.01, 10);
    expect(frictionalGradient({ f, v: -0.05 as never, D, rho })).toBeLessThan(0);
  });
});
