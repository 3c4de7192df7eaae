import { describe, expect, it } from "vitest";
import { aligned, paddings } from "../../kernel-helpers/document/align.js";

describe("a column of numbers", () => {
  it("lines up on the decimal point once the unseen digits stand behind it", () => {
    const texts = ["700", "0.9", "−8.681", "24\u202f000"];
    const pads = paddings(texts);
    expect(pads).toEqual([".000", "00", "", ".000"]);
    const behindPoint = texts.map((t, i) => (t + (pads[i] ?? "")).split(".")[1]?.length);
    expect(new Set(behindPoint)).toEqual(new Set([3]));
  });
  it("leaves alone what is no plain number, and numbers of very many decimals", () => {
    expect(paddings(["1/2", "1.2 × 10⁻⁵", "none", "0.0002907", "1.25", "3"])).toEqual([
      "",
      "",
      "",
      "",
      "",
      ".00",
    ]);
  });
  it("takes no range and no word into line", () => {
    const rows = [
      { value: "1.504", form: "range" as const },
      { value: "7", form: "words" as const },
      { value: "2.5", form: "number" as const },
      { value: "3", form: "number" as const },
    ];
    expect(aligned(rows).map((r) => r.padding)).toEqual(["", "", "", ".0"]);
  });
});
