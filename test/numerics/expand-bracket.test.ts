import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { expandBracket } from "../../kernel-helpers/numerics/expand-bracket.js";
import { findRoot } from "../../kernel-helpers/numerics/find-root.js";
import { codeOf } from "../code-of.js";

describe("expandBracket", () => {
  it("keeps a bracket that already holds a root", () => {
    expect(expandBracket((x) => x - 1, 0, 3)).toEqual({ low: 0, high: 3 });
    expect(expandBracket((x) => x, 0, 3)).toEqual({ low: 0, high: 3 });
  });
  it("returns the newest piece only", () => {
    expect(expandBracket((x) => x - 10, 0, 1)).toEqual({ low: 8, high: 16 });
    expect(expandBracket((x) => x + 10, 0, 1)).toEqual({ low: -15, high: -7 });
  });
  it("never asks for a value beyond its limits", () => {
    const asked: number[] = [];
    const f = (x: number): number => (asked.push(x), x - 0.5);
    expect(expandBracket(f, 4, 8, { least: 0.1, most: 10 })).toEqual({ low: 0.1, high: 4 });
    expect(Math.min(...asked)).toBe(0.1);
    expect(Math.max(...asked)).toBeLessThanOrEqual(10);
  });
  it("turns to the other end when one has met its limit", () => {
    expect(expandBracket((x) => x - 20, 1, 2, { least: 1 })).toEqual({ low: 17, high: 33 });
    expect(expandBracket((x) => 5 - x, 6, 7, { most: 7 })).toEqual({ low: 5, high: 6 });
  });
  it("finds a bracket wherever a monotone function has its root", () => {
    const place = fc.double({ min: -1e6, max: 1e6, noNaN: true });
    fc.assert(
      fc.property(place, place, fc.boolean(), (root, start, rises) => {
        const f = (x: number): number => (rises ? 1 : -1) * Math.cbrt(x - root);
        const { low, high } = expandBracket(f, start, start + 1);
        expect(low <= root && root <= high).toBe(true);
        expect(findRoot(f, low, high)).toBeCloseTo(root, 5);
      }),
    );
  });
  it("refuses a function without a root, naming how far it looked", () => {
    const act = (): unknown => expandBracket((x) => x * x + 1, -1, 1, { least: -3, most: 5 });
    expect(codeOf(act)).toBe("no-bracket");
    expect(act).toThrow(/from -3 to 5: the function is 10 and 26/);
    expect(codeOf(() => expandBracket(Math.exp, 0, 1, { maxIterations: 5 }))).toBe("no-bracket");
  });
  it("refuses a function that is not finite and a start that is no interval", () => {
    expect(codeOf(() => expandBracket((x) => Math.log(x) + 5, 1, 2))).toBe("not-finite");
    expect(codeOf(() => expandBracket((x) => x, 2, 1))).toBe("bad-bracket");
    expect(codeOf(() => expandBracket((x) => x, 1, 2, { least: 1.5 }))).toBe("bad-bracket");
    expect(codeOf(() => expandBracket((x) => x, 1, 2, { factor: 1 }))).toBe("bad-bracket");
    expect(codeOf(() => expandBracket((x) => x, -Infinity, 2))).toBe("bad-bracket");
  });
});
