import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { parseMixedNumber } from "../../kernel-helpers/units/mixed-number.js";

describe("parseMixedNumber", () => {
  it.each([
    ["9 5/8", 9.625],
    ["9-5/8", 9.625],
    ["13  3/8", 13.375],
    ["5/8", 0.625],
    [" 7 ", 7],
    ["12.25", 12.25],
    ["12.", 12],
    [".5", 0.5],
    ["-3", -3],
    ["-3 1/2", -3.5],
    ["-1/4", -0.25],
    ["+2 1/16", 2.0625],
    ["1.2e-3", 0.0012],
    ["0 7/8", 0.875],
    ["3/2", 1.5],
  ])("%j is %d", (text, x) => {
    expect(parseMixedNumber(text)).toBe(x);
  });
  it.each([
    ...["", " ", "abc", "9 5/8 in", "9 5", "5/", "/8", "9 5/8/2", "1/0", "9 58/8", "9 8/8", "1,5"],
    ...["0x10", "1e", "--3", "9 -5/8", "9.5 5/8", "1e999", "Infinity", "NaN", "9 5/8\n9"],
  ])("%j is not a number", (text) => {
    expect(parseMixedNumber(text)).toBeNaN();
  });
  it("reads every fraction of an inch", () => {
    const parts = fc.tuple(fc.nat(40), fc.constantFrom(2, 4, 8, 16, 32, 64), fc.nat(63));
    fc.assert(
      fc.property(parts, ([whole, under, n]) => {
        const over = n % under;
        expect(parseMixedNumber(`${whole} ${over}/${under}`)).toBe(whole + over / under);
      }),
    );
  });
  it("reads back every number that JavaScript writes", () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (x) => {
        expect(parseMixedNumber(String(x))).toBe(x + 0);
      }),
    );
  });
});
