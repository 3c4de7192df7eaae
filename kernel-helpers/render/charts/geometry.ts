export type Point = readonly [x: number, y: number];

export interface Box {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

export const overlaps = (a: Box, b: Box, gap = 0): boolean =>
  a.left < b.right + gap &&
  b.left < a.right + gap &&
  a.top < b.bottom + gap &&
  b.top < a.bottom + gap;

export const isInside = (inner: Box, outer: Box): boolean =>
  inner.left >= outer.left &&
  inner.right <= outer.right &&
  inner.top >= outer.top &&
  inner.bottom <= outer.bottom;

/**
 * The least distance from a box to a line of straight pieces; 0 if the line enters it, and `limit` if
 * it is further away than that.
 */
export function distanceToLine(box: Box, line: readonly Point[], limit: number): number {
  let least = limit;
  const first = line[0];
  if (first && line.length === 1) return Math.min(limit, pointToBox(first, box));
  for (let i = 1; i < line.length; i++) {
    const a = line[i - 1];
    const b = line[i];
    // Most pieces are far away, which a look at their ends tells.
    if (!a || !b || isBeyond(a, b, box, least)) continue;
    if (entersBox(a, b, box)) return 0;
    least = Math.min(least, pointToBox(a, box), pointToBox(b, box));
    for (const corner of corners(box)) least = Math.min(least, pointToPiece(corner, a, b));
  }
  return least;
}

const isBeyond = ([ax, ay]: Point, [bx, by]: Point, box: Box, distance: number): boolean =>
  Math.max(ay, by) < box.top - distance ||
  Math.min(ay, by) > box.bottom + distance ||
  Math.max(ax, bx) < box.left - distance ||
  Math.min(ax, bx) > box.right + distance;

const corners = (b: Box): readonly Point[] => [
  [b.left, b.top],
  [b.right, b.top],
  [b.left, b.bottom],
  [b.right, b.bottom],
];

const pointToBox = ([x, y]: Point, b: Box): number =>
  Math.hypot(Math.max(b.left - x, 0, x - b.right), Math.max(b.top - y, 0, y - b.bottom));

function pointToPiece([x, y]: Point, [ax, ay]: Point, [bx, by]: Point): number {
  const dx = bx - ax;
  const dy = by - ay;
  const length2 = dx * dx + dy * dy;
  const t = length2 === 0 ? 0 : Math.min(1, Math.max(0, ((x - ax) * dx + (y - ay) * dy) / length2));
  return Math.hypot(x - ax - t * dx, y - ay - t * dy);
}

/** Liang and Barsky's clipping: whether any of the piece is left within the box. */
function entersBox([ax, ay]: Point, [bx, by]: Point, box: Box): boolean {
  let from = 0;
  let to = 1;
  const sides: readonly Point[] = [
    [ax - bx, ax - box.left],
    [bx - ax, box.right - ax],
    [ay - by, ay - box.top],
    [by - ay, box.bottom - ay],
  ];
  for (const [p, q] of sides) {
    if (p === 0) {
      if (q < 0) return false;
    } else if (p < 0) from = Math.max(from, q / p);
    else to = Math.min(to, q / p);
  }
  return from <= to;
}
