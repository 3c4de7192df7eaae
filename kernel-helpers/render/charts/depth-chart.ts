import { InputError } from "../../errors/index.js";
import { spread } from "../lettering/spread.js";
import { textWidth } from "../lettering/text-width.js";
import type { ChartSpec, ChartValue } from "./chart-spec.js";
import { chartTheme, numberLabel } from "./chart-theme.js";
import { checkDepthChart } from "./check-depth-chart.js";
import type { Box, Point } from "./geometry.js";
import { niceRange, niceTicks } from "./nice-ticks.js";
import { accent, lineStyle, paleInk } from "./palette.js";
import { placeLineLabels, type LabelPlace } from "./place-line-labels.js";

export interface DepthSeries {
  readonly label: string;
  readonly depth: readonly number[];
  readonly value: readonly number[];
}

export interface DepthChart {
  /** What it shows, in words, for readers who cannot see it. */
  readonly description: string;
  readonly series: readonly DepthSeries[];
  readonly depthRange: readonly [top: number, bottom: number];
  /** Titles of the axes, complete with the unit: "Measured depth [ft]". All series share both. */
  readonly depthTitle: string;
  readonly xTitle: string;
  /** The ends of the value axis; round numbers around all values if not given. */
  readonly xRange?: readonly [number, number];
  /** Depths to be pointed out, named at the right. */
  readonly marks?: readonly { readonly depth: number; readonly label: string }[];
  /** Values to be pointed out, such as a limit, named below. */
  readonly valueMarks?: readonly { readonly value: number; readonly label: string }[];
  /** Bore sections, whose ends are drawn as fine lines. */
  readonly sections?: readonly { readonly top: number; readonly base: number }[];
  /** The whole figure, and the height within it where the depth range begins and ends; pixels. */
  readonly width: number;
  readonly height: number;
  readonly plotTop: number;
  readonly plotBottom: number;
}

const size = 10;
const labelHeight = 13;

/**
 * The specification of a chart of values against depth, depth running down: pure data, the same for
 * the same input. The depth range covers exactly the pixels from `plotTop` to `plotBottom`, so that a
 * drawing beside it can share the scale.
 */
export function depthChart(chart: DepthChart): ChartSpec {
  checkDepthChart(chart);
  const { series, depthRange, width, height, plotTop, plotBottom } = chart;
  const { marks = [], valueMarks = [], sections = [] } = chart;
  const plotHeight = plotBottom - plotTop;
  const depthTicks = niceTicks(depthRange, plotHeight / 55);
  const tickWidth = Math.max(...depthTicks.values.map((v) => textWidth({ text: v.toFixed(depthTicks.decimals), size })));
  const left = Math.ceil(tickWidth + 34);
  const markWidth = Math.max(0, ...marks.map((mark) => textWidth({ text: mark.label, size }) + 14));
  const right = Math.ceil(Math.max(14, markWidth));
  const plotWidth = width - left - right;
  if (plotWidth < 80)
    throw new InputError({
      code: "out-of-bounds",
      where: "width",
      problem: `${width} px leaves ${plotWidth} px to draw in`,
      expected: `at least ${width + 80 - plotWidth} px with these labels`,
    });

  const xRange =
    chart.xRange ??
    niceRange([...series.flatMap((s) => s.value), ...valueMarks.map((m) => m.value)], plotWidth / 70);
  const xTicks = niceTicks(xRange, plotWidth / 70);
  const atX = scale(xRange, plotWidth);
  const atDepth = scale(depthRange, plotHeight);
  const area: Box = { left: 2, top: 2, right: plotWidth - 2, bottom: plotHeight - 2 };

  const x = {
    field: "value",
    type: "quantitative",
    scale: { domain: [...xRange], nice: false, zero: false },
    axis: {
      orient: "top",
      title: chart.xTitle,
      values: [...xTicks.values],
      format: `,.${xTicks.decimals}f`,
      labelExpr: numberLabel,
      labelOverlap: false,
    },
  };
  const y = {
    field: "depth",
    type: "quantitative",
    scale: { domain: [...depthRange], reverse: true, nice: false, zero: false },
    axis: {
      title: chart.depthTitle,
      values: [...depthTicks.values],
      format: `,.${depthTicks.decimals}f`,
      labelExpr: numberLabel,
      labelOverlap: false,
      // Vega would measure the labels without knowing the font.
      titleX: -(tickWidth + 16),
    },
  };

  const lines = series.map((s) => ({
    points: visiblePart(s, depthRange).map(([value, depth]): Point => [atX(value), atDepth(depth)]),
    labelWidth: textWidth({ text: s.label, size, isSemibold: true }),
  }));
  const placed = placeLineLabels({ lines, area, labelHeight, taken: [] });
  const ends = sections.flatMap(({ top, base }) => [top, base]).filter((d) => d > depthRange[0] && d < depthRange[1]);

  return {
    $schema: "https://vega.github.io/schema/vega-lite/v6.json",
    description: chart.description,
    width: plotWidth,
    height: plotHeight,
    padding: { left, top: plotTop, right, bottom: height - plotBottom },
    autosize: { type: "none" },
    config: chartTheme,
    layer: [
      ...rules([...new Set(ends)], { y }),
      ...depthMarks(marks, atDepth, { plotWidth, plotHeight }),
      ...valueLines(valueMarks, atX, plotHeight),
      ...series.map((s, i) => seriesLayer(s, i, { x, y })),
      ...placed.flatMap((place, i) => labelLayers(place, series[i]?.label ?? "", i)),
    ],
  };
}

const scale =
  ([from, to]: readonly [number, number], length: number) =>
  (v: number): number =>
    Math.round(((v - from) / (to - from)) * length * 100) / 100;

