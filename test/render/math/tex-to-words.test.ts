import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { texToWords } from "../../../kernel-helpers/render/math/tex-to-words.js";

const raw = String.raw;

describe("a formula in words", () => {
  it.each([
    [raw`\frac{\Delta p}{L}`, "Delta p over L"],
    [raw`\Delta p/L`, "Delta p over L"],
    [
      raw`150\,\frac{(1-\varepsilon)^2}{\varepsilon^3}\frac{\mu u}{d^2}`,
      "150 times (1 minus epsilon) squared over epsilon cubed times (mu times u) over d squared",
    ],
    [raw`\frac{a+b}{c}`, "(a plus b) over c"],
    [raw`\frac{\frac{a}{b}}{c}`, "(a over b) over c"],
    [raw`\sqrt{x}`, "square root of x"],
    [raw`\sqrt[3]{x+1}`, "cube root of (x plus 1)"],
    [raw`\frac{\mathrm{d}p}{\mathrm{d}z}`, "d p over d z"],
    [raw`\frac{dp}{dz}`, "d p over d z"],
    [raw`\frac{\partial p}{\partial t}`, "partial p over partial t"],
    [raw`\mathrm{Re}_m^{-0.25}`, "Re sub m to the power minus 0.25"],
    [raw`p_{\mathrm{wf}}`, "p sub wf"],
    [raw`p_{wf}'`, "p sub wf prime"],
    [raw`u^2_s`, "u sub s squared"],
    [raw`x^23`, "x squared times 3"],
    [raw`\ln\frac{r_e}{r_w}+S`, "ln of (r sub e over r sub w) plus S"],
    [raw`\exp\left(-\frac{E}{RT}\right)`, "exp of (minus E over (R times T))"],
    [raw`\log_{10}x`, "log base 10 of x"],
    [raw`\max(a,b)\le 10^{-5}`, "maximum of (a, b) is at most 10 to the power minus 5"],
    [raw`\rho u|u|`, "rho times u times absolute value of (u)"],
    [raw`\left|x-y\right|`, "absolute value of (x minus y)"],
    [raw`\rho(z)`, "rho of (z)"],
    [raw`\mu(1-\varepsilon)`, "mu times (1 minus epsilon)"],
    [raw`\int_0^L\rho(z)g\,\mathrm{d}z`, "integral from 0 to L of rho of (z) times g times d z"],
    [raw`\sum_{i=1}^{n}x_i`, "sum from i equals 1 to n of x sub i"],
    [raw`\dot m=\rho A\bar u`, "m dot equals rho times A times u bar"],
    [raw`a\cdot b\times c\ge d`, "a times b times c is at least d"],
    [raw`(a/b)^{0.687}`, "(a over b) to the power 0.687"],
    [raw`{a+b}^2`, "(a plus b) squared"],
    [raw`12\,400\,\mathrm{kPa}`, "12400 times kPa"],
    [raw`25\,^\circ\mathrm{C}`, "25 degrees C"],
    [raw`5\,\%`, "5 percent"],
    [
      raw`f=\begin{cases}64/\mathrm{Re}&\text{if }\mathrm{Re}<2300\\[1ex]0.3&\text{otherwise}\end{cases}`,
      "f equals either 64 over Re, if Re is less than 2300; or 0.3, otherwise",
    ],
    [raw`a=b\qquad c=d`, "a equals b, c equals d"],
  ])("reads %s", (tex, words) => {
    expect(texToWords(tex)).toBe(words);
  });
  it("names a command that it does not know", () => {
    expect(texToWords(raw`\foo x`)).toBe("foo times x");
  });
  it("comes out of any text, however broken, as one line without commands", () => {
    const piece = fc.constantFrom(
      ...[raw`\frac`, raw`\sqrt`, raw`\left(`, raw`\right)`, raw`\begin{cases}`, raw`\end{cases}`],
      ...[
        "{",
        "}",
        "^",
        "_",
        "|",
        "(",
        ")",
        "[",
        "&",
        raw`\\`,
        "x",
        "12",
        "'",
        raw`\,`,
        raw`\mathrm{`,
      ],
    );
    fc.assert(
      fc.property(fc.array(piece, { maxLength: 14 }), (pieces) => {
        const words = texToWords(pieces.join(" "));
        expect(words).not.toMatch(/\n|undefined|\\(frac|sqrt|left|right|begin|end)/);
      }),
    );
  });
});
