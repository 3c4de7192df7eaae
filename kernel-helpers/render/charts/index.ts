export type { ChartSpec, ChartValue } from "./chart-spec.js";
export { chartTheme } from "./chart-theme.js";
export { depthChart, type DepthChart, type DepthSeries } from "./depth-chart.js";
export { accent, lineStyle, type LineStyle } from "./palette.js";
export { renderChart } from "./render-chart.js";
