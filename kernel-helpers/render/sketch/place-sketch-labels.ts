import { accent, ink, paleInk } from "../charts/palette.js";
import { spread } from "../lettering/spread.js";
import { textWidth } from "../lettering/text-width.js";
import { label, path } from "./sketch-parts.js";

export interface SketchLabel {
  readonly text: string;
  /** Where its leader begins. */
  readonly from: readonly [x: number, y: number];
  readonly isMark: boolean;
}

const size = 10;
const lineHeight = 12;
const gap = 3;

/** Labels in one column beside the well, none over another, each joined to its place by a leader. */
export function placeSketchLabels({
  labels,
  turn,
  column,
  right,
  plotTop,
  plotBottom,
}: {
  labels: readonly SketchLabel[];
  /** Right of the well, where leaders turn towards their labels. */
  turn: number;
  column: number;
  right: number;
  plotTop: number;
  plotBottom: number;
}): readonly string[] {
  const wrapped = labels.map((each) => wrap(each.text, right - column));
  const middles = spread(
    labels.map((each, i) => ({
      wanted: each.from[1],
      height: (wrapped[i]?.length ?? 1) * lineHeight,
    })),
    { from: plotTop, to: plotBottom, gap },
  );
  return labels.flatMap((each, i) => {
    const y = middles[i] ?? 0;
    const [x0, y0] = each.from;
    const lines = wrapped[i] ?? [];
    const leader = path(
      [
        [x0 + 2, y0],
        // Level up to one line for all, so that no leader crosses another.
        [turn, y0],
        [column - 8, y],
        [column - 4, y],
      ],
      {
        fill: "none",
        stroke: each.isMark ? accent : paleInk,
        "stroke-width": 0.6,
      },
    );
    const first = y - ((lines.length - 1) * lineHeight) / 2;
    return [
      leader,
      ...lines.map((text, k) =>
        label({ text, x: column, y: first + k * lineHeight }, { fill: each.isMark ? accent : ink }),
      ),
    ];
  });
}

/** Text broken at spaces into lines that fit a width; a word that is wider stays whole. */
export function wrap(text: string, width: number): readonly string[] {
  const lines: string[] = [];
  for (const word of text.split(" ")) {
    const last = lines.at(-1);
    const joined = last === undefined ? word : `${last} ${word}`;
    if (last !== undefined && textWidth({ text: joined, size }) > width) lines.push(word);
    else lines.splice(-1, 1, joined);
  }
  return lines;
}
