import type { DepthDrawing } from "../../document/index.js";
import { depthChart, renderChart } from "../charts/index.js";
import { sideBySide, wellSketch } from "../sketch/index.js";

const HEIGHT = 430;
const PLOT = { plotTop: 44, plotBottom: 396 } as const;

/** A drawing of the view model in pixels: the well to scale in depth beside curves on the same depths. */
export async function drawingSvg(d: DepthDrawing, label: string): Promise<string> {
  const depthRange = [d.top, d.base] as const;
  const sketch = wellSketch({
    description: `Well: ${d.sections.map((s) => s.name).join(", ")}`,
    diameterInDepthUnits: d.perMetre,
    sections: d.sections.map((s) => ({
      name: s.name,
      top: s.top,
      base: s.base,
      bore: s.bore,
      kind: s.wall,
    })),
    depthRange,
    depthUnit: d.depthUnit,
    pack: d.pack,
    marks: d.marks.map(({ depth }) => ({ depth, label: null })),
    width: 250,
    height: HEIGHT,
    ...PLOT,
  });
  const chart = await renderChart(
    depthChart({
      description: label,
      series: d.series,
      depthRange,
      xTitle: `${d.xTitle} [${d.unit}]`,
      depthTitle: `measured depth [${d.depthUnit}]`,
      sections: d.sections,
      marks: d.marks,
      width: 440,
      height: HEIGHT,
      ...PLOT,
    }),
  );
  return sideBySide({ sketch, chart, label });
}
