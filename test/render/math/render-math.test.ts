import { describe, expect, it } from "vitest";
import { RenderError } from "../../../kernel-helpers/errors/index.js";
import { methods } from "../../../kernel-helpers/physics/registry.js";
import { mathRenderer, renderMath } from "../../../kernel-helpers/render/math/render-math.js";
import { texToWords } from "../../../kernel-helpers/render/math/tex-to-words.js";

describe("an equation", () => {
  it("is one image with a text, none of it hidden from readers", async () => {
    const html = await renderMath({ tex: String.raw`\frac{a}{b}`, isDisplay: true });
    expect(html).toMatch(/^<div class="math" role="img" aria-label="a over b">.*<\/div>$/);
    expect(html).not.toContain("aria-hidden");
    expect(html).not.toContain("<math");
    expect(html.match(/role=/g)).toHaveLength(1);
  });
  it("within a line is a span", async () => {
    expect(await renderMath({ tex: String.raw`\frac ab`, isDisplay: false })).toMatch(
      /^<span class="math"/,
    );
  });
  it("that is no more than a symbol is set plainly", async () => {
    expect(await renderMath({ tex: String.raw`\rho_s`, isDisplay: false })).toBe(
      '<span class="symbol" role="img" aria-label="rho sub s"><i>ρ</i><sub><i>s</i></sub></span>',
    );
  });
  it("takes a text of its own, escaped", async () => {
    const html = await renderMath({ tex: "x", isDisplay: false, label: `"><script>` });
    expect(html).toContain(`aria-label="&quot;&gt;&lt;script&gt;"`);
  });
  it("that cannot be set is refused by its TeX", async () => {
    const math = await mathRenderer();
    const attempt = (): string => math({ tex: String.raw`\frac{a}{`, isDisplay: true });
    expect(attempt).toThrow(RenderError);
    expect(attempt).toThrow(/TeX \\frac\{a\}\{/);
  });
  it("cannot bring in links, styles or endless macros", async () => {
    const math = await mathRenderer();
    for (const tex of [
      String.raw`\href{javascript:alert(1)}{x}`,
      String.raw`\htmlStyle{color:red}{x}`,
    ])
      expect(math({ tex, isDisplay: false })).not.toMatch(/<a |javascript:[^<]*"|style="color:red/);
    expect(() => math({ tex: String.raw`\def\a{\a\a}\a`, isDisplay: false })).toThrow(RenderError);
  });
  it("escapes text within it", async () => {
    const html = await renderMath({ tex: String.raw`\text{<img src=x>}`, isDisplay: false });
    expect(html).not.toContain("<img");
  });
});

describe("every method", () => {
  it("has an equation and symbols that can be set and read aloud", async () => {
    const math = await mathRenderer();
    expect(methods.length).toBeGreaterThan(0);
    for (const m of methods) {
      const all = [
        m.tex,
        m.result.symbol,
        ...Object.values(m.inputs).flatMap((i) => i.symbol ?? []),
      ];
      for (const tex of all) {
        expect(math({ tex, isDisplay: true }), m.id).toContain('class="katex"');
        expect(texToWords(tex), m.id).not.toMatch(/\\|undefined/);
        expect(texToWords(tex), m.id).not.toBe("");
      }
    }
  });
});
