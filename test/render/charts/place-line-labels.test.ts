import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  distanceToLine,
  isInside,
  overlaps,
  type Point,
} from "../../../kernel-helpers/render/charts/geometry.js";
import { placeLineLabels } from "../../../kernel-helpers/render/charts/place-line-labels.js";
import { there } from "../there.js";

const area = { left: 0, top: 0, right: 300, bottom: 400 };
const straight = (from: number, to: number): readonly Point[] =>
  Array.from({ length: 41 }, (_, i) => [from + ((to - from) * i) / 40, i * 10] as const);
const place = (lines: readonly (readonly Point[])[], labelWidth = 50) =>
  placeLineLabels({
    lines: lines.map((points) => ({ points, labelWidth })),
    area,
    labelHeight: 13,
    taken: [],
    keyTop: 406,
  });

describe("the names of lines", () => {
  it("stand beside lines that are far apart, without a leader", () => {
    for (const p of place([straight(40, 60), straight(200, 220)])) {
      expect(p.leader).toBeNull();
      expect(p.isKey).toBe(false);
    }
  });
  it("stand clear of the other line when two lines nearly meet", () => {
    const lines = [straight(100, 160), straight(103, 164)];
    const [a, b] = place(lines);
    expect(overlaps(there(a).box, there(b).box)).toBe(false);
    for (const [i, p] of [there(a), there(b)].entries())
      for (const [k, points] of lines.entries())
        if (i !== k) expect(distanceToLine(p.box, points, 50)).toBeGreaterThan(0);
  });
  it("have leaders that begin on their own line", () => {
    const lines = [straight(100, 160), straight(103, 164), straight(106, 168)];
    place(lines).forEach((p, i) => {
      if (p.leader) expect(lines[i]).toContainEqual(p.leader[0]);
    });
  });
  it("go into a key in a free corner where lines run together all along", () => {
    const together = [0, 1, 2, 3, 4].map((k) => straight(140 + k, 160 + k));
    const keys = place(together).filter((p) => p.isKey);
    expect(keys.length).toBeGreaterThan(1);
    for (const p of keys) {
      expect(isInside(p.box, area)).toBe(true);
      for (const points of together) expect(distanceToLine(p.box, points, 50)).toBeGreaterThan(2);
    }
  });
  it("go below the plot, one under the other, if there is no room at all", () => {
    const places = place([straight(100, 110), straight(200, 210)], 400);
    expect(places.map((p) => p.isKey)).toEqual([true, true]);
    expect(there(places[1]).box.top).toBeGreaterThanOrEqual(there(places[0]).box.bottom);
  });
  it("keep out of what is taken", () => {
    const taken = [{ left: 0, right: 300, top: 0, bottom: 200 }];
    const [p] = placeLineLabels({
      lines: [{ points: straight(100, 100), labelWidth: 50 }],
      area,
      labelHeight: 13,
      taken,
      keyTop: 406,
    });
    expect(there(p).box.top).toBeGreaterThan(200);
  });
  it("never overlap and never leave the plot, whatever the lines", () => {
    const line = fc.tuple(fc.integer({ min: 0, max: 300 }), fc.integer({ min: 0, max: 300 }));
    fc.assert(
      fc.property(fc.array(line, { minLength: 1, maxLength: 6 }), (ends) => {
        const places = place(ends.map(([a, b]) => straight(a, b)));
        places.forEach((p, i) => {
          if (!p.isKey) expect(isInside(p.box, area)).toBe(true);
          for (const other of places.slice(0, i)) expect(overlaps(p.box, other.box)).toBe(false);
        });
      }),
      { numRuns: 40 },
    );
  });
});
