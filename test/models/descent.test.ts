import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  FallingBody,
  lead,
  Liquid,
  SolidMaterial,
  Sphere,
} from "../../kernel-helpers/materials/index.js";
import { isStop } from "../../kernel-helpers/method/index.js";
import { descent } from "../../kernel-helpers/models/index.js";
import { fallTime } from "../../kernel-helpers/models/descent/fall-time.js";
import { axisFactor } from "../../kernel-helpers/models/descent/local-flow.js";
import { integrateOde } from "../../kernel-helpers/numerics/index.js";
import { diFelice, terminalVelocitySphere } from "../../kernel-helpers/physics/index.js";
import {
  cP,
  ftps,
  inch,
  inUnit,
  kgpm3,
  m,
  m3ps,
  mMD,
  bblpday,
  type Quantity,
} from "../../kernel-helpers/units/index.js";
import { ball, bore, liquid, pipe, rod, tapered, water } from "./scene.js";

type Inputs = Parameters<typeof descent>[0];
const base: Inputs = {
  well: pipe(1000),
  liquid,
  rate: m3ps(0.03),
  body: ball(0.0508),
  from: mMD(0),
  law: "brown-lawler-2003",
  step: m(50),
};
const run = (over: Partial<Inputs> = {}) => {
  const result = descent({ ...base, ...over });
  if (isStop(result)) throw new Error(result.because);
  return result;
};
const area = (D: number): number => (Math.PI / 4) * D ** 2;

describe("descent, against relations worked apart", () => {
  it("gives a ball its terminal velocity with wall, less the mean flow", () => {
    const v = terminalVelocitySphere({
      d: m(0.0508),
      rho: liquid.density,
      rhoS: kgpm3(7850),
      mu: liquid.viscosity,
      law: "brown-lawler-2003",
    });
    const f = diFelice({ d: m(0.0508), D: bore, Re: (700 * v * 0.0508) / 9e-4 });
    expect(run().leastNet).toBeCloseTo(v * f - 0.03 / area(bore), 12);
  });
  it("takes length over net velocity as the time through an even bore", () => {
    const r = run();
    expect(r.time).toBeCloseTo(1000 / r.leastNet, 6);
    expect(r.arrival?.depth.at(-1)).toBe(1000);
  });
  it("integrates a velocity that changes with depth as an ODE solver does", () => {
    const depth = Array.from({ length: 41 }, (_, i) => i * 5);
    const v = (s: number): number => 1 + 0.01 * s;
    const { time } = fallTime(depth, depth.map(v));
    const ode = integrateOde({
      rate: (_t, [s]) => [v(s)],
      from: 0,
      to: Math.log(3) / 0.01,
      start: [0],
      relative: 1e-10,
      absolute: 1e-10,
    });
    expect(time).toBeCloseTo(Math.log(3) / 0.01, 9);
    expect(ode.end.y[0]).toBeCloseTo(200, 6);
  });
  it("takes the axis at twice the mean in laminar flow and 1.2 times in turbulent flow", () => {
    expect([axisFactor(100), axisFactor(2300), axisFactor(4000), axisFactor(1e6)]).toEqual([
      2, 2, 1.2, 1.2,
    ]);
    const axis = [2000, 2300, 2500, 3000, 3500, 4000, 5000].map((Re) => Re * axisFactor(Re));
    expect([...axis].sort((a, b) => a - b)).toEqual(axis);
  });
});

describe("trade facts, common practice, no source", () => {
  const still = (body: Inputs["body"], over: Partial<Inputs> = {}): number =>
    run({ rate: m3ps(1e-9), liquid: water, well: pipe(100), body, ...over }).leastNet;
  it("a larger steel ball falls faster than a smaller one, up to about 0.4 of the bore", () => {
    const v = [0.05, 0.1, 0.2, 0.3, 0.4].map((k) => still(ball(k * bore)));
    expect([...v].sort((a, b) => a - b)).toEqual(v);
  });
  it("and beyond about 0.45 a larger one falls slower", () => {
    expect(still(ball(0.8 * bore))).toBeLessThan(still(ball(0.45 * bore)));
  });
  it("a rod of the same diameter falls much faster than a ball", () => {
    expect(still(rod(0.0254, 1))).toBeGreaterThan(3 * still(ball(0.0254)));
  });
  it("lead falls faster than steel", () => {
    const body = FallingBody({ material: lead, shape: Sphere({ diameter: m(0.0254) }) });
    expect(still(body)).toBeGreaterThan(still(ball(0.0254)));
  });
  it("a half-inch steel rod reaches the order of 10 ft/s even in thick oil in a narrow pipe", () => {
    const thick = Liquid({ name: "thick oil", density: kgpm3(900), viscosity: cP(200) });
    const v = inUnit(
      still(rod(0.0127, 1), { liquid: thick, well: pipe(100, inch(2)) }) as Quantity<"velocity">,
      ftps,
    );
    expect(v).toBeGreaterThan(4);
    expect(v).toBeLessThan(30);
  });
  it("15 ft/s in a bore of 7 inches is about 62 thousand barrels a day in place", () => {
    const r = run({ rate: bblpday(62_000), well: pipe(10, inch(7)), body: rod(0.05, 2) });
    expect(inUnit(r.upflow.value[0] as Quantity<"velocity">, ftps)).toBeCloseTo(15, 0);
  });
});

