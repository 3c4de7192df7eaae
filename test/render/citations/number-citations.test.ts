import { describe, expect, it } from "vitest";
import { numberCitations } from "../../../kernel-helpers/render/citations/number-citations.js";

describe("citation numbers", () => {
  it("count from 1 in the order of first use", () => {
    expect(numberCitations(["b", "a", "b", "c", "a"])).toEqual({
      order: ["b", "a", "c"],
      numbers: { b: 1, a: 2, c: 3 },
    });
  });
  it("are given to any id", () => {
    const { numbers } = numberCitations(["__proto__", "constructor"]);
    expect(Object.entries(numbers)).toEqual([
      ["__proto__", 1],
      ["constructor", 2],
    ]);
  });
});
