import { ink, paleInk } from "../charts/palette.js";
import { element, path, px } from "./sketch-parts.js";
import type { SketchSection } from "./well-sketch.js";

type Point = readonly [number, number];

const leastWall = 1.6; // px
const shoe = 6; // px

/** Walls, shoes, the ragged side of open hole, and the solids within. */
export function drawBore({
  sections,
  pack,
  atDepth,
  inRange,
  middle,
  pixelsPerDiameter,
}: {
  sections: readonly SketchSection[];
  pack: { readonly top: number; readonly base: number } | null;
  atDepth: (depth: number) => number;
  inRange: (depth: number) => number;
  middle: number;
  pixelsPerDiameter: number;
}): string {
  const half = (diameter: number): number => (diameter * pixelsPerDiameter) / 2;
  const y = (depth: number): number => atDepth(inRange(depth));
  const parts: string[] = [];
  if (pack) {
    // The innermost section at each depth holds the solids.
    const cuts = [pack.top, pack.base, ...sections.flatMap((s) => [s.top, s.base])]
      .filter((d) => d >= pack.top && d <= pack.base)
      .sort((a, b) => a - b);
    cuts.forEach((from, i) => {
      const to = cuts[i + 1];
      if (to === undefined || to <= from) return;
      const bore = Math.min(
        ...sections.filter((s) => s.top < to && s.base > from).map((s) => s.bore),
      );
      if (Number.isFinite(bore) && y(to) > y(from))
        parts.push(packFill(middle - half(bore), middle + half(bore), y(from), y(to)));
    });
  }
  for (const s of sections) {
    const inner = half(s.bore);
    const outer = Math.max(half(s.outer ?? s.bore), inner + leastWall);
    const [from, to] = [y(s.top), y(s.base)];
    for (const side of [-1, 1]) {
      if (s.kind === "open hole") {
        parts.push(
          path(ragged(middle + side * inner, from, to, side), {
            fill: "none",
            stroke: paleInk,
            "stroke-width": 1,
            "stroke-linejoin": "round",
          }),
        );
        continue;
      }
      const x = side < 0 ? middle - outer : middle + inner;
      parts.push(
        element("rect", { x, y: from, width: outer - inner, height: to - from, fill: ink }),
      );
      if (inRange(s.base) !== s.base) continue;
      const edge = middle + side * outer;
      parts.push(
        path(
          [
            [edge, to - shoe],
            [edge + side * shoe, to],
            [edge, to],
          ],
          { fill: ink },
          "Z",
        ),
      );
    }
    // A liner begins at a hanger; a casing runs to the wellhead.
    if (s.kind === "liner" && inRange(s.top) === s.top)
      for (const side of [-1, 1])
        parts.push(
          element("rect", {
            x: side < 0 ? middle - outer - 3 : middle + outer,
            y: from,
            width: 3,
            height: 5,
            fill: ink,
          }),
        );
  }
  // The bottom of the well.
  for (const s of sections)
    if (s.kind === "open hole" && inRange(s.base) === s.base)
      parts.push(
        path(
          [
            [middle - half(s.bore), y(s.base)],
            [middle + half(s.bore), y(s.base)],
          ],
          { fill: "none", stroke: paleInk, "stroke-width": 1 },
        ),
      );
  return element("g", {}, parts.join(""));
}

/** A rough wall: the same steps each time, so that the drawing does not change from run to run. */
function ragged(x: number, from: number, to: number, side: number): readonly Point[] {
  const steps = Math.max(2, Math.round((to - from) / 5));
  const points: Point[] = [];
  for (let i = 0; i <= steps; i++) {
    const out = i === 0 || i === steps ? 0 : ([1.6, 0.3, 2.2, 0.8, 1.9, 0][i % 6] ?? 0);
    points.push([x + side * out, from + ((to - from) * i) / steps]);
  }
  return points;
}

/** Grey with a pattern of dots, which tells it from a plain tint in grey print. */
function packFill(left: number, right: number, top: number, bottom: number): string {
  const dots: string[] = [];
  for (let row = 0, y = top + 3; y <= bottom - 2; row++, y += 4)
    for (let x = left + (row % 2 ? 4 : 2); x <= right - 2; x += 4)
      dots.push(`M${px(x)},${px(y)}h.01`);
  return (
    element("rect", {
      x: left,
      y: top,
      width: right - left,
      height: bottom - top,
      fill: "#d5dcde",
    }) +
    (dots.length > 0
      ? element("path", {
          d: dots.join(""),
          stroke: ink,
          "stroke-width": 1.3,
          "stroke-linecap": "round",
        })
      : "")
  );
}