describe("descent, limits and properties", () => {
  it("falls at its slip where nothing flows, and slower the more flows", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-4, max: 0.2, noNaN: true }),
        fc.double({ min: 1.05, max: 3, noNaN: true }),
        fc.constantFrom(ball(0.03), rod(0.03, 1), rod(0.03, 0.08)),
        (q, more, body) => {
          const a = run({ rate: m3ps(q), body });
          const b = run({ rate: m3ps(q * more), body });
          expect(b.leastNet).toBeLessThan(a.leastNet);
          expect(b.leastNetLow).toBeLessThan(a.leastNetLow);
          expect(a.leastNetLow).toBeLessThanOrEqual(a.leastNet);
        },
      ),
      { seed: 11, numRuns: 40 },
    );
  });
  it("agrees on a verdict only where both sides do", () => {
    const of = (q: number): string => run({ rate: m3ps(q) }).verdict;
    expect([of(0.01), of(0.055), of(0.2)]).toEqual(["passes", "undecided", "stops"]);
  });
  it("stands still at the top of the section that stops it, and tells the time to there", () => {
    const r = run({ well: tapered, rate: m3ps(0.065) });
    expect(r.passages.map((p) => p.verdict)).toEqual(["passes", "stops"]);
    expect(r.standsAt).toBe(1000);
    expect(r.time).toBeNull();
    expect(r.arrival?.depth.at(-1)).toBe(1000);
  });
  it("a body too wide for a section stops at its top, and says it does not fit", () => {
    const r = run({ well: tapered, body: ball(0.2), rate: m3ps(1e-3) });
    expect(r.passages.map((p) => p.verdict)).toEqual(["passes", "does not fit"]);
    expect(r.standsAt).toBe(1000);
    expect(r.verdict).toBe("stops");
  });
  it("follows a density that changes with depth", () => {
    const graded = Liquid({
      name: "graded",
      density: kgpm3(700),
      viscosity: cP(1),
      densityAlong: { depth: [mMD(0), mMD(1000)], value: [kgpm3(500), kgpm3(900)] },
    });
    const r = run({ liquid: graded });
    const { value } = r.slip;
    expect(value.length).toBe(21);
    expect(value[0]).toBeGreaterThan(value.at(-1) ?? Infinity);
  });
  it("follows a viscosity that changes with depth, and stands where the net velocity falls to nothing", () => {
    const stiffening = Liquid({
      name: "stiffening downwards",
      density: kgpm3(900),
      viscosity: cP(1),
      viscosityAlong: { depth: [mMD(0), mMD(1000)], value: [cP(10), cP(3000)] },
    });
    const r = run({ liquid: stiffening, step: m(5), rate: m3ps(0.02) });
    const at = r.standsAt ?? NaN;
    expect(at).toBeGreaterThan(0);
    expect(at).toBeLessThan(1000);
    const mu = cP(10 + 2.99 * at);
    const v = terminalVelocitySphere({
      d: m(0.0508),
      rho: kgpm3(900),
      rhoS: kgpm3(7850),
      mu,
      law: "brown-lawler-2003",
    });
    const f = diFelice({ d: m(0.0508), D: bore, Re: (900 * v * 0.0508) / mu });
    expect(Math.abs(v * f - 0.02 / area(bore))).toBeLessThan(2e-3);
    expect(r.time).toBeNull();
  });
  it("is driven by the weight along the hole: at 60° a ball falls as half its excess density would", () => {
    const half = FallingBody({
      material: SolidMaterial({ name: "half", density: kgpm3(4275), source: "700 + 7150/2" }),
      shape: Sphere({ diameter: m(0.0508) }),
    });
    const leaning = run({ well: pipe(1000, bore, 60) });
    expect(leaning.leastNet).toBeCloseTo(run({ body: half }).leastNet, 9);
    expect(run({ well: pipe(1000, bore, 60), body: rod(0.03, 1) }).leastNet).toBeLessThan(
      run({ body: rod(0.03, 1) }).leastNet,
    );
  });
  it("starts at a release within a section, and counts time from there", () => {
    const whole = run({ well: tapered });
    const part = run({ well: tapered, from: mMD(400) });
    expect(part.passages.map((p) => [p.top, p.base])).toEqual([
      [400, 1000],
      [1000, 1500],
    ]);
    const perMetre = (whole.time ?? NaN) - (part.time ?? NaN);
    expect(perMetre).toBeCloseTo(400 / (whole.net.value[0] ?? NaN), 6);
    expect(run({ well: tapered, from: mMD(1000) }).passages.map((p) => p.name)).toEqual(["liner"]);
  });
  it("released in flow faster than it falls, is told to be carried up and not to stand there", () => {
    const of = (q: number): readonly string[] =>
      descent.explain({ ...base, rate: m3ps(q) }).findings.map((f) => f.says);
    expect(of(0.2).some((says) => says.includes("is carried up"))).toBe(true);
    expect(of(0.055).some((says) => says.includes("may be carried up"))).toBe(true);
    expect(of(0.01).some((says) => says.includes("carried up"))).toBe(false);
  });
  it("a rod that can turn in one section and not in the next may lodge on it, and that is told", () => {
    const says = (body: Inputs["body"]): boolean =>
      descent
        .explain({ ...base, well: tapered, body })
        .findings.some((f) => f.says.includes("not in it: it may arrive across the hole"));
    expect(says(rod(0.05, 0.2))).toBe(true);
    expect(says(rod(0.05, 0.1))).toBe(false);
    expect(says(rod(0.05, 1))).toBe(false);
  });
  it("a rod just too long to turn is told no slower than one just short enough, and within a third of it", () => {
    const longest = Math.sqrt(bore ** 2 - 0.0508 ** 2);
    const low = (L: number): number => run({ body: rod(0.0508, L) }).slipLow.value[0] ?? NaN;
    const jump = low(longest + 1e-4) / low(longest - 1e-4);
    expect(jump).toBeGreaterThan(1);
    expect(jump).toBeLessThan(4 / 3);
  });
  it("tells the 2 in bar of 1.5 m as the balance solved apart does, upright and at its largest lean", () => {
    const q = 0.057412078724;
    const of = (nose: "flat" | "rounded") => run({ rate: m3ps(q), body: rod(0.0508, 1.5, nose) });
    // solved in another language from the printed balance, g 9.80665, oil of 700 kg/m3 and 0.9 cP;
    // unfavourable: 3.98° from the axis, 1.2 times the mean flow
    expect(of("flat").leastNet).toBeCloseTo(10.47166, 4);
    expect(of("flat").leastNetLow).toBeCloseTo(4.23, 4);
    expect(of("rounded").leastNet).toBeCloseTo(19.16097, 4);
    expect(of("rounded").leastNetLow).toBeCloseTo(5.20386, 4);
  });
  it("a lean above 10° reaches the reader as advice", () => {
    const { findings } = descent.explain({ ...base, well: pipe(1000, bore, 28) });
    expect(findings.some((f) => f.says.includes("leans more than 10°"))).toBe(true);
  });
});

describe("descent refuses", () => {
  it.each([
    [
      "a body wider than the bore where it is released",
      { body: rod(0.2, 1) },
      { code: "out-of-bounds", where: "descent.body" },
    ],
    ["a release outside the well", { from: mMD(2000) }, { code: "outside", where: "descent.from" }],
    ["no flow at all", { rate: m3ps(0) }, { code: "out-of-bounds", where: "descent.rate" }],
    ["a spacing of nothing", { step: m(0) }, { code: "out-of-bounds", where: "descent.step" }],
    [
      "a body lighter than the liquid",
      { liquid: Liquid({ name: "mercury", density: kgpm3(13_500), viscosity: cP(1.5) }) },
      { code: "out-of-bounds", where: "descent.body.material.density" },
    ],
  ])("%s", (_, over, parts) => {
    expect(() => run(over as Partial<Inputs>)).toThrow(expect.objectContaining(parts));
  });
});
