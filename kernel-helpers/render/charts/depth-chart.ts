import { InputError } from "../../errors/index.js";
import { formatNumber } from "../../units/index.js";
import { textWidth } from "../lettering/text-width.js";
import type { ChartSpec, ChartValue } from "./chart-spec.js";
import { chartTheme, numberLabel } from "./chart-theme.js";
import { checkDepthChart } from "./check-depth-chart.js";
import type { Box, Point } from "./geometry.js";
import { niceRange, niceTicks, type Ticks } from "./nice-ticks.js";
import {
  depthMarks,
  labelHeight,
  labelSize as size,
  lineLabel,
  sectionEnds,
  seriesLayer,
  valueMarkLayers,
} from "./depth-chart-layers.js";
import { placeLineLabels } from "./place-line-labels.js";

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
  const tickWidth = Math.max(
    ...depthTicks.values.map((v) => textWidth({ text: v.toFixed(depthTicks.decimals), size })),
  );
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
    niceRange(
      [...series.flatMap((s) => s.value), ...valueMarks.map((m) => m.value)],
      plotWidth / 70,
    );
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
      ...ticked(xTicks),
    },
  };
  const y = {
    field: "depth",
    type: "quantitative",
    scale: { domain: [...depthRange], reverse: true, nice: false, zero: false },
    axis: {
      title: chart.depthTitle,
      ...ticked(depthTicks),
      // Vega would measure the labels without knowing the font.
      titleX: -(tickWidth + 16),
    },
  };

  const lines = series.map((s) => ({
    points: visiblePart(s, depthRange).map(([value, depth]): Point => [atX(value), atDepth(depth)]),
    labelWidth: textWidth({ text: s.label, size, isSemibold: true }),
  }));
  const ends = sections
    .flatMap(({ top, base }) => [top, base])
    .filter((d) => d > depthRange[0] && d < depthRange[1]);
  const taken: readonly Box[] = [
    ...[...marks.map((m) => m.depth), ...ends].map((d) => ({
      left: 0,
      right: plotWidth,
      top: atDepth(d),
      bottom: atDepth(d),
    })),
    ...valueMarks.map((m) => ({
      left: atX(m.value),
      right: atX(m.value),
      top: 0,
      bottom: plotHeight,
    })),
  ];
  const keyTop = plotHeight + (valueMarks.length > 0 ? labelHeight + 8 : 6);
  const placed = placeLineLabels({ lines, area, labelHeight, taken, keyTop });

  return {
    $schema: "https://vega.github.io/schema/vega-lite/v6.json",
    description: chart.description,
    width: plotWidth,
    height: plotHeight,
    padding: { left, top: plotTop, right, bottom: height - plotBottom },
    autosize: { type: "none" },
    config: chartTheme,
    layer: [
      ...sectionEnds([...new Set(ends)], { y }),
      ...depthMarks(marks, atDepth, { plotWidth, plotHeight }),
      ...valueMarkLayers(valueMarks, atX, { left, right, plotWidth, plotHeight }),
      ...series.map((s, i) => seriesLayer(s, i, { x, y })),
      ...placed.flatMap((place, i) => lineLabel(place, series[i]?.label ?? "", i)),
    ],
  };
}

const scale =
  ([from, to]: readonly [number, number], length: number) =>
  (v: number): number =>
    Math.round(((v - from) / (to - from)) * length * 100) / 100;

/** Ticks for an axis, their labels written out where the format of the axis has no powers of ten. */
function ticked(ticks: Ticks): { readonly [key: string]: ChartValue } {
  const largest = Math.max(...ticks.values.map(Math.abs));
  const isPlain = ticks.step >= 1e-4 && largest < 1e7;
  const digits = 1 + Math.round(Math.log10(largest / ticks.step));
  const written = ticks.values
    .map((v) => `datum.value === ${v} ? '${formatNumber(v, digits)}' : `)
    .join("");
  return {
    values: [...ticks.values],
    labelOverlap: false,
    ...(isPlain
      ? { format: `,.${ticks.decimals}f`, labelExpr: numberLabel }
      : { labelExpr: `${written}datum.label` }),
  };
}

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
