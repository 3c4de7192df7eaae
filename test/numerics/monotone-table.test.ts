import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { monotoneTable } from "../../kernel-helpers/numerics/monotone-table.js";
import { codeOf } from "../code-of.js";

const where = "table";
// Fritsch and Carlson (1980), data set RPN 14, on which an unlimited cubic overshoots.
const rpn14 = {
  x: [7.99, 8.09, 8.19, 8.7, 9.2, 10, 12, 15, 20],
  y: [0, 2.76429e-5, 4.37498e-2, 0.169183, 0.469428, 0.94374, 0.998636, 0.999919, 0.999994],
  where,
};
const steps = (low: number, high: number, n: number): number[] =>
  Array.from({ length: n + 1 }, (_, i) => low + ((high - low) * i) / n);

describe("monotoneTable", () => {
  it("passes through its points and never turns back on a published hard case", () => {
    const table = monotoneTable(rpn14);
    expect(rpn14.x.map(table)).toEqual(rpn14.y);
    const values = steps(7.99, 20, 5000).map(table);
    expect(values.every((v, i) => i === 0 || v >= (values[i - 1] as number))).toBe(true);
  });
  it("reproduces a straight line and a monotone parabola exactly", () => {
    const x = [1, 1.5, 3, 4, 4.2, 7];
    const line = monotoneTable({ x, y: x.map((v) => 3 - v / 2), where });
    const parabola = monotoneTable({ x, y: x.map((v) => v * v), where });
    for (const v of steps(1, 7, 60)) {
      expect(line(v)).toBeCloseTo(3 - v / 2, 12);
      expect(parabola(v)).toBeCloseTo(v * v, 11);
      expect(parabola.slope(v)).toBeCloseTo(2 * v, 11);
    }
  });
  it("approaches a smooth function with the third power of the spacing or better", () => {
    const worst = (n: number): number => {
      const x = steps(0, 2, n);
      const table = monotoneTable({ x, y: x.map(Math.exp), where });
      return Math.max(...steps(0, 2, 997).map((v) => Math.abs(table(v) - Math.exp(v))));
    };
    expect(worst(20) / worst(40)).toBeGreaterThan(7.5);
  });
  it("has the slope of a finite difference", () => {
    const table = monotoneTable(rpn14);
    for (const v of steps(8, 19.9, 37)) {
      const h = 1e-6;
      expect(table.slope(v)).toBeCloseTo((table(v + h) - table(v - h)) / (2 * h), 5);
    }
  });
  it("is monotone, has a continuous slope and stays within each interval, whatever the points", () => {
    const gaps = fc.array(
      fc.tuple(
        fc.double({ min: 0.1, max: 1e3, noNaN: true }),
        fc.oneof(fc.constant(0), fc.double({ min: 1e-6, max: 1e3, noNaN: true })),
      ),
      { minLength: 1, maxLength: 12 },
    );
    fc.assert(
      fc.property(gaps, fc.boolean(), (pairs, falls) => {
        const x = [0];
        const y = [0];
        pairs.forEach(([dx, dy], i) => {
          x.push((x[i] as number) + dx);
          y.push((y[i] as number) + (falls ? -dy : dy));
        });
        const table = monotoneTable({ x, y, where });
        const sign = falls ? -1 : 1;
        const slack = 1e-12 * Math.abs(y[y.length - 1] as number);
        for (let i = 0; i + 1 < x.length; i++) {
          const values = steps(x[i] as number, x[i + 1] as number, 20).map(table);
          values.forEach((v, k) => {
            expect(sign * (v - (values[k - 1] ?? v))).toBeGreaterThanOrEqual(-slack);
          });
        }
        const steepest = Math.max(...pairs.map(([dx, dy]) => dy / dx));
        for (const v of x.slice(1, -1)) {
          const jump = table.slope(v) - table.slope(v - 1e-12 * v);
          expect(Math.abs(jump)).toBeLessThanOrEqual(1e-5 * steepest);
        }
      }),
    );
  });
  it("refuses ordinates that turn back, and a place outside", () => {
    expect(codeOf(() => monotoneTable({ x: [0, 1, 2], y: [0, 1, 0.5], where }))).toBe(
      "not-monotone",
    );
    const table = monotoneTable({ x: [0, 1], y: [5, 6], where });
    expect(codeOf(() => table(1.5))).toBe("outside-table");
    expect(codeOf(() => table.slope(-0.1))).toBe("outside-table");
    expect(codeOf(() => monotoneTable({ x: [0, 0], y: [5, 6], where }))).toBe("not-increasing");
  });
});
