import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { niceRange, niceTicks } from "../../../kernel-helpers/render/charts/nice-ticks.js";

describe("ticks", () => {
  it("are exact round numbers", () => {
    expect(niceTicks([0, 1], 5)).toMatchObject({
      values: [0, 0.2, 0.4, 0.6, 0.8, 1],
      step: 0.2,
      decimals: 1,
    });
    expect(niceTicks([1200, 4200], 6).values).toEqual([1500, 2000, 2500, 3000, 3500, 4000]);
    expect(niceTicks([0.0003, 0.0009], 3).values).toEqual([0.0004, 0.0006, 0.0008]);
  });
  it("lie in the range, one step apart, about as many as were asked for", () => {
    const end = fc.double({ min: -1e6, max: 1e6, noNaN: true });
    const length = fc.double({ min: 1e-3, max: 1e6, noNaN: true });
    fc.assert(
      fc.property(end, length, fc.integer({ min: 2, max: 12 }), (from, span, count) => {
        const to = from + span;
        const { values, step, decimals } = niceTicks([from, to], count);
        expect(values.length).toBeGreaterThanOrEqual(Math.floor(count / 2));
        expect(values.length).toBeLessThanOrEqual(2 * count + 1);
        values.forEach((v, i) => {
          expect(v).toBeGreaterThanOrEqual(from - 1e-6 * span);
          expect(v).toBeLessThanOrEqual(to + 1e-6 * span);
          expect(Number(v.toFixed(decimals))).toBe(v);
          const before = values[i - 1];
          if (before !== undefined) expect(v - before).toBeCloseTo(step, 6);
        });
      }),
    );
  });
  it("are refused for a range that is none", () => {
    for (const range of [
      [1, 1],
      [2, 1],
      [NaN, 1],
      [0, Infinity],
    ] as const)
      expect(() => niceTicks(range, 5)).toThrow(/axis/);
  });
});

describe("a range of round numbers", () => {
  it("holds all values", () => {
    expect(niceRange([13.2, 58.7, 20], 5)).toEqual([10, 60]);
  });
  it("ends on its own ticks, however small they are", () => {
    const range = niceRange([1e-5, 1.99e-5], 5);
    expect(range).toEqual([0.00001, 0.00002]);
    expect(niceTicks(range, 5).values.at(-1)).toBe(0.00002);
  });
  it("gives room to a single value", () => {
    expect(niceRange([0], 4)).toEqual([-1, 1]);
    const [from, to] = niceRange([5, 5], 4);
    expect(from).toBeLessThan(5);
    expect(to).toBeGreaterThan(5);
  });
});
