import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { risingRoot } from "../../kernel-helpers/physics/rising-root.js";
import { SEED } from "./arguments.js";

describe("the root of a rising function", () => {
  it("is that of a power, from a guess that is decades off", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.3, max: 6, noNaN: true }),
        fc.double({ min: -12, max: 12, noNaN: true }),
        fc.double({ min: -6, max: 6, noNaN: true }),
        (power, lnRoot, off) => {
          const root = Math.exp(lnRoot);
          const got = risingRoot({
            f: (x) => x ** power,
            target: root ** power,
            guess: root * Math.exp(off),
            rise: 1.5,
            where: "power",
          });
          expect(Math.abs(got / root - 1)).toBeLessThan(1e-12);
        },
      ),
      SEED,
    );
  });
  it("takes few evaluations for a sum of two powers", () => {
    let calls = 0;
    const f = (x: number) => {
      calls += 1;
      return 24 * x + 0.4 * x ** 2;
    };
    risingRoot({ f, target: 1e6, guess: 1000, rise: 1.5, where: "sum" });
    expect(calls).toBeLessThan(7);
  });
  it("lands on a jump over the target", () => {
    const f = (x: number) => (x < 3 ? x : 2 * x);
    expect(risingRoot({ f, target: 4, guess: 1, rise: 1, where: "jump" })).toBeCloseTo(3, 9);
  });
  it("stays below its limit where the function turns down behind it", () => {
    const f = (x: number) => (x < 10 ? x ** 2 : 1e4 / x ** 2 + x ** 2 / 100);
    expect(risingRoot({ f, target: 81, guess: 30, rise: 2, limit: 10, where: "turn" })).toBeCloseTo(
      9,
      9,
    );
  });
  it("is refused by code when the target is never reached", () => {
    const f = (x: number) => x / (1 + x);
    expect(() => risingRoot({ f, target: 2, guess: 1, rise: 1, where: "never" })).toThrow(
      expect.objectContaining({ code: "no-bracket" }) as Error,
    );
  });
});
