import { describe, expect, it } from "vitest";
import { simpleMath } from "../../../kernel-helpers/render/math/simple-math.js";
import { methods } from "../../../kernel-helpers/physics/index.js";

describe("a symbol set plainly", () => {
  it.each([
    ["v", "<i>v</i>"],
    [String.raw`\mathrm{Re}_m`, "Re<sub><i>m</i></sub>"],
    [String.raw`\Delta p/L`, "Δ<i>p</i>/<i>L</i>"],
    ["q_{\\mathrm{in}}^2", "<i>q</i><sub>in</sub><sup>2</sup>"],
    [String.raw`\text{a<b}`, "a&lt;b"],
    ["u_l", "<i>u</i><sub><i>l</i></sub>"],
  ])("%s", (tex, html) => {
    expect(simpleMath(tex)).toBe(html);
  });
  it.each([
    String.raw`\frac ab`,
    String.raw`\sqrt x`,
    "a+b",
    "{",
    "}",
    "x_",
    String.raw`\left(a\right)`,
  ])("is not tried on %s", (tex) => {
    expect(simpleMath(tex)).toBeNull();
  });
  it("does for nearly every symbol of the catalogue", () => {
    const symbols = methods.flatMap((m) => [
      m.result.symbol,
      ...Object.values(m.inputs).flatMap((f) => f.symbol ?? []),
    ]);
    const plain = symbols.filter((s) => simpleMath(s) !== null);
    expect(plain.length / symbols.length).toBeGreaterThan(0.95);
  });
});
