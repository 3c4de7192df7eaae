import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  dimensionOf,
  evaluateFormula,
  formulaToTex,
  parseFormula,
} from "../../kernel-helpers/method/formula/index.js";
import type { Dimension } from "../../kernel-helpers/units/index.js";
import { codeOf } from "../code-of.js";
import { readTex } from "./read-tex.js";

/** A random expression, written out with as few parentheses as the grammar allows, and its value. */
interface Sample {
  readonly text: string;
  readonly value: number;
  /** 0 sum, 1 product, 2 sign, 3 power, 4 atom. */
  readonly binds: number;
}
const names = { a: 1.7, b: 0.6, c_2: 3.1 };
const tight = (s: Sample, least: number): string => (s.binds >= least ? s.text : `(${s.text})`);

const sample = fc.letrec<{ e: Sample }>((tie) => {
  const e = tie("e");
  const atom = fc.oneof(
    fc.constantFrom("0.5", "2", "1e-1", "3.", ".25").map((text) => ({ text, value: Number(text) })),
    fc.constantFrom(...(Object.keys(names) as (keyof typeof names)[])).map((text) => ({
      text,
      value: names[text],
    })),
    fc.constant({ text: "pi", value: Math.PI }),
  );
  return {
    e: fc.oneof(
      { maxDepth: 4, depthIdentifier: "e" },
      atom.map((x) => ({ ...x, binds: 4 })),
      fc.tuple(e, e).map(([l, r]) => ({
        text: `${tight(l, 0)} + ${tight(r, 1)}`,
        value: l.value + r.value,
        binds: 0,
      })),
      fc.tuple(e, e).map(([l, r]) => ({
        text: `${tight(l, 0)}-${tight(r, 1)}`,
        value: l.value - r.value,
        binds: 0,
      })),
      fc.tuple(e, e).map(([l, r]) => ({
        text: `${tight(l, 1)} * ${tight(r, 2)}`,
        value: l.value * r.value,
        binds: 1,
      })),
      fc.tuple(e, e).map(([l, r]) => ({
        text: `${tight(l, 1)}/${tight(r, 2)}`,
        value: l.value / r.value,
        binds: 1,
      })),
      e.map((x) => ({ text: `-${tight(x, 2)}`, value: -x.value, binds: 2 })),
      fc.tuple(e, e).map(([l, r]) => ({
        text: `${tight(l, 4)}^${tight(r, 2)}`,
        value: l.value ** r.value,
        binds: 3,
      })),
      e.map((x) => ({ text: `sqrt(${x.text})`, value: Math.sqrt(x.value), binds: 4 })),
      e.map((x) => ({ text: `abs(${x.text})`, value: Math.abs(x.value), binds: 4 })),
      e.map((x) => ({ text: `atan( ${x.text} )`, value: Math.atan(x.value), binds: 4 })),
      fc.tuple(e, e).map(([l, r]) => ({
        text: `max(${l.text}, ${r.text})`,
        value: Math.max(l.value, r.value),
        binds: 4,
      })),
    ),
  };
}).e;

// Where a power or a difference blows up rounding, two right evaluations differ.
const isCalm = (x: number): boolean => Number.isFinite(x) && Math.abs(x) < 1e6;
const agrees = (x: number, y: number): boolean =>
  Math.abs(x - y) <= 1e-6 * Math.max(1, Math.abs(y));

describe("a formula means what its text says", () => {
  it("to an evaluator that never saw the text", () => {
    fc.assert(
      fc.property(sample, ({ text, value }) => {
        const formula = parseFormula(text);
        if (codeOf(() => evaluateFormula(formula, names)) === "no error")
          expect(evaluateFormula(formula, names)).toBe(value);
        else expect(isCalm(value) && !hidesAFault(text)).toBe(false);
      }),
      { numRuns: 2000 },
    );
  });
  // A fault on the way can vanish from the end: 1/(1/0) is 0, max(sqrt(-1), 1) is NaN.
  const hidesAFault = (text: string): boolean => /[/^]|sqrt/.test(text);

  it("to a reader of its TeX, with symbols and with numbers put in", () => {
    const cases: readonly (readonly [string, typeof names])[] = [
      ["positive", names],
      ["negative", { a: -1.7, b: -0.6, c_2: 3.1 }],
      ["powers of ten", { a: 1.7e-5, b: 6e4, c_2: -3.1e2 }],
    ];
    const put = (x: number): string => {
      const [mantissa = "", power = "0"] = x.toExponential().split("e");
      const isPlain = Math.abs(x) >= 0.1 && Math.abs(x) < 100;
      return isPlain ? String(x) : String.raw`${mantissa}\times 10^{${Number(power)}}`;
    };
    fc.assert(
      fc.property(sample, fc.constantFrom(...cases), ({ text }, [, values]) => {
        const formula = parseFormula(text);
        fc.pre(codeOf(() => evaluateFormula(formula, values)) === "no error");
        const value = evaluateFormula(formula, values);
        fc.pre(isCalm(value));
        const symbols = readTex(
          formulaToTex(formula, (n) => n),
          values,
        );
        const numbers = readTex(
          formulaToTex(formula, (n) => put(values[n as keyof typeof names])),
          {},
        );
        expect([text, agrees(symbols, value), agrees(numbers, value)]).toEqual([text, true, true]);
      }),
      { numRuns: 2000 },
    );
  });
  it("in the same TeX when it is parsed again without its spaces", () => {
    fc.assert(
      fc.property(sample, ({ text }) => {
        const tex = (t: string): string => formulaToTex(parseFormula(t), (n) => n);
        expect(tex(text.replaceAll(" ", ""))).toBe(tex(text));
      }),
    );
  });
});

