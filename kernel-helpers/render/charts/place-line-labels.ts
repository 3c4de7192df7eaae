import { distanceToLine, isInside, overlaps, type Box, type Point } from "./geometry.js";

export interface LabelledLine {
  readonly points: readonly Point[];
  readonly labelWidth: number;
}

export interface LabelPlace {
  readonly box: Box;
  /** From the line to the label, level, if they stand apart. */
  readonly leader: readonly [Point, Point] | null;
  /** Away from its line for want of room, and so with a sample of the line before it. */
  readonly isKey: boolean;
}

const places = 25;
const gaps = [5, 18, 36, 60, 90];
const clearance = 2;
/** The length of the sample of a line in a key, with the space after it. */
export const keySample = 26;
// A label over a line, or a leader over three, is worse than a key.
const worstCost = 65;

/**
 * Where each line's name goes: beside its line, in the plot, over no other name or line; where that
 * cannot be done, in a key in a free corner, or below the plot. All in pixels.
 */
export function placeLineLabels({
  lines,
  area,
  labelHeight,
  taken,
  keyTop,
}: {
  lines: readonly LabelledLine[];
  area: Box;
  labelHeight: number;
  /** Where no name may stand. */
  taken: readonly Box[];
  /** Where a key below the plot begins. */
  keyTop: number;
}): readonly LabelPlace[] {
  const used: Box[] = [];
  const isFree = (box: Box, gap: number): boolean =>
    !used.some((other) => overlaps(box, other, gap));
  const beside = lines.map((line, own) => {
    let best: { place: LabelPlace; cost: number } | null = null;
    for (const candidate of candidates(line, labelHeight)) {
      if (candidate.cost >= (best?.cost ?? worstCost)) continue;
      const { box, leader } = candidate.place;
      if (!isInside(box, area) || !isFree(box, clearance)) continue;
      if (taken.some((other) => overlaps(box, other, clearance))) continue;
      if (leader && !isFree(boxOf(leader), 1)) continue;
      const cost = candidate.cost + costOfLines(candidate, lines, own);
      if (cost < (best?.cost ?? worstCost)) best = { place: candidate.place, cost };
    }
    if (best) used.push(best.place.box, ...(best.place.leader ? [boxOf(best.place.leader)] : []));
    return best?.place ?? null;
  });

  const left = lines.filter((_, i) => beside[i] === null);
  const row = labelHeight + clearance;
  const width = keySample + Math.max(0, ...left.map((line) => line.labelWidth));
  const corner = corners(area, { width, height: left.length * row }).find(
    (block) =>
      isFree(block, clearance) &&
      !taken.some((other) => overlaps(block, other)) &&
      lines.every((line) => distanceToLine(block, line.points, 3) >= 3),
  );
  const from = corner ?? { left: area.left, top: keyTop };
  let keys = 0;
  return lines.map((line, i) => {
    const place = beside[i];
    if (place) return place;
    const top = from.top + keys++ * row;
    const start = from.left + keySample;
    const box = { left: start, right: start + line.labelWidth, top, bottom: top + labelHeight };
    return { box, leader: null, isKey: true };
  });
}

const boxOf = ([[ax, ay], [bx, by]]: readonly [Point, Point]): Box => ({
  left: Math.min(ax, bx),
  right: Math.max(ax, bx),
  top: Math.min(ay, by),
  bottom: Math.max(ay, by),
});

/** Blocks in the corners of an area that can hold them, the lower left first. */
function corners(area: Box, { width, height }: { width: number; height: number }): readonly Box[] {
  const inset = 6;
  const [left, right] = [area.left + inset, area.right - inset - width];
  const [top, bottom] = [area.top + inset, area.bottom - inset - height];
  if (left > right || top > bottom) return [];
  return [
    [left, bottom],
    [right, top],
    [right, bottom],
    [left, top],
  ].map(([x = 0, y = 0]) => ({ left: x, right: x + width, top: y, bottom: y + height }));
}

interface Candidate {
  readonly place: LabelPlace;
  readonly cost: number;
  readonly gap: number;
}

function* candidates(line: LabelledLine, height: number): Generator<Candidate> {
  const last = line.points.length - 1;
  for (let k = 0; k < places; k++) {
    const along = k / (places - 1);
    const anchor = line.points[Math.round(along * last)];
    if (!anchor) continue;
    const [x, y] = anchor;
    // The lower part of a line is where lines of pressure have parted.
    const cost = Math.abs(along - 0.8) * 6;
    for (const [g, gap] of gaps.entries())
      for (const side of ["right", "left"] as const) {
        const left = side === "right" ? x + gap : x - gap - line.labelWidth;
        const box = {
          left,
          right: left + line.labelWidth,
          top: y - height / 2,
          bottom: y + height / 2,
        };
        const near = side === "right" ? box.left - 2 : box.right + 2;
        const leader: LabelPlace["leader"] = g === 0 ? null : [anchor, [near, y]];
        yield {
          place: { box, leader, isKey: false },
          cost: cost + 8 * g + (side === "left" ? 1 : 0),
          gap,
        };
      }
    for (const side of [-1, 1]) {
      const middle = y + side * (height / 2 + 4);
      const box = {
        left: x - line.labelWidth / 2,
        right: x + line.labelWidth / 2,
        top: middle - height / 2,
        bottom: middle + height / 2,
      };
      yield { place: { box, leader: null, isKey: false }, cost: cost + 3, gap: 4 };
    }
  }
}

function costOfLines(
  { place, gap }: Candidate,
  lines: readonly LabelledLine[],
  own: number,
): number {
  let cost = 0;
  for (const [i, line] of lines.entries()) {
    const distance = distanceToLine(place.box, line.points, gap + 6);
    if (i === own) {
      if (distance < 1) cost += 60;
      continue;
    }
    if (distance < 1) cost += 100;
    // Without a leader the nearest line must be the one that is named, clearly.
    else if (!place.leader && distance < gap + 6) cost += distance <= gap + 1 ? 80 : 12;
    else if (place.leader) {
      // Where lines run together a leader cannot tell which one it begins at.
      const [x, y] = place.leader[0];
      const end = { left: x, right: x, top: y, bottom: y };
      if (distanceToLine(end, line.points, 4) < 4) cost += 40;
      // A label that touches a line seems to belong to it, whatever its leader says.
      if (distance < 9) cost += 15;
      const [[ax, ay], [bx]] = place.leader;
      const between = {
        left: Math.min(ax, bx) + 1,
        right: Math.max(ax, bx) - 1,
        top: ay,
        bottom: ay,
      };
      if (distanceToLine(between, line.points, 1) === 0) cost += 30;
    }
  }
  return cost;
}
