import { describe, expect, it } from "vitest";
import { distanceToLine, overlaps } from "../../../kernel-helpers/render/charts/geometry.js";

const box = { left: 10, top: 10, right: 20, bottom: 20 };

describe("the distance from a box to a line", () => {
  it("is 0 if the line enters it, also without a corner of the line in it", () => {
    expect(
      distanceToLine(
        box,
        [
          [0, 15],
          [30, 15],
        ],
        50,
      ),
    ).toBe(0);
    expect(
      distanceToLine(
        box,
        [
          [0, 5],
          [25, 30],
        ],
        50,
      ),
    ).toBe(0);
    expect(
      distanceToLine(
        box,
        [
          [15, 15],
          [16, 16],
        ],
        50,
      ),
    ).toBe(0);
  });
  it("is the least one otherwise", () => {
    expect(
      distanceToLine(
        box,
        [
          [0, 25],
          [30, 25],
        ],
        50,
      ),
    ).toBe(5);
    expect(
      distanceToLine(
        box,
        [
          [23, 24],
          [40, 40],
        ],
        50,
      ),
    ).toBe(5);
    expect(distanceToLine(box, [[15, 30]], 50)).toBe(10);
    // The corner at (20, 10) against the line y = x − 20.
    expect(
      distanceToLine(
        box,
        [
          [20, 0],
          [40, 20],
        ],
        50,
      ),
    ).toBeCloseTo(Math.hypot(5, 5), 10);
  });
  it("is not measured beyond the limit", () => {
    expect(
      distanceToLine(
        box,
        [
          [0, 90],
          [30, 90],
        ],
        12,
      ),
    ).toBe(12);
  });
});

describe("boxes", () => {
  it("overlap only if they share room, or come nearer than the gap", () => {
    const beside = { left: 21, top: 10, right: 30, bottom: 20 };
    expect(overlaps(box, beside)).toBe(false);
    expect(overlaps(box, beside, 2)).toBe(true);
    expect(overlaps(box, { left: 19, top: 19, right: 30, bottom: 30 })).toBe(true);
  });
});
