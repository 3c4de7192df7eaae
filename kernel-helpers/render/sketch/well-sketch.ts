import { niceTicks } from "../charts/nice-ticks.js";
import { accent, ink, paleInk } from "../charts/palette.js";
import { formatFixed } from "../../units/index.js";
import { textWidth } from "../lettering/text-width.js";
import { checkSketch } from "./check-sketch.js";
import { drawBore } from "./draw-bore.js";
import { placeSketchLabels, type SketchLabel } from "./place-sketch-labels.js";
import { drawing, element, label, line } from "./sketch-parts.js";

export interface SketchSection {
  readonly name: string;
  readonly top: number;
  readonly base: number;
  /** Inside diameter. */
  readonly bore: number;
  /** Outside diameter of the pipe; a thin wall is drawn if it is not given. */
  readonly outer?: number;
  readonly kind: "casing" | "liner" | "open hole";
}

export interface WellSketch {
  /** What it shows, in words, for readers who cannot see it. */
  readonly description: string;
  /** From the top down. Diameters are in any one unit, depths in any one unit. */
  readonly sections: readonly SketchSection[];
  readonly depthRange: readonly [top: number, bottom: number];
  readonly depthUnit: string;
  /** Whether depths are written at the left; a chart beside may do it. */
  readonly hasDepthAxis?: boolean;
  /** How many units of depth one unit of diameter is; with it the exaggeration of diameters is stated. */
  readonly diameterInDepthUnits?: number;
  readonly seabed?: number;
  /** Solids that fill the bore. */
  readonly pack?: { readonly top: number; readonly base: number } | null;
  /** Depths to be pointed out; without a label only as a line. */
  readonly marks?: readonly { readonly depth: number; readonly label: string | null }[];
  /** The whole figure, and the height within it where the depth range begins and ends; pixels. */
  readonly width: number;
  readonly height: number;
  readonly plotTop: number;
  readonly plotBottom: number;
}

const size = 10;
const widestShare = 0.3;
const widest = 110; // px

/**
 * A well as a drawing: true to scale in depth, all diameters widened by one factor, so that both the
 * places of shoes and the steps of the bore can be read off.
 */
export function wellSketch(sketch: WellSketch): string {
  checkSketch(sketch);
  const { sections, depthRange, width, plotTop, plotBottom, marks = [] } = sketch;
  const [top, bottom] = depthRange;
  const pixelsPerDepth = (plotBottom - plotTop) / (bottom - top);
  const atDepth = (depth: number): number => plotTop + (depth - top) * pixelsPerDepth;
  const inRange = (depth: number): number => Math.min(bottom, Math.max(top, depth));

  const largest = Math.max(...sections.map((s) => s.outer ?? s.bore));
  const pixelsPerDiameter = Math.min(widest, width * widestShare) / largest;
  const ticks = niceTicks(depthRange, (plotBottom - plotTop) / 55);
  const tickTexts = ticks.values.map((v) => formatFixed(v, ticks.decimals));
  const axis =
    sketch.hasDepthAxis === false
      ? 6
      : Math.ceil(Math.max(...tickTexts.map((text) => textWidth({ text, size }))) + 14);
  const middle = axis + 14 + (largest * pixelsPerDiameter) / 2;
  const wallRight = (s: SketchSection): number =>
    middle + ((s.outer ?? s.bore) * pixelsPerDiameter) / 2;
  const outermost = Math.max(...sections.map(wallRight));

  const visible = sections.filter((s) => s.base > top && s.top < bottom);
  const labels: SketchLabel[] = [
    ...visible.map((s) => ({
      text: s.name,
      from: [wallRight(s), atDepth(sectionAnchor(s, sections, inRange))] as const,
      isMark: false,
    })),
    ...marks.flatMap((mark) =>
      mark.label === null
        ? []
        : [{ text: mark.label, from: [outermost + 4, atDepth(mark.depth)] as const, isMark: true }],
    ),
    ...(sketch.seabed === undefined
      ? []
      : [
          { text: "Seabed", from: [outermost + 4, atDepth(sketch.seabed)] as const, isMark: false },
        ]),
  ];
  const column = outermost + 30;
  const content = [
    ...(sketch.seabed === undefined
      ? []
      : [seabed(atDepth(sketch.seabed), axis + 4, outermost + 4)]),
    drawBore({
      sections: visible,
      pack: sketch.pack ?? null,
      atDepth,
      inRange,
      middle,
      pixelsPerDiameter,
    }),
    ...marks.map((mark) =>
      line(
        { x1: axis + 6, y1: atDepth(mark.depth), x2: outermost + 4, y2: atDepth(mark.depth) },
        { stroke: accent, "stroke-width": 0.9, "stroke-dasharray": "3 2" },
      ),
    ),
    ...(sketch.hasDepthAxis === false
      ? []
      : depthAxis(ticks.values.map(atDepth), tickTexts, {
          x: axis,
          plotTop,
          plotBottom,
          unit: sketch.depthUnit,
        })),
    ...placeSketchLabels({
      labels,
      turn: outermost + 8,
      column,
      right: width,
      plotTop,
      plotBottom,
    }),
    label(
      {
        text: scaleNote(pixelsPerDiameter / pixelsPerDepth, sketch.diameterInDepthUnits),
        x: 2,
        y: plotBottom + 16,
      },
      { fill: paleInk, "font-size": 8.5 },
    ),
  ].join("");
  return drawing({ width, height: sketch.height, description: sketch.description }, content);
}

