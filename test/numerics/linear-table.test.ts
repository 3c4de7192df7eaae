import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { interpolate, linearTable } from "../../kernel-helpers/numerics/linear-table.js";
import { codeOf } from "../code-of.js";

const where = "z-factor";

describe("linearTable", () => {
  it("passes through its points exactly and halfway between them", () => {
    const table = linearTable({ x: [0, 1, 4], y: [2, 4, -2], where });
    expect([0, 1, 4, 0.5, 2.5].map(table)).toEqual([2, 4, -2, 3, 1]);
    expect([table.low, table.high]).toEqual([0, 4]);
  });
  it("reproduces a straight line", () => {
    const x = [-3, -1, 0, 0.5, 8];
    const table = linearTable({ x, y: x.map((v) => 7 - 2 * v), where });
    fc.assert(
      fc.property(fc.double({ min: -3, max: 8, noNaN: true }), (v) => {
        expect(table(v)).toBeCloseTo(7 - 2 * v, 12);
      }),
    );
  });
  it("stays between the ordinates of its interval", () => {
    const value = fc.double({ min: -1e3, max: 1e3, noNaN: true });
    fc.assert(
      fc.property(value, value, fc.double({ min: 0, max: 1, noNaN: true }), (a, b, x) => {
        const y = interpolate({ x: [0, 1], y: [a, b], where }, x);
        const slack = 1e-12 * Math.max(Math.abs(a), Math.abs(b));
        expect(y).toBeGreaterThanOrEqual(Math.min(a, b) - slack);
        expect(y).toBeLessThanOrEqual(Math.max(a, b) + slack);
      }),
    );
  });
  it("keeps its own copy of the points", () => {
    const y = [1, 2];
    const table = linearTable({ x: [0, 1], y, where });
    y[1] = 99;
    expect(table(1)).toBe(2);
  });
  it("takes the rounding of a grid at its ends", () => {
    const table = linearTable({ x: [0, 0.3], y: [1, 2], where });
    expect(table(0.1 + 0.2)).toBe(2);
    expect(table(-1e-16)).toBe(1);
  });
  it("refuses a place outside its points, naming the table and its range", () => {
    const table = linearTable({ x: [1, 2], y: [1, 2], where });
    expect(() => table(2.01)).toThrow(/z-factor: is not known at 2.01; expected 1 to 2/);
    expect([0.99, NaN, Infinity].map((x) => codeOf(() => table(x)))).toEqual(
      Array(3).fill("outside-table"),
    );
  });
  it("refuses points that are no table", () => {
    const code = (x: number[], y: number[]): string => codeOf(() => linearTable({ x, y, where }));
    expect(code([0, 1], [0, 1, 2])).toBe("bad-table");
    expect(code([0], [0])).toBe("bad-table");
    expect(code([0, 1, 1], [0, 1, 2])).toBe("not-increasing");
    expect(code([0, 1, 0.5], [0, 1, 2])).toBe("not-increasing");
    expect(code([0, 1], [0, NaN])).toBe("not-a-number");
    expect(code([0, Infinity], [0, 1])).toBe("not-a-number");
  });
});
