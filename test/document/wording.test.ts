import { describe, expect, it } from "vitest";
import { groupText, limitsText } from "../../kernel-helpers/document/range-text.js";
import { sentenceCase } from "../../kernel-helpers/document/sentence-case.js";
import { siUnit } from "../../kernel-helpers/document/si-unit.js";

describe("the limits of a range", () => {
  it.each([
    [[1, 2300], "dimensionless", "1 to 2300"],
    [[0, 1e8], "dimensionless", "up to 100\u202f000\u202f000"],
    [[10, null], "dimensionless", "10 and above"],
    [[null, 0.3], "dimensionless", "up to 0.3"],
    [[0, Math.PI / 6], "angle", "up to 30°"],
    [[0.1, 2], "velocity", "0.1 to 2\u00a0m/s"],
    [[null, null], "velocity", "any"],
  ] as const)("%j of a %s are said as they were declared", (range, kind, expected) => {
    expect(limitsText({ range, kind })).toBe(expected);
  });
});

describe("a group that a range bounds", () => {
  it("is said by its meaning, with its letter", () => {
    expect(groupText({ group: "lambda", note: "sphere to bore" })).toBe("sphere to bore (λ)");
    expect(groupText({ group: "Re_m", note: null })).toBe("Reₘ");
  });
});

describe("a heading", () => {
  it("begins with a capital unless its first word is a symbol", () => {
    expect(sentenceCase("fall of the ball")).toBe("Fall of the ball");
    expect(sentenceCase("a pack")).toBe("A pack");
    expect(sentenceCase("pH of the brine")).toBe("pH of the brine");
    expect(sentenceCase("2 in ball")).toBe("2 in ball");
  });
});

describe("an SI unit", () => {
  it("is set with raised figures and a raised point", () => {
    expect(["kg/m3", "m/s2", "Pa s", "1/s"].map(siUnit)).toEqual(["kg/m³", "m/s²", "Pa·s", "1/s"]);
  });
});
