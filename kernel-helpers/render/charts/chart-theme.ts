import { fontStacks } from "../fonts/font-stacks.js";
import type { ChartValue } from "./chart-spec.js";
import { accent, gridInk, ink, lineColours, lineDashes, paleInk } from "./palette.js";

/** Thousands parted by a narrow no-break space from 10 000 up, as in the text. */
export const numberLabel =
  "replace(datum.label, regexp(',', 'g'), abs(datum.value) < 10000 ? '' : '\u202f')";

/** The `config` that all charts share. */
export const chartTheme: { readonly [key: string]: ChartValue } = {
  background: "white",
  font: fontStacks.sans,
  view: { stroke: null },
  axis: {
    domainColor: paleInk,
    domainWidth: 0.75,
    tickColor: paleInk,
    tickWidth: 0.75,
    tickSize: 4,
    gridColor: gridInk,
    gridWidth: 0.5,
    labelColor: ink,
    labelFontSize: 10,
    labelPadding: 3,
    labelFlush: false,
    titleColor: ink,
    titleFontSize: 10.5,
    titleFontWeight: 600,
    titlePadding: 7,
    // Half a pixel of shift would part the axes from a drawing on the same scale.
    translate: 0,
  },
  header: { labelFontSize: 10, labelColor: ink, titleFontSize: 10.5, titleFontWeight: 600 },
  legend: {
    labelFontSize: 10,
    labelColor: ink,
    labelLimit: 0,
    titleFontSize: 10.5,
    titleFontWeight: 600,
    symbolStrokeWidth: 1.6,
    symbolSize: 200,
  },
  title: { fontSize: 11.5, fontWeight: 600, color: ink },
  line: { strokeWidth: 1.6, strokeCap: "butt", color: accent },
  rule: { strokeWidth: 0.75, color: paleInk },
  text: { fontSize: 10, color: ink },
  bar: { color: accent },
  point: { color: accent, filled: true, size: 24 },
  area: { color: accent, opacity: 0.18 },
  range: { category: lineColours, strokeDash: lineDashes },
};
