import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { integrate } from "../../kernel-helpers/numerics/integrate.js";
import { codeOf } from "../code-of.js";

describe("integrate against exact integrals", () => {
  const cases: readonly [string, (x: number) => number, number, number, number][] = [
    ["exp x over 0..1", Math.exp, 0, 1, Math.E - 1],
    ["sin x over 0..π", Math.sin, 0, Math.PI, 2],
    ["1/(1+x²) over -1..1", (x) => 1 / (1 + x * x), -1, 1, Math.PI / 2],
    ["sqrt x over 0..1", Math.sqrt, 0, 1, 2 / 3],
    ["1/sqrt x over 0..1, singular at an end", (x) => 1 / Math.sqrt(x), 0, 1, 2],
    ["ln x over 0..1, singular at an end", Math.log, 0, 1, -1],
    ["a jump at 1/3", (x) => (x < 1 / 3 ? 0 : 6), 0, 1, 4],
    ["a corner at 0.3", (x) => Math.abs(x - 0.3), 0, 1, (0.09 + 0.49) / 2],
    ["a fast wave", (x) => Math.cos(50 * x), 0, 10, Math.sin(500) / 50],
    [
      "a peak of width 1e-4",
      (x) => 1e-4 / (1e-8 + (x - 0.4) ** 2),
      0,
      1,
      Math.atan(6000) + Math.atan(4000),
    ],
  ];
  it.each(cases)("%s", (_, f, low, high, exact) => {
    expect(Math.abs(integrate(f, low, high) / exact - 1)).toBeLessThan(1e-10);
  });
  it("a polynomial of degree 23 in one interval, as the 15-point rule must", () => {
    for (let power = 0; power <= 23; power++) {
      const value = integrate((x) => x ** power, 0, 1, { relative: 1, maxIntervals: 1 });
      expect(Math.abs(value * (power + 1) - 1)).toBeLessThan(4e-15);
    }
  });
  it("does not claim degree 24", () => {
    const value = integrate((x) => x ** 24, -1, 1, { absolute: 1, maxIntervals: 1 });
    expect(Math.abs(value * 12.5 - 1)).toBeGreaterThan(1e-12);
  });
});

describe("integrate as a property", () => {
  const place = fc.double({ min: -5, max: 5, noNaN: true });
  const f = (x: number): number => Math.exp(-x * x) + 0.1 * x;
  it("adds up over neighbouring ranges and changes sign with its ends", () => {
    fc.assert(
      fc.property(place, place, place, (a, b, c) => {
        const whole = integrate(f, a, c);
        expect(integrate(f, a, b) + integrate(f, b, c)).toBeCloseTo(whole, 8);
        expect(integrate(f, c, a)).toBeCloseTo(-whole, 12);
      }),
    );
  });
  it("is zero over nothing, and near zero for an odd function", () => {
    expect(integrate(Math.exp, 2, 2)).toBe(0);
    expect(Math.abs(integrate((x) => x ** 3 + Math.sin(x), -4, 4))).toBeLessThan(1e-12);
  });
});

describe("integrate refuses", () => {
  it("an integral that does not exist, naming where the trouble sits", () => {
    const act = (): number => integrate((x) => 1 / x, 0, 1, { where: "drawdown" });
    expect(codeOf(act)).toBe("no-convergence");
    expect(act).toThrow(/drawdown: .* the worst from 0 to /);
  });
  it("a function that is not finite", () => {
    expect(codeOf(() => integrate((x) => Math.sqrt(x), -1, 1))).toBe("not-finite");
  });
  it("open ends", () => {
    expect(codeOf(() => integrate(Math.exp, -Infinity, 0))).toBe("bad-range");
  });
});
