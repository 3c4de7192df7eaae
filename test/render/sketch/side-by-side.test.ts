import { describe, expect, it } from "vitest";
import { depthChart } from "../../../kernel-helpers/render/charts/depth-chart.js";
import { renderChart } from "../../../kernel-helpers/render/charts/render-chart.js";
import { sideBySide } from "../../../kernel-helpers/render/sketch/side-by-side.js";
import { wellSketch } from "../../../kernel-helpers/render/sketch/well-sketch.js";
import { codeOf } from "../../code-of.js";

const plot = { height: 400, plotTop: 50, plotBottom: 350 };
const sketch = wellSketch({
  description: "sketch",
  sections: [{ name: "casing", top: 0, base: 1500, bore: 0.2, kind: "casing" }],
  depthRange: [0, 3000],
  depthUnit: "m",
  marks: [{ depth: 1000, label: null }],
  width: 200,
  ...plot,
});

describe("a sketch and a chart side by side", () => {
  it("are one image on one depth scale", async () => {
    const chart = await renderChart(
      depthChart({
        description: "chart",
        series: [{ label: "p", depth: [0, 1000, 3000], value: [1, 2, 9] }],
        depthRange: [0, 3000],
        depthTitle: "Depth [m]",
        xTitle: "Pressure [MPa]",
        width: 400,
        ...plot,
      }),
    );
    const both = sideBySide({ sketch, chart, label: `Well & "pressure"` });
    expect(both.match(/role="img"/g)).toHaveLength(1);
    expect(both.match(/aria-label="[^"]*"/g)).toEqual([
      'aria-label="Well &amp; &quot;pressure&quot;"',
    ]);
    expect(both).toContain('width="606" height="400"');
    expect(both).toContain('<svg x="206"');
    // 1000 m lies 100 px below the top of both plots.
    expect(both).toContain('y1="150"');
    expect(both).toMatch(/translate\(\d+,50\)/);
    expect(both).toMatch(/d="M[\d.]+,0L[\d.]+,100L[\d.]+,300"/);
  });
  it("are refused if one is no drawing", () => {
    for (const chart of ["", "<p>", "<svg viewBox='0 0 1 1'>"])
      expect(codeOf(() => sideBySide({ sketch, chart, label: "x" }))).toBe("bad-drawing");
  });
});
