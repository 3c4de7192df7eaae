import { spread } from "../lettering/spread.js";
import { textWidth } from "../lettering/text-width.js";
import type { ChartValue } from "./chart-spec.js";
import type { DepthChart, DepthSeries } from "./depth-chart.js";
import type { Point } from "./geometry.js";
import { accent, lineStyle } from "./palette.js";
import { keySample, type LabelPlace } from "./place-line-labels.js";

export const labelSize = 10;
export const labelHeight = 13;

export type Layer = { readonly [key: string]: ChartValue };

const pixels = (field: string): Layer => ({ field, type: "quantitative", scale: null, axis: null });

export function seriesLayer(s: DepthSeries, i: number, { x, y }: { x: Layer; y: Layer }): Layer {
  const { colour, dash } = lineStyle(i);
  return {
    name: `series-${i + 1}`,
    data: { values: s.depth.map((depth, k) => ({ depth, value: s.value[k] ?? null, k })) },
    mark: {
      type: "line",
      clip: true,
      color: colour,
      strokeDash: dash.length > 0 ? [...dash] : [1, 0],
    },
    encoding: { x, y, order: { field: "k", type: "quantitative" } },
  };
}

export function sectionEnds(depths: readonly number[], { y }: { y: Layer }): readonly Layer[] {
  if (depths.length === 0) return [];
  return [
    {
      name: "section-ends",
      data: { values: depths.map((depth) => ({ depth })) },
      mark: { type: "rule", color: "#aab4b6", strokeWidth: 0.75 },
      encoding: { y },
    },
  ];
}

/** A dashed line at each depth, and its name in the right margin, moved if names would touch. */
export function depthMarks(
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
      mark: {
        type: "text",
        align: "left",
        baseline: "middle",
        dx: 2,
        color: accent,
        fontSize: labelSize,
      },
      encoding: { x: pixels("xLabel"), y: pixels("yLabel"), text: { field: "label" } },
    },
  ];
}

/** A dashed line at each value, and its name below, moved if names would touch. */
export function valueMarkLayers(
  marks: NonNullable<DepthChart["valueMarks"]>,
  atX: (value: number) => number,
  room: { left: number; right: number; plotWidth: number; plotHeight: number },
): readonly Layer[] {
  if (marks.length === 0) return [];
  const middles = spread(
    marks.map((mark) => ({
      wanted: atX(mark.value),
      height: textWidth({ text: mark.label, size: labelSize }),
    })),
    { from: 4 - room.left, to: room.plotWidth + room.right, gap: 10 },
  );
  const values = marks.map((mark, i) => ({
    label: mark.label,
    x: atX(mark.value),
    xLabel: middles[i] ?? 0,
    y: 0,
    yEnd: room.plotHeight,
  }));
  return [
    {
      name: "value-marks",
      data: { values },
      mark: { type: "rule", color: accent, strokeDash: [3, 2], strokeWidth: 0.9 },
      encoding: { x: pixels("x"), y: pixels("y"), y2: { field: "yEnd" } },
    },
    {
      name: "value-mark-labels",
      data: { values },
      mark: { type: "text", baseline: "top", dy: 4, color: accent, fontSize: labelSize },
      encoding: { x: pixels("xLabel"), y: pixels("yEnd"), text: { field: "label" } },
    },
  ];
}

export function lineLabel(place: LabelPlace, text: string, i: number): readonly Layer[] {
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
  if (place.leader) {
    const [[ax, ay]] = place.leader;
    layers.push(line(`leader-${i + 1}`, place.leader, { strokeWidth: 0.6 }), {
      name: `leader-end-${i + 1}`,
      data: { values: [{ x: ax, y: ay }] },
      mark: { type: "point", shape: "circle", filled: true, size: 14, opacity: 1, color: colour },
      encoding: { x: pixels("x"), y: pixels("y") },
    });
  }
  if (place.isKey) {
    const sample: readonly [Point, Point] = [
      [box.left - keySample, y],
      [box.left - 5, y],
    ];
    layers.push(
      line(`sample-${i + 1}`, sample, {
        strokeWidth: 1.6,
        strokeDash: dash.length > 0 ? [...dash] : [1, 0],
      }),
    );
  }
  const label = (name: string, mark: Layer): Layer => ({
    name,
    data: { values: [{ x: box.left, y, text }] },
    mark: {
      type: "text",
      align: "left",
      baseline: "middle",
      fontSize: labelSize,
      fontWeight: 600,
      ...mark,
    },
    encoding: { x: pixels("x"), y: pixels("y"), text: { field: "text" } },
  });
  // White behind the letters keeps grid lines out of them.
  layers.push(
    label(`halo-${i + 1}`, {
      color: "white",
      stroke: "white",
      strokeWidth: 3,
      strokeJoin: "round",
    }),
  );
  layers.push(label(`label-${i + 1}`, { color: colour }));
  return layers;
}
