import { describe, expect, it } from "vitest";
import {
  dimensionOf,
  evaluateFormula,
  formulaToTex,
  parseFormula,
} from "../../kernel-helpers/method/formula/index.js";
import { kinds } from "../../kernel-helpers/units/index.js";

const value = (text: string, values: Record<string, number> = {}): number =>
  evaluateFormula(parseFormula(text), values);
const dims = {
  v: kinds.velocity.dimension,
  D: kinds.length.dimension,
  h: kinds.length.dimension,
  x: kinds.dimensionless.dimension,
};

describe("a formula", () => {
  it.each([
    ["-2^2", -4],
    ["2^3^2", 512],
    ["2^-1", 0.5],
    ["1 - 2 - 3", -4],
    ["8 / 4 / 2", 1],
    ["2 * (3 + 4)", 14],
    ["1e-3 * 2.5E3", 2.5],
    ["max(1, 2, 3) - min(4, 5)", -1],
    ["sqrt(2*g*1)", Math.sqrt(2 * 9.80665)],
    ["pi/4 * 2^2", Math.PI],
    ["ln(exp(2)) + log10(1000)", 5],
    ["--3", 3],
  ])("%s is %d", (text, expected) => {
    expect(value(text)).toBeCloseTo(expected, 12);
  });
  it.each([
    ["1 +", "ends too early"],
    ["1 + * 2", '"*" at character 5'],
    ["(1 + 2", "ends too early"],
    ["2 v", '"v" at character 3'],
    ["foo(1)", '"foo" at character 1'],
    ["sqrt(1, 2)", "one argument, got 2"],
    ["max(1)", "two arguments or more, got 1"],
    ["1 $ 2", '"$" at character 3'],
    ["", "ends too early"],
  ])("%s is refused at its place", (text, says) => {
    expect(() => parseFormula(text)).toThrow(
      expect.objectContaining({
        code: "not-a-formula",
        message: expect.stringContaining(says) as string,
      }),
    );
  });
  it.each([
    ["1 / (v - v)", "divides by zero"],
    ["sqrt(0 - v)", "takes sqrt of"],
    ["(0 - v)^0.5", "to the power"],
    ["exp(1000 * v)", "gives Infinity"],
    ["w", 'has no value for "w"'],
  ])("%s ends in a named error, not a NaN", (text, says) => {
    expect(() => value(text, { v: 2 })).toThrow(
      expect.objectContaining({
        code: "not-finite",
        message: expect.stringContaining(says) as string,
      }),
    );
  });
});

describe("the dimension of a formula", () => {
  it("follows products, roots and powers", () => {
    expect(dimensionOf(parseFormula("sqrt(2*g*h)"), dims)).toEqual(kinds.velocity.dimension);
    expect(dimensionOf(parseFormula("v * pi/4 * D^2"), dims)).toEqual(kinds.flowRate.dimension);
    expect(dimensionOf(parseFormula("v^(1/2) * v^(1/2)"), dims)).toEqual(kinds.velocity.dimension);
  });
  it.each([
    ["v + D", "cannot add a length to a velocity"],
    ["D - v", "cannot subtract a velocity from a length"],
    ["exp(v)", "cannot take exp of a velocity"],
    ["D^x", "not a plain number"],
    ["2^D", "cannot raise to the power of a length"],
    ["max(v, D)", "cannot take the max of"],
  ])("%s is refused in words", (text, says) => {
    expect(() => dimensionOf(parseFormula(text), dims)).toThrow(
      expect.objectContaining({
        code: "wrong-dimension",
        message: expect.stringContaining(says) as string,
      }),
    );
  });
});

describe("a formula in TeX", () => {
  const tex = (text: string): string => formulaToTex(parseFormula(text), (n) => n);
  it.each([
    ["a - (b - c)", String.raw`{a}-\left({b}-{c}\right)`],
    ["a * (b + c)", String.raw`{a}\,\left({b}+{c}\right)`],
    ["(a + b) / c", String.raw`\frac{{a}+{b}}{{c}}`],
    ["(a / b)^2", String.raw`\left(\frac{{a}}{{b}}\right)^{2}`],
    ["-a^2", String.raw`-{a}^{2}`],
    ["2 * 3", String.raw`2\cdot 3`],
    ["sqrt(2*g*h)", String.raw`\sqrt{2\,g\,{h}}`],
    ["1e-3 * a", String.raw`1\times 10^{-3}\,{a}`],
    ["a * -b", String.raw`{a}\,\left(-{b}\right)`],
  ])("%s reads well", (text, expected) => {
    expect(tex(text)).toBe(expected);
  });
});
