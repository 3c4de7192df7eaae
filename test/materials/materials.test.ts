import { describe, expect, it } from "vitest";
import {
  carbonSteel,
  FallingBody,
  Grade,
  Liquid,
  Rod,
  solidMaterials,
  Sphere,
} from "../../kernel-helpers/materials/index.js";
import { cP, inch, kgpm3, m, mm, mMD } from "../../kernel-helpers/units/index.js";

describe("solid materials", () => {
  it("each say where their density comes from", () => {
    for (const s of solidMaterials) expect(s.source).toMatch(/handbook|ASTM|ISO/);
  });
  it("lie at the handbook densities, g/cm3 to the digits printed (from memory)", () => {
    const of = (name: RegExp): number =>
      solidMaterials.find((s) => name.test(s.name))?.density ?? NaN;
    expect(of(/carbon steel/)).toBeCloseTo(7850, -1);
    expect(of(/lead, pure/)).toBeCloseTo(11_340, -1);
    expect(of(/class 1/)).toBe(17_000);
    expect(of(/copper/)).toBeCloseTo(8960, -1);
    expect(of(/barite/)).toBe(4200);
  });
});

describe("bodies", () => {
  it("weigh what their volume weighs: a 2 in steel ball 0.54 kg", () => {
    const ball = FallingBody({ material: carbonSteel, shape: Sphere({ diameter: inch(2) }) });
    expect(ball.mass).toBeCloseTo(0.5388, 4);
    expect(ball.mass).toBeCloseTo((7850 * Math.PI * 0.0508 ** 3) / 6, 12);
  });
  it("a bar of 2 in and 1.5 m weighs 23.87 kg", () => {
    const bar = FallingBody({
      material: carbonSteel,
      shape: Rod({ diameter: inch(2), length: m(1.5), nose: "flat" }),
    });
    expect(bar.mass).toBeCloseTo(23.866, 3);
  });
  it("a grain of a grade is a ball", () => {
    expect(Grade({ material: carbonSteel, diameter: mm(25.4) }).grainMass).toBeCloseTo(
      (7850 * Math.PI * 0.0254 ** 3) / 6,
      12,
    );
  });
  it.each([
    [
      "a negative diameter",
      () => Sphere({ diameter: mm(-1) }),
      { code: "out-of-bounds", where: "sphere.diameter" },
    ],
    [
      "no length",
      () => Rod({ diameter: mm(10), length: m(0), nose: "flat" }),
      { code: "out-of-bounds", where: "rod.length" },
    ],
    [
      "a nose that is none",
      () => Rod({ diameter: mm(10), length: m(1), nose: "sharp" as never }),
      { code: "wrong-kind", where: "rod.nose" },
    ],
  ])("refuse %s", (_, make, parts) => {
    expect(make).toThrow(expect.objectContaining(parts));
  });
});

describe("a liquid", () => {
  const along = {
    depth: [mMD(0), mMD(1000), mMD(1000), mMD(2000)],
    value: [kgpm3(600), kgpm3(700), kgpm3(750), kgpm3(750)],
  };
  const oil = Liquid({ name: "oil", density: kgpm3(700), viscosity: cP(1), densityAlong: along });
  it("is even where no profile is given", () => {
    expect(Liquid({ name: "oil", density: kgpm3(700), viscosity: cP(1) }).densityAt(123)).toBe(700);
    expect(oil.viscosityAt(1e4)).toBe(1e-3);
  });
  it("follows its profile in straight lines, with the upper value where it jumps", () => {
    expect(oil.densityAt(500)).toBe(650);
    expect(oil.densityAt(1000)).toBe(700);
    expect(oil.densityAt(1001)).toBe(750);
  });
  it("refuses a depth that its profile does not cover", () => {
    expect(() => oil.densityAt(2500)).toThrow(
      expect.objectContaining({ code: "outside", where: "liquid.densityAlong" }),
    );
  });
  it("refuses a profile whose depths turn back, or with a density of nothing", () => {
    const make = (depth: number[], value: number[]) => () =>
      Liquid({
        name: "x",
        density: kgpm3(1),
        viscosity: cP(1),
        densityAlong: { depth: depth.map((d) => mMD(d)), value: value.map((v) => kgpm3(v)) },
      });
    expect(make([0, 10, 5], [1, 1, 1])).toThrow(
      expect.objectContaining({ code: "out-of-bounds", where: "liquid.densityAlong.depth[2]" }),
    );
    expect(make([0, 10], [1, 0])).toThrow(
      expect.objectContaining({ where: "liquid.densityAlong.value[1]" }),
    );
    expect(make([0], [1])).toThrow(expect.objectContaining({ code: "wrong-kind" }));
  });
});
