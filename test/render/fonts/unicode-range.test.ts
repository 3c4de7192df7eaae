import { describe, expect, it } from "vitest";
import { touchesRange } from "../../../kernel-helpers/render/fonts/unicode-range.js";

const touches = (text: string, range: string): boolean =>
  touchesRange(new Set(Array.from(text, (c) => c.codePointAt(0) ?? 0)), range);

describe("a range of characters", () => {
  it("is touched by its ends and what lies between, and by single characters", () => {
    for (const c of "aez") expect(touches(c, "U+0061-007A")).toBe(true);
    expect(touches("{`", "U+0061-007A")).toBe(false);
    expect(touches("ℓ", "U+0000-00FF, U+2113")).toBe(true);
  });
  it("that is none is refused", () => {
    expect(() => touches("a", "0061")).toThrow(/not a range/);
  });
});
