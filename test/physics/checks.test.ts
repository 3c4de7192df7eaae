import { readdirSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { reference } from "../../kernel-helpers/method/index.js";
import { methodById, methods } from "../../kernel-helpers/physics/registry.js";
import type { AnyArguments } from "../../kernel-helpers/physics/any-method.js";
import { halfLastDigit, inRowUnit, target } from "./printed.js";

const OUTSIDE = [
  "published worked example",
  "published table",
  "standard",
  "general reference library",
  "exact limit or identity",
];

describe("the tolerance of a printed number", () => {
  it("is half of its last digit", () => {
    expect(halfLastDigit("2.39")).toBeCloseTo(0.005, 12);
    expect(halfLastDigit("62")).toBeCloseTo(0.5, 12);
    expect(halfLastDigit("-0.1749")).toBeCloseTo(0.00005, 12);
    expect(halfLastDigit("1.905e4")).toBeCloseTo(5, 12);
  });
});

describe.each(methods.map((m) => [m.id, m] as const))("%s", (_, m) => {
  for (const check of m.checks) {
    it.each(check.rows.map((row, i) => [i + 1, row] as const))(
      `gives what is printed in ${check.from.cite}, ${check.from.where}, row %i`,
      (_n, row) => {
        const { value, tolerance } = target(row);
        const { live } = m.apply(row.given as never);
        const got = inRowUnit(live as number, row);
        expect(Math.abs(got - value), `${got} against ${row.printed}`).toBeLessThanOrEqual(
          tolerance,
        );
      },
    );
  }
  it("rests on at least one value from outside", () => {
    expect(m.checks.some((c) => OUTSIDE.includes(c.basis) && c.rows.length > 0)).toBe(true);
  });
  it("gives a reason wherever it widens a tolerance", () => {
    for (const { rows } of m.checks)
      for (const row of rows)
        expect(row.within === undefined || row.because !== undefined).toBe(true);
  });
  it("cites works that the bibliography holds", () => {
    for (const { cite } of [m.source, ...m.checks.map((c) => c.from)])
      if (cite !== "derivation") expect(reference(cite).id).toBe(cite);
  });
  it("computes the same bare and checked", () => {
    const row = m.checks[0]?.rows[0];
    expect(row).toBeDefined();
    const given = row?.given as AnyArguments;
    expect(m.si(given)).toBe(m.apply(given as never).live);
  });
});

describe("the registry", () => {
  it("holds each id once", () => {
    const ids = methods.map((m) => m.id);
    expect(new Set(ids).size).toBe(ids.length);
  });
  it("holds a file named after each method and no method without one", () => {
    const room = new URL("../../kernel-helpers/physics/", import.meta.url);
    const files = readdirSync(room, { recursive: true, encoding: "utf8" }).map((f) =>
      f.replace(/^.*[/\\]/, ""),
    );
    for (const { id } of methods) expect(files).toContain(`${id}.ts`);
  });
  it("finds a method by id and refuses an unknown one by code", () => {
    expect(methodById("ergun-1952").title).toMatch(/Ergun/);
    expect(() => methodById("no-such-law")).toThrow(
      expect.objectContaining({ code: "unknown-method" }) as Error,
    );
  });
  it("holds every method that a composed one uses", () => {
    const ids = new Set(methods.map((m) => m.id));
    for (const m of methods) for (const used of m.uses) expect(ids).toContain(used.id);
  });
});