describe("the TeX of a formula", () => {
  const tex = (text: string, symbolOf = (n: string) => n): string =>
    formulaToTex(parseFormula(text), symbolOf);
  it.each([
    ["-a*b", String.raw`-{a}\,{b}`],
    ["-(a + b)", String.raw`-\left({a}+{b}\right)`],
    ["a + -b", String.raw`{a}+\left(-{b}\right)`],
    ["-1e-3", String.raw`-1\times 10^{-3}`],
    ["a*2", String.raw`{a}\cdot 2`],
    ["2*(b/c)", String.raw`2\cdot \frac{{b}}{{c}}`],
    ["sin(x)^2", String.raw`\left(\sin\left({x}\right)\right)^{2}`],
    ["a^b^c", "{a}^{{b}^{{c}}}"],
    ["q / (pi/4 * D^2)", String.raw`\frac{{q}}{\frac{\pi}{4}\,{D}^{2}}`],
  ])("%s", (text, expected) => {
    expect(tex(text)).toBe(expected);
  });
  it.each([
    ["a^2", "-3.2", String.raw`\left({-3.2}\right)^{2}`],
    ["a^2", String.raw`2\times 10^{3}`, String.raw`\left({2\times 10^{3}}\right)^{2}`],
    ["a^2", "v^{*}", String.raw`\left({v^{*}}\right)^{2}`],
    ["a^2", String.raw`\rho_s`, String.raw`{\rho_s}^{2}`],
    ["1 - a", "-3.2", String.raw`1-\left({-3.2}\right)`],
    ["2*a", "5", String.raw`2\cdot {5}`],
    ["-a", "-5", String.raw`-\left({-5}\right)`],
  ])("%s with %s put in", (text, put, expected) => {
    expect(tex(text, () => put)).toBe(expected);
  });
});

describe("a fault on the way is not hidden by the end", () => {
  it.each(["1 / exp(1000)", "atan(1 / (v - v))", "min(1, 1e300 * 1e300)", "0^(0 - 1) * 0"])(
    "%s",
    (text) => {
      expect(codeOf(() => evaluateFormula(parseFormula(text), { v: 2 }))).toBe("not-finite");
    },
  );
  it("nor a value that is not a number, nor a name that every object inherits", () => {
    const f = parseFormula("max(v, 0)");
    expect(codeOf(() => evaluateFormula(f, { v: NaN }))).toBe("not-finite");
    expect(codeOf(() => evaluateFormula(parseFormula("constructor"), {}))).toBe("not-finite");
    expect(codeOf(() => dimensionOf(parseFormula("constructor"), {}))).toBe("wrong-dimension");
  });
});

describe("parsing", () => {
  it("names the values in order of first use, without constants and functions", () => {
    expect(parseFormula("b + a * sqrt(b) + pi * g * g_2 + max(x, a)").names).toEqual([
      ...["b", "a", "g_2", "x"],
    ]);
    expect(parseFormula("g * h", ["g"]).names).toEqual(["g", "h"]);
  });
  it("knows standard gravity", () => {
    expect(evaluateFormula(parseFormula("g"), {})).toBe(9.80665);
  });
  it("refuses text that is too long, too deep or holds a number that is infinite", () => {
    const deep = (n: number): string => "(".repeat(n) + "1" + ")".repeat(n);
    expect(codeOf(() => parseFormula(`1${"+1".repeat(1000)}`))).toBe("not-a-formula");
    expect(evaluateFormula(parseFormula(`1${"+1".repeat(999)}`), {})).toBe(1000);
    expect(codeOf(() => parseFormula(deep(101)))).toBe("not-a-formula");
    expect(evaluateFormula(parseFormula(deep(90)), {})).toBe(1);
    expect(codeOf(() => parseFormula("-".repeat(500) + "1"))).toBe("not-a-formula");
    expect(codeOf(() => parseFormula("1e999"))).toBe("not-a-formula");
  });
  it.each([
    ["a ++", 5],
    ["a b", 3],
    ["(a", 3],
    ["max(a,)", 7],
    ["3..5", 3],
    ["a ^ )", 5],
  ])("places the fault in %j", (text, at) => {
    const says = at > text.length ? /ends too early/ : new RegExp(`at character ${at};`);
    expect(() => parseFormula(text)).toThrow(says);
  });
});

describe("dimensions", () => {
  const dims: { readonly [name: string]: Dimension } = {
    v: [0, 1, -1, 0],
    h: [0, 1, 0, 0],
    p: [1, -1, -2, 0],
    rho: [1, -3, 0, 0],
    T: [0, 0, 0, 1],
    x: [0, 0, 0, 0],
  };
  const of = (text: string): readonly number[] => dimensionOf(parseFormula(text), dims);
  it.each([
    ["sqrt(2*p/rho)", dims["v"]],
    ["sqrt(sqrt(h))^4", dims["h"]],
    ["h^(1/3) * h^(2/3)", dims["h"]],
    ["abs(-v)", dims["v"]],
    ["max(0, v)", dims["v"]],
    ["min(v, 2*v, 0)", dims["v"]],
    ["max(0, 0)", dims["x"]],
    ["p - rho*g*h", dims["p"]],
    ["2^x", dims["x"]],
    ["exp(-h/(2*h))", dims["x"]],
  ])("of %s", (text, expected) => {
    of(text).forEach((d, i) => {
      expect(d).toBeCloseTo(expected?.[i] as number, 12);
    });
  });
  it.each(["v - h", "p + rho", "T - 273.15", "ln(p)", "sin(h)", "2^h", "h^x", "max(v, 1)", "h^v"])(
    "%s is refused",
    (text) => {
      expect(codeOf(() => of(text))).toBe("wrong-dimension");
    },
  );
});
