import { createRequire } from "node:module";
import { describe, expect, it } from "vitest";
import { fontCss } from "../../../kernel-helpers/render/fonts/font-css.js";
import { raisedLowered } from "../../../kernel-helpers/render/lettering/raised-lowered.js";
import { allUnits, formatNumber } from "../../../kernel-helpers/units/index.js";
import { woff2Characters } from "./woff2-characters.js";

const faces = (css: string): number => css.split("@font-face").length - 1;

describe("the font rules", () => {
  it("for plain text inline five Latin faces and no other, in less than 140 KB", () => {
    const css = fontCss({ covering: "A plain page" });
    expect(faces(css)).toBe(5);
    expect(css.length).toBeLessThan(140_000);
    expect(css).not.toMatch(/url\((?!data:font\/woff2;base64,)/);
  });
  it("bring other alphabets as the text asks for them", () => {
    const plain = faces(fontCss({ covering: "x" }));
    expect(faces(fontCss({ covering: "Δρ" }))).toBe(plain + 5);
    expect(faces(fontCss({ covering: "Łukasz" }))).toBe(plain + 5);
    expect(faces(fontCss({ covering: "&#916; &#x141;" }))).toBe(plain + 10);
  });
  it("bring the signs, unless the equations on the page bring them", () => {
    expect(fontCss({ covering: "a ≤ b" })).toContain("font-family:KaTeX_Main");
    expect(fontCss({ covering: `a ≤ b <span class="katex">` })).not.toContain("KaTeX_Main");
  });
  it("are the same each time", () => {
    expect(fontCss({ covering: "Δ ≤" })).toBe(fontCss({ covering: "Δ ≤" }));
  });
});

describe("the faces", () => {
  const path = createRequire(import.meta.url).resolve;
  const subset = (name: string): ReadonlySet<number> =>
    woff2Characters(path(`@fontsource/${name}-400-normal.woff2`));
  const families = ["source-serif-4", "source-sans-3"].map((family) => {
    const files = ["latin", "latin-ext", "greek"].map((s) =>
      subset(`${family}/files/${family}-${s}`),
    );
    return [...files, woff2Characters(path("katex/dist/fonts/KaTeX_Main-Regular.woff2"))];
  });
  const missing = (text: string): string[] =>
    raisedLowered(text)
      .flatMap((part) => Array.from(part.text))
      // The shaper makes a narrow no-break space out of the space.
      .filter((c) => c !== "\u202f")
      .filter((c) => !families.every((f) => f.some((set) => set.has(c.codePointAt(0) ?? 0))));

  it("have every character that units and numbers are written with", () => {
    const numbers = [-12_345.6, 3.2e-15, 9.8e17, 0].map((x) => formatNumber(x));
    expect(allUnits.length).toBeGreaterThan(50);
    for (const text of [...allUnits.map((u) => u.symbol), ...numbers])
      expect(missing(text), text).toEqual([]);
  });
  it("have what reports write besides", () => {
    expect(
      missing("×−·°µμ±≤≥≈≡∞√∂∝→←↑↓′″½¼ΔΘΣΦΩαβγδεζηθκλνξπρστφχψω–—…“”‘’§†•ČŁŌéßñ⁻⁰⁴⁵⁶⁷⁸⁹₀₁₂ₘₜₐₓ"),
    ).toEqual([]);
  });
});
