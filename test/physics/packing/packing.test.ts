import { describe, expect, it } from "vitest";
import {
  benyahiaOneill,
  dixonCylinders,
  dixonSpheres,
  zouYuDense,
  zouYuLoose,
} from "../../../kernel-helpers/physics/packing/index.js";
import { m } from "../../../kernel-helpers/units/index.js";

const at = (k: number) => ({ d: m(k), D: m(1) });
const all = [dixonSpheres, dixonCylinders, benyahiaOneill, zouYuLoose, zouYuDense] as const;

describe.each(all.map((law) => [law.id, law] as const))("the voidage by %s", (_, law) => {
  it("is a proper fraction for every grain that fits", () => {
    for (let k = 0.001; k <= 1; k += 0.001) {
      const eps = law(at(k));
      expect(eps).toBeGreaterThan(0.2);
      expect(eps).toBeLessThan(0.8);
    }
  });
  it("rises from that of a wide bore until the grain is half of it", () => {
    expect(law(at(1e-6))).toBeGreaterThan(0.35);
    expect(law(at(1e-6))).toBeLessThan(0.41);
    for (let k = 0.02; k < 0.45; k += 0.01)
      expect(law(at(k + 0.01))).toBeGreaterThan(law(at(k)) - 0.014);
    expect(law(at(0.45))).toBeGreaterThan(law(at(1e-6)) + 0.1);
  });
  it("refuses a grain wider than the bore and takes one as wide", () => {
    expect(() => law(at(1.001))).toThrow(
      expect.objectContaining({ where: `${law.id}.d`, code: "out-of-bounds" }) as Error,
    );
    expect(law(at(1))).toBeGreaterThan(0);
  });
});

describe("the branches of a voidage law", () => {
  it.each([
    ["spheres (Dixon) at 0.5", dixonSpheres, 0.5, 1e-3],
    ["spheres (Dixon) at 0.536", dixonSpheres, 0.536, 0.01],
    ["cylinders (Dixon) at 0.6", dixonCylinders, 0.6, 0.01],
    ["cylinders (Dixon) at 0.7", dixonCylinders, 0.7, 0.01],
    ["loose (Zou and Yu) at 0.256", zouYuLoose, 0.256, 0.02],
    ["loose (Zou and Yu) at 0.538", zouYuLoose, 0.538, 0.02],
    ["dense (Zou and Yu) at 0.253", zouYuDense, 0.253, 0.02],
    ["dense (Zou and Yu) at 0.538", zouYuDense, 0.538, 0.03],
  ] as const)("meet: %s", (_, law, k, gap) => {
    expect(Math.abs(law(at(k + 1e-9)) - law(at(k - 1e-9)))).toBeLessThan(gap);
  });
  it("are densest for shaken beds", () => {
    for (let k = 0.01; k < 0.53; k += 0.01)
      expect(zouYuDense(at(k))).toBeLessThan(zouYuLoose(at(k)));
  });
  it("follow the zigzag of single spheres above 0.54, by count of spheres", () => {
    const k = 0.7;
    // spheres touch the wall and each other: rise per sphere √(d² − (D−d)²)
    const rise = Math.sqrt(k ** 2 - (1 - k) ** 2);
    const exact = 1 - (Math.PI * k ** 3) / 6 / ((Math.PI / 4) * rise);
    for (const law of [dixonSpheres, zouYuLoose, zouYuDense])
      expect(law(at(k))).toBeCloseTo(exact, 3);
  });
});
