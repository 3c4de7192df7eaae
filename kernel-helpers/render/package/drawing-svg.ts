import type { DepthDrawing } from "../../document/index.js";
import { depthChart, renderChart } from "../charts/index.js";
import { sideBySide, wellSketch } from "../sketch/index.js";

const HEIGHT = 560;
const PLOT = { plotTop: 44, plotBottom: 520 } as const;

/** A drawing of the view model in pixels: the well to scale in depth beside curves on the same depths. */
export async function drawingSvg(d: DepthDrawing, label: string): Promise<string> {
  const depthRange = [d.top, d.base] as const;
  const sketch = wellSketch({
    sections: d.sections.map((s) => ({ name: s.name, top: s.top, base: s.base, bore: s.bore, kind: s.wall })),
    depthRange,
    depthUnit: d.depthUnit,
    pack: d.pack,
    marks: d.marks,
    width: 300,
    height: HEIGHT,
    ...PLOT,
  });
  const chart = await renderChart(
    depthChart({
      description: label,
      series: d.series.map((s) => ({ label: s.label, unit: d.unit, depth: s.depth, value: s.value })),
      depthRange,
      xTitle: d.xTitle,
      depthTitle: "measured depth",
      depthUnit: d.depthUnit,
      sections: d.sections,
      marks: d.marks,
      width: 420,
      height: HEIGHT,
      ...PLOT,
    }),
  );
  return sideBySide(sketch, chart, label);
}
