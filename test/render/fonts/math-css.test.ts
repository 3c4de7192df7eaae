import { describe, expect, it } from "vitest";
import { mathCss } from "../../../kernel-helpers/render/fonts/math-css.js";
import { renderMath } from "../../../kernel-helpers/render/math/render-math.js";

const css = async (tex: string): Promise<string> =>
  mathCss({ covering: await renderMath({ tex, isDisplay: true }) });
const faces = (text: string): string[] =>
  [...text.matchAll(/@font-face\{font-family:(\w+);font-style:(\w+);font-weight:(\d+)/g)].map((m) =>
    m.slice(1).join(" "),
  );

describe("the style sheet of equations", () => {
  it("is empty for a page without any", () => {
    expect(mathCss({ covering: "<p>text</p>" })).toBe("");
  });
  it("inlines its fonts and names no file", async () => {
    const text = await css(String.raw`\frac{a}{b}`);
    expect(text).not.toMatch(/url\((?!data:font\/woff2;base64,)/);
    expect(text).toContain(".katex{");
  });
  it("has the upright and the italic face for a plain formula, and no others", async () => {
    expect(faces(await css("x+1"))).toEqual(["KaTeX_Main normal 400", "KaTeX_Math italic 400"]);
  });
  it.each([
    [String.raw`\left(\frac{a}{b}\right)`, "KaTeX_Size2 normal 400"],
    [String.raw`\Bigg(`, "KaTeX_Size4 normal 400"],
    [String.raw`\sum_{i} x`, "KaTeX_Size2 normal 400"],
    [String.raw`\mathbf{u}`, "KaTeX_Main normal 700"],
    [String.raw`\text{\textit{word}}`, "KaTeX_Main italic 400"],
    [String.raw`a\leqslant b`, "KaTeX_AMS normal 400"],
    [String.raw`\mathcal{L}`, "KaTeX_Caligraphic normal 400"],
  ])("has the further face that %s needs", async (tex, face) => {
    expect(faces(await css(tex))).toContain(face);
  });
});