/** Where a section shows its own wall: above its base, below the strings that end further up. */
function sectionAnchor(
  s: SketchSection,
  all: readonly SketchSection[],
  inRange: (depth: number) => number,
): number {
  const covered = all
    .filter(
      (other) => other !== s && other.bore > s.bore && other.base > s.top && other.base < s.base,
    )
    .map((other) => other.base);
  const [from, to] = [inRange(Math.max(s.top, ...covered)), inRange(s.base)];
  return s.kind === "open hole" ? (from + to) / 2 : to - (to - from) * 0.25;
}

function scaleNote(ratio: number, diameterInDepthUnits: number | undefined): string {
  if (diameterInDepthUnits === undefined) return "Depths to scale; diameters widened alike.";
  const factor = Number((ratio / diameterInDepthUnits).toPrecision(2));
  return `Depths to scale; diameters widened ${formatFixed(factor, factor < 10 ? 1 : 0)} times.`;
}

function depthAxis(
  ys: readonly number[],
  texts: readonly string[],
  {
    x,
    plotTop,
    plotBottom,
    unit,
  }: { x: number; plotTop: number; plotBottom: number; unit: string },
): readonly string[] {
  const thin = { stroke: paleInk, "stroke-width": 0.75 };
  return [
    line({ x1: x, y1: plotTop, x2: x, y2: plotBottom }, thin),
    ...ys.flatMap((y, i) => [
      line({ x1: x - 4, y1: y, x2: x, y2: y }, thin),
      label({ text: texts[i] ?? "", x: x - 7, y }, { "text-anchor": "end", fill: ink }),
    ]),
    label(
      { text: unit, x: x - 7, y: plotTop - 16 },
      { "text-anchor": "end", fill: ink, "font-weight": 600 },
    ),
  ];
}

function seabed(y: number, from: number, to: number): string {
  const strokes: string[] = [];
  for (let x = from + 5; x <= to; x += 6)
    strokes.push(
      line({ x1: x, y1: y, x2: x - 4, y2: y + 5 }, { stroke: paleInk, "stroke-width": 0.5 }),
    );
  return element(
    "g",
    {},
    line({ x1: from, y1: y, x2: to, y2: y }, { stroke: ink, "stroke-width": 1 }) + strokes.join(""),
  );
}
