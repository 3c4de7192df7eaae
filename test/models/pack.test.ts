import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { Liquid } from "../../kernel-helpers/materials/index.js";
import { isStop } from "../../kernel-helpers/method/index.js";
import { packToCut, restingPack } from "../../kernel-helpers/models/index.js";
import {
  dixonSpheres,
  ergun,
  kta,
  liftVelocity,
  packWeightGradient,
} from "../../kernel-helpers/physics/index.js";
import {
  cP,
  deg,
  deltaMPa,
  deltaPa,
  fraction,
  kgpm3,
  m,
  m3ps,
  mMD,
  mps,
  rad,
} from "../../kernel-helpers/units/index.js";
import { BoreSection, Well } from "../../kernel-helpers/well/index.js";
import { bore, grade, liquid, pipe, tapered, washed, water } from "./scene.js";

type Inputs = Parameters<typeof restingPack>[0];
const base: Inputs = {
  well: pipe(2000),
  liquid,
  grade: grade(0.0254),
  base: mMD(1900),
  top: mMD(1500),
  law: "kta-1981",
  drive: deltaMPa(19),
  clearRate: m3ps(0.057),
  rest: "linear",
};
const run = (over: Partial<Inputs> = {}) => {
  const result = restingPack({ ...base, ...over });
  if (isStop(result)) throw new Error(result.because);
  return result;
};
const A = (Math.PI / 4) * bore ** 2;

describe("a resting pack, against relations worked apart", () => {
  it("shares the drive between pack and path: KTA's law and a linear rest, by hand", () => {
    const r = run();
    const eps = dixonSpheres({ d: m(0.0254), D: bore });
    const G = kta({
      u: mps(r.restingRate / A),
      d: m(0.0254),
      eps,
      rho: kgpm3(700),
      mu: cP(0.9),
      D: bore,
    });
    expect(G * 400 + 19e6 * (r.restingRate / 0.057)).toBeCloseTo(19e6, 0);
    expect(r.drop).toBeCloseTo(G * 400, 0);
  });
  it("has the closed form of a linear path where the law is linear (creeping flow)", () => {
    const thick = Liquid({ name: "tar", density: kgpm3(900), viscosity: cP(1e6) });
    const r = run({ liquid: thick, law: "ergun-1952", voidage: fraction(0.4) });
    const R = (150 * 0.6 ** 2 * 1e3 * 400) / (0.4 ** 3 * 0.0254 ** 2 * A);
    expect(r.restingRate / (19e6 / (R + 19e6 / 0.057))).toBeCloseTo(1, 6);
  });
  it("lifts where the lift velocity of the same law says, in a bore of one size", () => {
    const r = run();
    const eps = dixonSpheres({ d: m(0.0254), D: bore });
    const u = liftVelocity({
      d: m(0.0254),
      eps,
      rho: kgpm3(700),
      rhoS: kgpm3(7850),
      mu: cP(0.9),
      D: bore,
      theta: rad(0),
      law: "kta-1981",
    });
    expect(r.liftRate).toBeCloseTo(u * A, 9);
  });
  it("lifts 20 mm steel balls in water at the velocities worked apart for three laws, ε 0.4", () => {
    const at = (law: Inputs["law"]): number =>
      run({ liquid: water, grade: grade(0.02), voidage: fraction(0.4), law }).liftRate / A;
    // solved from the printed laws with g = 9.81 and steel of 7850 kg/m3
    expect(at("ergun-1952")).toBeCloseTo(0.2204, 3);
    expect(at("kta-1981")).toBeCloseTo(0.2647, 3);
    expect(at("erdim-2015")).toBeCloseTo(0.2688, 3);
  });
  it("weighs what its solids weigh, and counts its grains", () => {
    const r = run({ voidage: fraction(0.42) });
    expect(r.mass).toBeCloseTo(A * 400 * 0.58 * 7850, 6);
    expect(r.count).toBeCloseTo((A * 400 * 0.58) / ((Math.PI / 6) * 0.0254 ** 3), 4);
    expect(r.weight).toBeCloseTo(0.58 * 7150 * 9.80665 * 400, 3);
  });
  it("keeps the margin 1 − G/w in an even bore", () => {
    const r = run();
    const eps = dixonSpheres({ d: m(0.0254), D: bore });
    const w = packWeightGradient({ eps, rho: kgpm3(700), rhoS: kgpm3(7850), theta: rad(0) });
    expect(r.margin).toBeCloseTo(1 - r.drop / 400 / w, 9);
  });
});

