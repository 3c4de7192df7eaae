import { distanceToLine, isInside, overlaps, type Box, type Point } from "./geometry.js";

export interface LabelledLine {
  readonly points: readonly Point[];
  readonly labelWidth: number;
}

export interface LabelPlace {
  readonly box: Box;
  /** From the line to the label, if they stand apart. */
  readonly leader: readonly [Point, Point] | null;
  /** Set below the plot for want of room, where it needs a sample of its line. */
  readonly isKey: boolean;
}

const places = 25;
const gaps = [5, 18, 36, 60, 90];
const clearance = 2;

/**
 * Where each line's name goes: beside its line, in the plot, over no other name; over a line only if
 * there is no other way, and never where another line is nearer. All in pixels.
 */
export function placeLineLabels({
  lines,
  area,
  labelHeight,
  taken,
}: {
  lines: readonly LabelledLine[];
  area: Box;
  labelHeight: number;
  taken: readonly Box[];
}): readonly LabelPlace[] {
  const used: Box[] = [...taken];
  let keys = 0;
  return lines.map((line, own) => {
    let best: { place: LabelPlace; cost: number } | null = null;
    for (const candidate of candidates(line, labelHeight)) {
      if (best && candidate.cost >= best.cost) continue;
      const { box } = candidate.place;
      if (!isInside(box, area) || used.some((other) => overlaps(box, other, clearance))) continue;
      const cost = candidate.cost + costOfLines(candidate, lines, own);
      if (!best || cost < best.cost) best = { place: candidate.place, cost };
    }
    const place =
      best && best.cost < Infinity ? best.place : keyPlace(line, area, labelHeight, keys++);
    used.push(place.box);
    return place;
  });
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

const keySample = 26;

function keyPlace(line: LabelledLine, area: Box, height: number, row: number): LabelPlace {
  const left = area.left + keySample;
  const top = area.bottom + 6 + row * (height + clearance);
  return {
    box: { left, right: left + line.labelWidth, top, bottom: top + height },
    leader: null,
    isKey: true,
  };
}
