import { describe, expect, it } from "vitest";
import { escapeHtml } from "../../../kernel-helpers/render/lettering/escape-html.js";
import {
  raiseInSvg,
  typesetHtml,
  typesetSvg,
} from "../../../kernel-helpers/render/lettering/typeset.js";
import { formatNumber } from "../../../kernel-helpers/units/index.js";

describe("escaped text", () => {
  it("is safe between tags and in quoted attributes", () => {
    expect(escapeHtml(`<a href="x" id='y'>&amp;`)).toBe(
      "&lt;a href=&quot;x&quot; id=&#39;y&#39;&gt;&amp;amp;",
    );
  });
  it("holds no control character that an SVG file may not hold", () => {
    expect(escapeHtml("a\u0000b\u0008c\td\ne")).toBe("a\ufffdb\ufffdc\td\ne");
  });
});

describe("typeset text", () => {
  it("raises powers of ten as the units write them", () => {
    expect(typesetHtml(`${formatNumber(3.2e-5, 2)} m²`)).toBe(
      "3.2 × 10<sup>−5</sup> m<sup>2</sup>",
    );
  });
  it("lowers subscripts and escapes all the rest", () => {
    expect(typesetHtml("<p₁₂>")).toBe("&lt;p<sub>12</sub>&gt;");
    expect(typesetHtml("Xₘₐₓ")).toBe("X<sub>max</sub>");
  });
  it("leaves ¹²³ alone when no other raised digit is beside them, since the fonts have them", () => {
    expect(typesetHtml("m² at 10²³")).toBe("m² at 10²³");
    expect(typesetHtml("10¹²⁰")).toBe("10<sup>120</sup>");
  });
  it("shifts spans in drawings", () => {
    expect(typesetSvg("a<b⁻¹")).toBe(
      'a&lt;b<tspan baseline-shift="33%" font-size="72%">−1</tspan>',
    );
  });
  it("does not escape a second time what is escaped already", () => {
    expect(raiseInSvg("a &lt; b")).toBe("a &lt; b");
  });
});