describe("a resting pack, limits and properties", () => {
  it("of no height leaves the clear flow; of no drive takes nothing at rest", () => {
    expect(run({ top: mMD(1900 - 1e-6) }).share).toBeCloseTo(1, 6);
    expect(run({ drive: deltaPa(1e-6), clearRate: m3ps(1e-9) }).drop).toBeLessThan(1e-6);
  });
  it("leaves less flow the taller it is, and the finer its grains", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 10, max: 1800, noNaN: true }),
        fc.double({ min: 0.004, max: 0.04, noNaN: true }),
        fc.constantFrom<Inputs["law"]>("kta-1981", "ergun-1952", "erdim-2015"),
        fc.constantFrom<Inputs["rest"]>("linear", "quadratic"),
        (H, d, law, rest) => {
          const of = (h: number, dd: number): number =>
            run({ top: mMD(1900 - h), grade: grade(dd), law, rest, voidage: fraction(0.42) })
              .restingRate;
          expect(of(H * 1.05, d)).toBeLessThan(of(H, d));
          expect(of(H, d * 0.9)).toBeLessThan(of(H, d));
        },
      ),
      { seed: 5, numRuns: 40 },
    );
  });
  it("never takes more from the flow than it weighs while it rests", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 10, max: 1800, noNaN: true }),
        fc.double({ min: 0.003, max: 0.05, noNaN: true }),
        (H, d) => {
          const r = run({ top: mMD(1900 - H), grade: grade(d) });
          if (r.state === "rests") expect(r.drop).toBeLessThanOrEqual(r.weight * (1 + 1e-9));
          if (r.state === "rests") expect(r.rate).toBe(r.restingRate);
          else expect(r.rate / r.liftedRate).toBeCloseTo(1, 8);
        },
      ),
      { seed: 6, numRuns: 60 },
    );
  });
  it("holds a narrow part by what lies on it in a wider one only as the stress allows", () => {
    const r = run({ well: tapered, base: mMD(1500), top: mMD(500), grade: grade(0.012) });
    const parts = Object.fromEntries(r.parts.map((p) => [p.name, p]));
    expect(parts["casing"]?.gradient).toBeLessThan(parts["liner"]?.gradient ?? 0);
    expect(r.weakest).toBe(1500);
  });
  it("in an even bore is as near to lifting at every depth, and tells its base", () => {
    expect(run().weakest).toBe(1900);
    expect(run({ rest: "quadratic" }).weakest).toBe(1900);
  });
  it("in a narrow bore above a wide one lifts only there, and the part below keeps its drag", () => {
    const over = { well: washed, base: mMD(1400), top: mMD(800) };
    const r = run(over);
    expect([r.state, r.weakest]).toEqual(["lifts", 1000]);
    const below = dixonSpheres({ d: m(0.0254), D: m(0.3) });
    const above = dixonSpheres({ d: m(0.0254), D: bore });
    const G = kta({
      u: mps(r.rate / ((Math.PI / 4) * 0.3 ** 2)),
      d: m(0.0254),
      eps: below,
      rho: kgpm3(700),
      mu: cP(0.9),
      D: m(0.3),
    });
    const carried = (1 - above) * 7150 * 9.80665 * 200;
    expect((carried + G * 400 + 19e6 * (r.rate / 0.057)) / 19e6).toBeCloseTo(1, 8);
    expect(r.rate).toBeGreaterThan(r.restingRate);
    expect(r.rate).toBeGreaterThan(r.liftedRate);
    const { findings } = restingPack.explain({ ...base, ...over });
    expect(findings.some((f) => f.says.includes("only the part above 1000 m lifts"))).toBe(true);
  });
  it("leaves no less flow lifted than at rest, whatever the bores: the weight bears no more than the drag", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 990, noNaN: true }),
        fc.double({ min: 1010, max: 1500, noNaN: true }),
        fc.double({ min: 0.004, max: 0.04, noNaN: true }),
        fc.constantFrom(washed, tapered),
        (top, low, d, well) => {
          const r = run({ well, top: mMD(top), base: mMD(low), grade: grade(d) });
          expect(r.rate).toBeGreaterThanOrEqual(r.restingRate * (1 - 1e-9));
        },
      ),
      { seed: 8, numRuns: 60 },
    );
  });
  it("heavier than the drive lies still by any law, however fine its grains", () => {
    const r = run({ top: mMD(1400), grade: grade(0.003), law: "ergun-1952" });
    expect(r.weight).toBeGreaterThan(19e6);
    expect(r.state).toBe("rests");
    expect(r.margin).toBeGreaterThan(1 - 19e6 / r.weight);
  });
  it("may lift with a turbulent path where it rests with a linear one: the pack meets more of the drive", () => {
    const at = (rest: Inputs["rest"]) => run({ top: mMD(1485), rest });
    expect([at("linear").state, at("quadratic").state]).toEqual(["rests", "lifts"]);
    expect(at("quadratic").margin).toBeLessThan(at("linear").margin);
  });
  it("tells each section apart even under one name, with the mean of its gradients", () => {
    const section = (top: number, low: number, lean: number) =>
      BoreSection({
        name: "liner",
        wall: "liner",
        top: mMD(top),
        base: mMD(low),
        bore,
        inclination: deg(lean),
      });
    const graded = Liquid({
      name: "graded",
      density: kgpm3(700),
      viscosity: cP(0.9),
      densityAlong: { depth: [mMD(0), mMD(2000)], value: [kgpm3(500), kgpm3(900)] },
    });
    const r = run({
      well: Well({ sections: [section(0, 1700, 0), section(1700, 2000, 9)] }),
      liquid: graded,
    });
    expect(r.parts.map((p) => [p.name, p.top, p.base])).toEqual([
      ["liner", 1500, 1700],
      ["liner", 1700, 1900],
    ]);
    expect((r.parts[0]?.gradient ?? NaN) * 200 + (r.parts[1]?.gradient ?? NaN) * 200).toBeCloseTo(
      r.drop,
      3,
    );
    expect((r.parts[0]?.weight ?? NaN) * 200 + (r.parts[1]?.weight ?? NaN) * 200).toBeCloseTo(
      r.weight,
      3,
    );
  });
  it("that one layer of grains would do ends in a stop that says so", () => {
    const { top: _, ...rest } = base;
    expect(packToCut({ ...rest, share: fraction(1 - 1e-9) })).toMatchObject({
      stop: "less-than-a-grain",
    });
  });
  it("that is sized to a share leaves that share", () => {
    for (const share of [0.5, 0.2, 0.12]) {
      const { top: _, ...rest } = base;
      const cut = packToCut({ ...rest, share: fraction(share) });
      if (isStop(cut)) throw new Error(cut.because);
      expect(run({ top: cut.top }).restingRate / 0.057).toBeCloseTo(share, 7);
      expect(cut.restingRate / 0.057).toBeCloseTo(share, 7);
    }
  });
  it("that would need more hole than there is ends in a stop that says so", () => {
    const { top: _, ...rest } = base;
    expect(packToCut({ ...rest, grade: grade(0.0508), share: fraction(0.05) })).toMatchObject({
      stop: "not-enough-hole",
    });
  });
  it("outside the range of its law says so", () => {
    const { findings } = restingPack.explain({ ...base, law: "ergun-1952", top: mMD(1000) });
    expect(findings.map((f) => f.by)).toContain("ergun-1952");
    expect(
      ergun.findings({
        u: mps(1),
        d: m(0.02),
        eps: fraction(0.4),
        rho: kgpm3(1000),
        mu: cP(1),
        D: bore,
      }).length,
    ).toBeGreaterThan(0);
  });
});

describe("a resting pack refuses", () => {
  it.each([
    ["a top below its base", { top: mMD(1950) }, { code: "outside" }],
    ["a base below the well", { base: mMD(2500) }, { code: "outside" }],
    [
      "grains wider than the bore",
      { grade: grade(0.2) },
      { code: "out-of-bounds", where: "grade.diameter" },
    ],
    [
      "grains lighter than the liquid",
      { liquid: Liquid({ name: "mercury", density: kgpm3(13_500), viscosity: cP(1.5) }) },
      { code: "out-of-bounds", where: "grade.material.density" },
    ],
    [
      "grains that neither sink nor rise",
      { liquid: Liquid({ name: "as heavy", density: kgpm3(7850), viscosity: cP(1) }) },
      { code: "out-of-bounds", where: "grade.material.density" },
    ],
    [
      "a drive of nothing",
      { drive: deltaPa(0) },
      { code: "out-of-bounds", where: "resting-pack.drive" },
    ],
    [
      "a voidage of one",
      { voidage: fraction(1) },
      { code: "out-of-bounds", where: "resting-pack.voidage" },
    ],
  ])("%s", (_, over, parts) => {
    expect(() => run(over as Partial<Inputs>)).toThrow(expect.objectContaining(parts));
  });
});
