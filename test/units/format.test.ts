import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  decimalsFor,
  formatFixed,
  formatNumber,
  formatTyped,
} from "../../kernel-helpers/units/format.js";
import { codeOf } from "../code-of.js";

const plain = (text: string): string => text.replaceAll("\u202f", "_").replace("−", "-");

/** The number that a formatted text shows. */
const shown = (text: string): number => {
  const [mantissa = "", power = ""] = plain(text).replaceAll("_", "").split(" × 10");
  const digits = power.replace(/./gu, (c) => (c === "⁻" ? "-" : String("⁰¹²³⁴⁵⁶⁷⁸⁹".indexOf(c))));
  return Number(mantissa) * 10 ** Number(digits);
};

describe("formatNumber", () => {
  it.each([
    [0, 4, "0"],
    [-0, 4, "0"],
    [1, 4, "1.000"],
    [3.14159, 4, "3.142"],
    [-3.14159, 3, "-3.14"],
    [9.9996, 4, "10.00"],
    [9.9994, 4, "9.999"],
    [99.996, 4, "100.0"],
    [9999.4, 4, "9999"],
    [9999.5, 4, "10_000"],
    [9999.96, 4, "10_000"],
    [99999, 4, "99_999"],
    [12345.678, 4, "12_346"],
    [1234567.8, 4, "1_234_568"],
    [12345.678, 7, "12_345.68"],
    [0.00012345, 4, "0.0001234"],
    [1e-4, 4, "0.0001000"],
    [1e-7, 4, "1.000 × 10⁻⁷"],
    [-2.5e-12, 2, "-2.5 × 10⁻¹²"],
    [9.9999e-5, 3, "1.00 × 10⁻⁴"],
    [1e7, 4, "1.000 × 10⁷"],
    [6.02214e23, 4, "6.022 × 10²³"],
    [7, 1, "7"],
    [0.96, 1, "1"],
    [Infinity, 4, "∞"],
    [-Infinity, 4, "-∞"],
  ])("%d with %d digits", (x, digits, text) => {
    expect(plain(formatNumber(x, digits))).toBe(text);
  });
  it("parts thousands by a narrow no-break space and shows a true minus sign", () => {
    expect(formatNumber(-12345)).toBe("−12\u202f345");
  });
  it("shows a number that is within half its last digit", () => {
    const size = fc.double({ min: -12, max: 12, noNaN: true }).map((p) => 10 ** p);
    fc.assert(
      fc.property(size, fc.boolean(), fc.integer({ min: 1, max: 8 }), (a, isNegative, digits) => {
        const x = isNegative ? -a : a;
        const tolerance = 0.5000001 * 10 ** (Math.floor(Math.log10(a)) + 1 - digits);
        expect(Math.abs(shown(formatNumber(x, digits)) - x)).toBeLessThanOrEqual(tolerance);
      }),
    );
  });
  it("never shows a larger number as the smaller", () => {
    const number = fc.double({ min: -1e9, max: 1e9, noNaN: true });
    fc.assert(
      fc.property(number, number, (a, b) => {
        const [x, y] = a <= b ? [a, b] : [b, a];
        expect(shown(formatNumber(x))).toBeLessThanOrEqual(
          shown(formatNumber(y)) * (1 + 1e-15 * Math.sign(y)),
        );
      }),
    );
  });
  it("refuses what is not a number", () => {
    expect(codeOf(() => formatNumber(NaN))).toBe("not-a-number");
    expect(codeOf(() => formatFixed(NaN, 1))).toBe("not-a-number");
    expect(codeOf(() => formatTyped(NaN))).toBe("not-a-number");
  });
});

describe("formatFixed", () => {
  it.each([
    [0, 2, "0.00"],
    [-0.001, 2, "0.00"],
    [-0.006, 2, "-0.01"],
    [1234.5, 1, "1234.5"],
    [12345.67, 1, "12_345.7"],
    [-99999.99, 1, "-100_000.0"],
    [5, 0, "5"],
  ])("%d with %d decimals", (x, decimals, text) => {
    expect(plain(formatFixed(x, decimals))).toBe(text);
  });
  it("takes the decimals of a column's largest number", () => {
    expect([0, 1, 9.9996, 123.4, 99999, 0.05].map((x) => decimalsFor(x, 4))).toEqual([
      0, 3, 2, 1, 0, 5,
    ]);
  });
});

describe("formatTyped", () => {
  it.each([
    [42, "42"],
    [-3.5, "-3.5"],
    [12400, "12_400"],
    [1234, "1234"],
    [-12400.25, "-12_400.25"],
    [0.1, "0.1"],
    ["9 5/8", "9 5/8"],
    ["012.50", "012.50"],
  ])("%j is kept as it was typed", (x, text) => {
    expect(plain(formatTyped(x))).toBe(text);
  });
});
