import { describe, expect, it } from "vitest";
import {
  diFelice,
  francis,
  habermanSayre,
  munroe,
} from "../../../kernel-helpers/physics/wall/index.js";
import { m } from "../../../kernel-helpers/units/index.js";

const at = (k: number, Re: number) => ({ d: m(k), D: m(1), Re });
const laws = [diFelice, francis, habermanSayre, munroe] as const;

describe.each(laws.map((law) => [law.id, law] as const))("the wall factor of %s", (_, law) => {
  it("tends to 1 as the sphere shrinks", () => {
    for (const Re of [0, 1, 1e3, 1e6]) {
      expect(law(at(1e-6, Re))).toBeCloseTo(1, 4);
      expect(law(at(1e-3, Re))).toBeGreaterThan(0.99);
    }
  });
  it("falls as the sphere fills the bore, and stays a proper fraction", () => {
    let last = 1;
    for (let k = 0.01; k < 0.96; k += 0.01) {
      const f = law(at(k, 5000));
      expect(f).toBeLessThan(last);
      expect(f).toBeGreaterThan(0);
      last = f;
    }
  });
});

describe("Di Felice's wall factor", () => {
  it("rises with the Reynolds number: the wall counts less in fast flow", () => {
    let last = 0;
    for (const Re of [0, 0.1, 1, 10, 100, 1e3, 1e5]) {
      const f = diFelice(at(0.5, Re));
      expect(f).toBeGreaterThan(last);
      last = f;
    }
  });
  it("has the values worked apart from this program", () => {
    expect(diFelice(at(0.5, 0))).toBeCloseTo(0.18409, 5);
    expect(diFelice(at(0.5, 10))).toBeCloseTo(0.34504, 5);
    expect(diFelice(at(0.5, 1e3))).toBeCloseTo(0.63869, 5);
    expect(diFelice(at(0.8, 100))).toBeCloseTo(0.24717, 5);
  });
  it("is within 2 % of the exact creeping factor at λ 0.8", () => {
    expect(diFelice(at(0.8, 0)) * 73.555).toBeCloseTo(1, 1);
  });
});

describe("the creeping factor", () => {
  it("starts as 1 − 2.105λ", () => {
    expect((1 - habermanSayre(at(1e-4, 0))) / 1e-4).toBeCloseTo(2.105, 5);
  });
  it("finds a fast sphere outside its range", () => {
    expect(habermanSayre.findings(at(0.5, 100)).map((f) => f.group)).toEqual(["Re"]);
    expect(francis.findings(at(0.5, 100)).map((f) => f.group)).toEqual(["Re"]);
  });
});
