import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { findRoot } from "../../kernel-helpers/numerics/find-root.js";
import { codeOf } from "../code-of.js";

describe("findRoot against printed roots", () => {
  // Alefeld, Potra and Shi, ACM TOMS 21 (1995) 327: problems 1 to 4 of table 1.
  const twoPoles = (x: number): number => {
    let sum = 0;
    for (let i = 1; i <= 20; i++) sum += (2 * i - 5) ** 2 / (x - i ** 2) ** 3;
    return -2 * sum;
  };
  const cases: readonly [string, (x: number) => number, number, number, number][] = [
    ["sin x - x/2", (x) => Math.sin(x) - x / 2, Math.PI / 2, Math.PI, 1.8954942670339809],
    ["a sum of poles", twoPoles, 1 + 1e-9, 4 - 1e-9, 3.0229153472730568],
    ["-40 x exp(-x)", (x) => -40 * x * Math.exp(-x), -9, 31, 0],
    ["-200 x exp(-3x)", (x) => -200 * x * Math.exp(-3 * x), -9, 31, 0],
    ["x^12 - 0.2", (x) => x ** 12 - 0.2, 0, 5, 0.2 ** (1 / 12)],
    ["x^9", (x) => x ** 9, -1, 4, 0],
    // Wallis' cubic; the fixed point of the cosine (OEIS A003957); the omega constant (A030178).
    ["x^3 - 2x - 5", (x) => x ** 3 - 2 * x - 5, 2, 3, 2.0945514815423265],
    ["cos x - x", (x) => Math.cos(x) - x, 0, 1, 0.7390851332151607],
    ["x exp x - 1", (x) => x * Math.exp(x) - 1, 0, 1, 0.5671432904097838],
  ];
  it.each(cases)("%s", (_, f, low, high, root) => {
    const found = findRoot(f, low, high);
    expect(Math.abs(found - root)).toBeLessThanOrEqual(Math.max(1e-12 * root, 1e-30));
  });

  it("x^19, which is zero in floating point for every |x| below 1e-17", () => {
    expect(Math.abs(findRoot((x) => x ** 19, -1, 4))).toBeLessThan(1e-17);
  });

  const callsOf = (f: (x: number) => number, low: number, high: number): number => {
    let calls = 0;
    findRoot((x) => (calls++, f(x)), low, high);
    return calls;
  };
  it("costs few function values where the function is smooth", () => {
    expect(callsOf((x) => x ** 3 - 2 * x - 5, 2, 3)).toBeLessThanOrEqual(10);
  });
  it("costs little more than bisection where the function is flat", () => {
    const bisections = Math.log2(5 / 1e-30);
    expect(callsOf((x) => x ** 9, -1, 4)).toBeLessThanOrEqual(1.1 * bisections);
  });
});

describe("findRoot at its limits", () => {
  it("returns an end that is a root exactly", () => {
    expect(findRoot((x) => x - 0.1, 0.1, 7)).toBe(0.1);
    expect(findRoot((x) => x - 0.3, -2, 0.3)).toBe(0.3);
    expect(findRoot((x) => x - 5, 5, 5)).toBe(5);
  });
  it("finds a root far smaller than the bracket", () => {
    expect(findRoot((x) => Math.log(x / 3e-9), 1e-12, 1e6)).toBeCloseTo(3e-9, 20);
  });
  it("places a jump at the jump", () => {
    expect(findRoot((x) => (x < Math.SQRT2 ? -1 : 1), 0, 10)).toBeCloseTo(Math.SQRT2, 11);
  });
  it("loosens with the tolerance asked for", () => {
    const calls = (relative: number): number => {
      let n = 0;
      findRoot((x) => (n++, Math.exp(x) - 7), 0, 10, { relative });
      return n;
    };
    expect(calls(1e-3)).toBeLessThan(calls(1e-14));
  });
});

describe("findRoot as a property", () => {
  it("stays in the bracket, and the sign changes within the tolerance", () => {
    const root = fc.double({ min: -50, max: 50, noNaN: true });
    const reach = fc.double({ min: 0.01, max: 100, noNaN: true });
    const steepness = fc.double({ min: 0.05, max: 5, noNaN: true });
    fc.assert(
      fc.property(root, reach, reach, steepness, (x0, below, above, k) => {
        const f = (x: number): number => Math.sinh(k * Math.max(-30, Math.min(30, x - x0)));
        const x = findRoot(f, x0 - below, x0 + above);
        expect(x).toBeGreaterThanOrEqual(x0 - below);
        expect(x).toBeLessThanOrEqual(x0 + above);
        const width = Math.max(1e-30, 1e-12 * Math.abs(x)) + 4e-16 * Math.abs(x);
        expect(f(x - width) <= 0 && f(x + width) >= 0).toBe(true);
      }),
    );
  });
  it("does not depend on the sign of the function", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 9, noNaN: true }), (c) => {
        const f = (x: number): number => x ** 3 - c;
        expect(findRoot((x) => -f(x), 0, 3)).toBe(findRoot(f, 0, 3));
      }),
    );
  });
});

describe("findRoot refuses", () => {
  it("ends whose signs agree, naming both values", () => {
    const act = (): number => findRoot((x) => x * x + 1, -1, 2, { where: "rate" });
    expect(codeOf(act)).toBe("no-bracket");
    expect(act).toThrow(/rate: .*2 at -1 and 5 at 2/);
  });
  it("a function that is not finite, naming the place", () => {
    const act = (): number => findRoot((x) => (x > 0.4 && x < 0.6 ? NaN : x - 0.5), 0, 1);
    expect(codeOf(act)).toBe("not-finite");
    expect(act).toThrow(/NaN at 0\.5/);
    expect(codeOf(() => findRoot((x) => 1 / x, 0, 1))).toBe("not-finite");
  });
  it("a pole, which is not a root", () => {
    expect(codeOf(() => findRoot((x) => 1 / (x - 1.234567), 0, 2))).toBe("pole");
  });
  it("to give up silently", () => {
    expect(codeOf(() => findRoot((x) => x ** 3 - 2 * x - 5, 2, 3, { maxIterations: 3 }))).toBe(
      "no-convergence",
    );
  });
  it("a bracket that is none", () => {
    expect(codeOf(() => findRoot((x) => x, 1, -1))).toBe("bad-bracket");
    expect(codeOf(() => findRoot((x) => x, NaN, 1))).toBe("bad-bracket");
    expect(codeOf(() => findRoot((x) => x, -1, Infinity))).toBe("bad-bracket");
  });
});
