import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { spread } from "../../../kernel-helpers/render/lettering/spread.js";
import { there } from "../there.js";

describe("labels spread in a column", () => {
  it("stay where they are wanted if there is room", () => {
    const slots = [10, 50, 90].map((wanted) => ({ wanted, height: 12 }));
    expect(spread(slots, { from: 0, to: 100, gap: 2 })).toEqual([10, 50, 90]);
  });
  it("share the shift when two are wanted at one place", () => {
    const slots = [50, 50].map((wanted) => ({ wanted, height: 10 }));
    expect(spread(slots, { from: 0, to: 100, gap: 2 })).toEqual([44, 56]);
  });
  it("are kept within the range", () => {
    const slots = [-20, 300].map((wanted) => ({ wanted, height: 10 }));
    expect(spread(slots, { from: 0, to: 100, gap: 2 })).toEqual([5, 95]);
  });
  it("never overlap, keep their order and stay in a range that holds them", () => {
    const slot = fc.record({
      wanted: fc.double({ min: -50, max: 450, noNaN: true }),
      height: fc.integer({ min: 8, max: 30 }),
    });
    fc.assert(
      fc.property(fc.array(slot, { maxLength: 10 }), (slots) => {
        const middles = spread(slots, { from: 0, to: 400, gap: 2 });
        const order = slots.map((_, i) => i).sort((a, b) => there(middles[a]) - there(middles[b]));
        order.forEach((i, k) => {
          const half = there(slots[i]).height / 2;
          expect(there(middles[i]) - half).toBeGreaterThanOrEqual(-1e-6);
          expect(there(middles[i]) + half).toBeLessThanOrEqual(400 + 1e-6);
          const above = order[k - 1];
          if (above === undefined) return;
          expect(there(slots[above]).wanted).toBeLessThanOrEqual(there(slots[i]).wanted);
          const room =
            there(middles[i]) - half - (there(middles[above]) + there(slots[above]).height / 2);
          expect(room).toBeGreaterThanOrEqual(2 - 1e-6);
        });
      }),
    );
  });
});