/** The points within the depth range, cut exactly at its ends. */
function visiblePart(s: DepthSeries, [top, bottom]: readonly [number, number]): readonly Point[] {
  const points: Point[] = [];
  s.depth.forEach((depth, i) => {
    const value = s.value[i] ?? 0;
    const before = s.depth[i - 1];
    if (before !== undefined)
      for (const edge of before < depth ? [top, bottom] : [bottom, top])
        if ((edge - before) * (edge - depth) < 0) {
          const t = (edge - before) / (depth - before);
          points.push([(s.value[i - 1] ?? 0) * (1 - t) + value * t, edge]);
        }
    if (depth >= top && depth <= bottom) points.push([value, depth]);
  });
  return points;
}

type Layer = { readonly [key: string]: ChartValue };

const pixels = (field: string): Layer => ({ field, type: "quantitative", scale: null, axis: null });

function seriesLayer(s: DepthSeries, i: number, { x, y }: { x: Layer; y: Layer }): Layer {
  const { colour, dash } = lineStyle(i);
  return {
    name: `series-${i + 1}`,
    data: { values: s.depth.map((depth, k) => ({ depth, value: s.value[k] ?? null, k })) },
    mark: { type: "line", clip: true, color: colour, strokeDash: dash.length > 0 ? [...dash] : [1, 0] },
    encoding: { x, y, order: { field: "k", type: "quantitative" } },
  };
}

function rules(depths: readonly number[], { y }: { y: Layer }): readonly Layer[] {
  if (depths.length === 0) return [];
  return [
    {
      name: "section-ends",
      data: { values: depths.map((depth) => ({ depth })) },
      mark: { type: "rule", color: paleInk, strokeWidth: 0.5 },
      encoding: { y },
    },
  ];
}

/** A dashed line at each depth, and its name in the right margin, moved if names would touch. */
function depthMarks(
  marks: NonNullable<DepthChart["marks"]>,
  atDepth: (depth: number) => number,
  { plotWidth, plotHeight }: { plotWidth: number; plotHeight: number },
): readonly Layer[] {
  if (marks.length === 0) return [];
  const middles = spread(
    marks.map((mark) => ({ wanted: atDepth(mark.depth), height: labelHeight })),
    { from: 0, to: plotHeight, gap: 0 },
  );
  const values = marks.map((mark, i) => ({
    label: mark.label,
    y: atDepth(mark.depth),
    yLabel: middles[i] ?? 0,
    x: 0,
    xEnd: plotWidth,
    xLabel: plotWidth + 10,
  }));
  const [y, xEnd] = [pixels("y"), pixels("xEnd")];
  return [
    {
      name: "depth-marks",
      data: { values },
      mark: { type: "rule", color: accent, strokeDash: [3, 2], strokeWidth: 0.9 },
      encoding: { x: pixels("x"), x2: { field: "xEnd" }, y },
    },
    {
      data: { values },
      mark: { type: "rule", color: accent, strokeWidth: 0.75 },
      encoding: { x: xEnd, x2: { field: "xLabel" }, y, y2: { field: "yLabel" } },
    },
    {
      data: { values },
      mark: { type: "text", align: "left", baseline: "middle", dx: 2, color: accent, fontSize: size },
      encoding: { x: pixels("xLabel"), y: pixels("yLabel"), text: { field: "label" } },
    },
  ];
}

function valueLines(
  marks: NonNullable<DepthChart["valueMarks"]>,
  atX: (value: number) => number,
  plotHeight: number,
): readonly Layer[] {
  if (marks.length === 0) return [];
  const values = marks.map((mark) => ({ label: mark.label, x: atX(mark.value), y: 0, yEnd: plotHeight }));
  return [
    {
      name: "value-marks",
      data: { values },
      mark: { type: "rule", color: accent, strokeDash: [3, 2], strokeWidth: 0.9 },
      encoding: { x: pixels("x"), y: pixels("y"), y2: { field: "yEnd" } },
    },
    {
      data: { values },
      mark: { type: "text", baseline: "top", dy: 4, color: accent, fontSize: size },
      encoding: { x: pixels("x"), y: pixels("yEnd"), text: { field: "label" } },
    },
  ];
}

function labelLayers(place: LabelPlace, text: string, i: number): readonly Layer[] {
  const { colour, dash } = lineStyle(i);
  const { box } = place;
  const y = (box.top + box.bottom) / 2;
  const layers: Layer[] = [];
  const line = (name: string, [from, to]: readonly [Point, Point], mark: Layer): Layer => ({
    name,
    data: { values: [{ x: from[0], y: from[1], x2: to[0], y2: to[1] }] },
    mark: { type: "rule", color: colour, ...mark },
    encoding: { x: pixels("x"), y: pixels("y"), x2: { field: "x2" }, y2: { field: "y2" } },
  });
  if (place.leader) layers.push(line(`leader-${i + 1}`, place.leader, { strokeWidth: 0.6 }));
  if (place.isKey) {
    const sample: readonly [Point, Point] = [[box.left - 26, y], [box.left - 5, y]];
    layers.push(line(`sample-${i + 1}`, sample, { strokeWidth: 1.6, strokeDash: dash.length > 0 ? [...dash] : [1, 0] }));
  }
  const label = (name: string, mark: Layer): Layer => ({
    name,
    data: { values: [{ x: box.left, y, text }] },
    mark: { type: "text", align: "left", baseline: "middle", fontSize: size, fontWeight: 600, ...mark },
    encoding: { x: pixels("x"), y: pixels("y"), text: { field: "text" } },
  });
  // White behind the letters keeps grid lines out of them.
  layers.push(label(`halo-${i + 1}`, { color: "white", stroke: "white", strokeWidth: 3, strokeJoin: "round" }));
  layers.push(label(`label-${i + 1}`, { color: colour }));
  return layers;
}
