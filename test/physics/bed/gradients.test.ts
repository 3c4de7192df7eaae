import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { InputError } from "../../../kernel-helpers/errors/index.js";
import {
  eisfeldAll,
  eisfeldSpheres,
  packLaws,
  packWeightGradient,
} from "../../../kernel-helpers/physics/bed/index.js";
import { kgpm3, rad } from "../../../kernel-helpers/units/index.js";
import { SEED } from "../arguments.js";

const laws = Object.entries(packLaws);
const pack = fc.record({
  d: fc.double({ min: 1e-4, max: 0.05, noNaN: true }),
  eps: fc.double({ min: 0.3, max: 0.7, noNaN: true }),
  rho: fc.double({ min: 1, max: 2000, noNaN: true }),
  mu: fc.double({ min: 1e-5, max: 1, noNaN: true }),
  D: fc.double({ min: 0.06, max: 0.5, noNaN: true }),
});
const speed = fc.double({ min: 1e-4, max: 20, noNaN: true });

describe.each(laws)("%s", (_, { si }) => {
  it("is positive for upward flow, rises with it, and faster than in proportion", () => {
    fc.assert(
      fc.property(pack, speed, ({ d, eps, rho, mu, D }, u) => {
        const once = si({ u, d, eps, rho, mu, D });
        const twice = si({ u: 2 * u, d, eps, rho, mu, D });
        expect(once).toBeGreaterThan(0);
        expect(twice / once).toBeGreaterThanOrEqual(2 * (1 - 1e-12));
        expect(twice / once).toBeLessThanOrEqual(4 * (1 + 1e-12));
      }),
      SEED,
    );
  });
  it("reverses with the flow and vanishes without it", () => {
    fc.assert(
      fc.property(pack, speed, ({ d, eps, rho, mu, D }, u) => {
        const up = si({ u, d, eps, rho, mu, D });
        expect(si({ u: -u, d, eps, rho, mu, D })).toBe(-up);
        expect(Math.abs(si({ u: 0, d, eps, rho, mu, D }))).toBe(0);
      }),
      SEED,
    );
  });
  it("falls with coarser grains and with looser packing", () => {
    fc.assert(
      fc.property(pack, speed, ({ d, eps, rho, mu, D }, u) => {
        const here = si({ u, d, eps, rho, mu, D });
        expect(si({ u, d, eps: eps + 0.02, rho, mu, D })).toBeLessThan(here);
        if (D / d > 12) expect(si({ u, d: 1.1 * d, eps, rho, mu, D })).toBeLessThan(here);
      }),
      SEED,
    );
  });
  it("is the sum of a part in µ and a part that creeping flow does not feel", () => {
    const creeping = { u: 1e-9, d: 1e-3, eps: 0.4, rho: 1000, D: 0.1 };
    const { u, d, eps, rho, D } = creeping;
    const thin = si({ u, d, eps, rho, mu: 0.1, D });
    const thick = si({ u, d, eps, rho, mu: 0.2, D });
    expect(thick / thin).toBeCloseTo(2, 5);
  });
});

describe("the wall in Eisfeld and Schnitzlein's laws", () => {
  const bed = (D: number, u: number, mu: number) => ({ u, d: 1e-2, eps: 0.45, rho: 1000, mu, D });
  it.each([
    ["spheres", eisfeldSpheres, 154, 0.87],
    ["all", eisfeldAll, 155, 0.83],
  ] as const)("leaves the plain law in a wide bore (%s)", (_, law, K1, k2) => {
    const { u, d, eps, rho, mu } = bed(1e6, 0.3, 1e-3);
    const plain =
      (K1 * (1 - eps) ** 2 * mu * u) / (eps ** 3 * d ** 2) +
      ((1 - eps) * rho * u ** 2) / (k2 ** 2 * eps ** 3 * d);
    expect(law.si(bed(1e6, 0.3, 1e-3)) / plain).toBeCloseTo(1, 7);
  });
  it("adds to the gradient of creeping flow and, below D/d 2, takes from that of fast flow", () => {
    const slow = eisfeldSpheres.si(bed(0.05, 1e-7, 1)) / eisfeldSpheres.si(bed(1e6, 1e-7, 1));
    const fast = eisfeldSpheres.si(bed(0.02, 5, 1e-6)) / eisfeldSpheres.si(bed(1e6, 5, 1e-6));
    expect(slow).toBeGreaterThan(1.2);
    expect(fast).toBeLessThan(0.95);
    // A/B with A = 1 + 2/(6 · 0.55), B = (1.15/4 + 0.87)²
    expect(fast).toBeCloseTo((1.6060606 / 1.3398063) * 0.7569, 4);
  });
});

describe("the buoyant weight gradient", () => {
  const at = (theta: number) =>
    packWeightGradient({ eps: 0.4, rho: kgpm3(1000), rhoS: kgpm3(7850), theta: rad(theta) });
  it("is greatest in a vertical hole and nothing in a level one", () => {
    expect(at(0)).toBeCloseTo(0.6 * 6850 * 9.80665, 6);
    expect(at(0.5)).toBeLessThan(at(0));
    expect(at(Math.PI / 2)).toBeCloseTo(0, 6);
  });
  it("is nothing for grains as heavy as the fluid", () => {
    expect(
      packWeightGradient({ eps: 0.4, rho: kgpm3(1000), rhoS: kgpm3(1000), theta: rad(0) }),
    ).toBe(0);
  });
  it("finds a hole above 10° outside its advised range", () => {
    const given = { eps: 0.4, rho: kgpm3(1000), rhoS: kgpm3(7850), theta: rad(0.3) };
    expect(packWeightGradient.findings(given).map((f) => f.group)).toEqual(["theta"]);
  });
  it("refuses an angle that points up", () => {
    expect(() => at(-0.1)).toThrow(InputError);
  });
});
