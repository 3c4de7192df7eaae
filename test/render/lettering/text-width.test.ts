import { describe, expect, it } from "vitest";
import { textWidth } from "../../../kernel-helpers/render/lettering/text-width.js";

describe("the width of text", () => {
  // 497/1000 em for each digit in the font's own table.
  it("is that of the font's digits", () => {
    expect(textWidth({ text: "0123456789", size: 10 })).toBeCloseTo(49.7, 0);
  });
  it("grows with the size, the weight and each character", () => {
    const plain = textWidth({ text: "pressure", size: 10 });
    expect(textWidth({ text: "pressure", size: 20 })).toBeCloseTo(2 * plain, 10);
    expect(textWidth({ text: "pressure", size: 10, isSemibold: true })).toBeGreaterThan(plain);
    expect(textWidth({ text: "pressures", size: 10 })).toBeGreaterThan(plain);
  });
  it("counts raised digits as small ones", () => {
    expect(textWidth({ text: "10⁻⁵", size: 10 })).toBeLessThan(
      textWidth({ text: "10−5", size: 10 }),
    );
  });
  it("has a guess for letters outside the table", () => {
    expect(textWidth({ text: "Жя", size: 10 })).toBe(12);
  });
});
