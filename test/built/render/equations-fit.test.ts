import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { equationOf, putInOf } from "../../../kernel-helpers/document/equation-of.js";
import { putIn } from "../../../kernel-helpers/document/tex-put-in.js";
import { methods } from "../../../kernel-helpers/physics/index.js";
import { mathCss, mathRenderer, withBrowser } from "../../../kernel-helpers/render/index.js";

const style = (name: string): string =>
  readFileSync(new URL(`../../../templates/${name}`, import.meta.url), "utf8");

describe("on paper, where nothing scrolls", () => {
  it("every equation of the catalogue fits the text width, also with long numbers put in", async () => {
    const math = await mathRenderer();
    const equations = methods.flatMap((m) => {
      const symbols = Object.values(m.inputs).flatMap((f) => f.symbol ?? []);
      const numbers = new Map(symbols.map((s) => [s, "0.00123457"]));
      const { symbol } = m.result;
      return [
        equationOf(symbol, m.tex),
        putInOf(symbol, putIn(m.tex, numbers), String.raw`=1.23457\times 10^{5}\ \mathrm{kg/m^3}`),
      ];
    });
    const body = equations
      .map((tex) => `<div class="eq">${math({ tex, isDisplay: true })}</div>`)
      .join("");
    // A4 less the margins of the page is 168 mm, 635 px.
    const html = `<!doctype html><style>${mathCss({ covering: body })}${style("look.css")}${style("maths.css")}${style("print.css")}
      body{width:635px}</style><main>${body}</main>`;
    const tooWide = await withBrowser((session) =>
      session.withPage(html, (page) =>
        page.evaluate(
          `Array.from(document.querySelectorAll(".eq")).flatMap((e, i) => e.scrollWidth > e.clientWidth + 1 ? [i] : [])`,
        ),
      ),
    );
    expect((tooWide as number[]).map((i) => equations[i])).toEqual([]);
  });
});
