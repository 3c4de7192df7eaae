import { describe, expect, it } from "vitest";
import { ft, inch, ppg, psi } from "../../kernel-helpers/units/catalogue.js";
import { inUnit, unit } from "../../kernel-helpers/units/unit.js";
import { codeOf } from "../code-of.js";

describe("a unit", () => {
  it("makes a plain SI number from a number or an oilfield text", () => {
    expect(ft(10)).toBeCloseTo(3.048, 15);
    expect(inch("9 5/8")).toBeCloseTo(0.244475, 15);
    expect(psi("5200")).toBe(psi(5200));
    expect(typeof ppg(15.2)).toBe("number");
  });
  it("gives back the number in another unit of its kind", () => {
    expect(inUnit(ft(12), inch)).toBeCloseTo(144, 12);
  });
  it("carries what it is", () => {
    const furlong = unit({ kind: "length", symbol: "fur", scale: 201.168, source: "definition" });
    expect([furlong.kind, furlong.symbol, furlong.offset]).toEqual(["length", "fur", 0]);
    expect(furlong(5)).toBeCloseTo(1005.84, 10);
  });
  it.each([NaN, Infinity, -Infinity, "", "abc", "9 5/8 in", "1,5", "1/0"])(
    "refuses %j",
    (typed) => {
      expect(codeOf(() => ft(typed))).toBe("not-a-number");
    },
  );
  it("refuses a number that is infinite in SI", () => {
    expect(codeOf(() => psi(1e306))).toBe("not-a-number");
  });
  it("says which unit it is and what it takes", () => {
    expect(() => ft("12 ft")).toThrow(/^ft: cannot be made from "12 ft"; expected .*9 5\/8/);
    expect(codeOf(() => ft(null as unknown as number))).toBe("not-a-number");
  });
});
