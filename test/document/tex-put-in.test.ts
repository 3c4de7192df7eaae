import { describe, expect, it } from "vitest";
import { equationOf, putInOf } from "../../kernel-helpers/document/equation-of.js";
import { putIn } from "../../kernel-helpers/document/tex-put-in.js";
import { texNumber } from "../../kernel-helpers/document/tex-number.js";

const put = (tex: string, values: Record<string, string>): string =>
  putIn(tex, new Map(Object.entries(values)));

describe("numbers put into an equation", () => {
  it.each([
    [
      String.raw`\frac{\rho v D}{\mu}`,
      { "\\rho": "850", v: "2", D: "0.2", "\\mu": "0.005" },
      String.raw`\frac{{(850)} {(2)} {(0.2)}}{{(0.005)}}`,
    ],
    [String.raw`\rho_s-\rho`, { "\\rho": "700", "\\rho_s": "7850" }, "{(7850)}-{(700)}"],
    [String.raw`d_v+d`, { d: "1" }, "d_v+{(1)}"],
    [String.raw`D^2`, { D: "3" }, "{(3)}^2"],
    [
      String.raw`\frac{2.51}{\mathrm{Re}\sqrt f}+\mathrm{Re}_m`,
      { "\\mathrm{Re}": "4000" },
      String.raw`\frac{2.51}{{(4000)}\sqrt f}+\mathrm{Re}_m`,
    ],
    [String.raw`\mathrm{Re}\,e`, { e: "1", R: "2" }, String.raw`\mathrm{Re}\,{(1)}`],
    [
      String.raw`\operatorname{max}(m,a)`,
      { m: "1", a: "2", x: "3" },
      String.raw`\operatorname{max}({(1)},{(2)})`,
    ],
    [String.raw`\mu\mu_s`, { "\\mu": "5" }, String.raw`{(5)}\mu_s`],
    [String.raw`\varepsilon^3`, { "\\varepsilon": "0.4" }, "{(0.4)}^3"],
  ])("%s", (tex, values, expected) => {
    expect(put(tex, values as Record<string, string>)).toBe(expected);
  });
});

describe("an equation", () => {
  it("stands behind its symbol, or whole where it is solved for it", () => {
    expect(equationOf("v", "a+b")).toBe("v=a+b");
    expect(equationOf("v_t", String.raw`v:\ v=f(v)`)).toBe(
      String.raw`v=f(v)\qquad\text{solved for }v_t`,
    );
    expect(putInOf("v_t", String.raw`v:\ v=f(v)`, "=3")).toBe(String.raw`v=f(v)\qquad v_t=3`);
  });
});

describe("the result of an equation", () => {
  it("stands behind a single relation", () => {
    expect(putInOf("v", String.raw`\frac{4{(2)}}{\pi}`, "=3")).toBe(
      String.raw`v=\frac{4{(2)}}{\pi}=3`,
    );
  });
  it("is never said of a relation that follows", () => {
    expect(putInOf("f", String.raw`1-\lambda^{1.5},\quad\lambda=\frac{{(1)}}{{(2)}}`, "=0.6")).toBe(
      String.raw`f=1-\lambda^{1.5},\quad\lambda=\frac{{(1)}}{{(2)}}\qquad f=0.6`,
    );
  });
});

describe("a number in TeX", () => {
  it.each([
    [0, "0"],
    [12345.678, "12345.7"],
    [0.0012345678, "0.00123457"],
    [0.00012, String.raw`1.2\times 10^{-4}`],
    [-4.5e7, String.raw`-4.5\times 10^{7}`],
    [1, "1"],
  ])("%d", (x, expected) => {
    expect(texNumber(x)).toBe(expected);
  });
});
