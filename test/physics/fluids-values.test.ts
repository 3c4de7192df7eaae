import { describe, expect, it } from "vitest";
import { methodById } from "../../kernel-helpers/physics/registry.js";
import data from "../sources/fluids-values.json" with { type: "json" };

/** Where the other side is not solved to full precision, what it reaches. */
const LOOSER: { readonly [method: string]: number } = {
  // its secant iteration stops at a step of 1e-12 m/s
  "terminal-velocity-sphere": 1e-8,
};

const byMethod = new Map<string, (typeof data.rows)[number][]>();
for (const row of data.rows) byMethod.set(row.method, [...(byMethod.get(row.method) ?? []), row]);

describe(`${data.package} ${data.version}`, () => {
  it("covers every topic that it has in common with us", () => {
    expect([...byMethod.keys()].length).toBeGreaterThanOrEqual(14);
    for (const rows of byMethod.values()) expect(rows.length).toBeGreaterThanOrEqual(3);
  });
  it.each([...byMethod])("agrees with %s", (id, rows) => {
    const method = methodById(id);
    const relative = LOOSER[id] ?? 1e-9;
    for (const { given, value } of rows) {
      const got = method.apply(given).live as number;
      expect(Math.abs(got / value - 1), `${JSON.stringify(given)}: ${got}, ${value}`).toBeLessThan(
        relative,
      );
    }
  });
});
