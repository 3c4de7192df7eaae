import { describe, expect, it } from "vitest";
import { deg, inch, mMD } from "../../kernel-helpers/units/index.js";
import { BoreSection, Well } from "../../kernel-helpers/well/index.js";

const section = (name: string, top: number, base: number, bore: number | string = "8.681") =>
  BoreSection({
    name,
    wall: "casing",
    top: mMD(top),
    base: mMD(base),
    bore: inch(bore),
    inclination: deg(0),
  });

describe("a bore section", () => {
  it("has the area of its bore and the length between its depths", () => {
    const s = section("casing", 100, 350);
    expect(s.length).toBe(250);
    // 8.681 in: 59.187 in2, as printed in casing tables
    expect(s.area / 0.0254 ** 2).toBeCloseTo(59.187, 2);
  });
  it("keeps its roughness absent as null", () => {
    expect(section("casing", 0, 1).roughness).toBeNull();
  });
  it.each([
    ["a negative bore", { bore: inch(-3) }, { code: "out-of-bounds", where: "bore-section.bore" }],
    [
      "a bore that is no number",
      { bore: NaN as never },
      { code: "not-a-number", where: "bore-section.bore" },
    ],
    ["a base above its top", { base: mMD(-1) }, { where: "bore-section.base" }],
    ["a section of no length", { top: mMD(10), base: mMD(10) }, { code: "empty-section" }],
    [
      "an inclination of 90° and more",
      { inclination: deg(90) },
      { code: "out-of-bounds", where: "bore-section.inclination" },
    ],
    [
      "a wall that is none",
      { wall: "glass" as never },
      { code: "wrong-kind", where: "bore-section.wall" },
    ],
    [
      "a field that is none",
      { diameter: inch(3) } as never,
      { code: "unknown-field", where: "bore-section.diameter" },
    ],
  ])("refuses %s", (_, over: object, parts) => {
    const good = {
      name: "x",
      wall: "casing" as const,
      top: mMD(0),
      base: mMD(10),
      bore: inch(8),
      inclination: deg(0),
    };
    expect(() => BoreSection({ ...good, ...over })).toThrow(expect.objectContaining(parts));
  });
});

describe("a well", () => {
  const well = Well({ sections: [section("a", 210, 2880), section("b", 2880, 3520, 6.094)] });
  it("runs from the top of its first section to the base of its last", () => {
    expect([well.top, well.base]).toEqual([210, 3520]);
  });
  it("finds the section at a depth; at a joint the upper one", () => {
    expect(well.sectionAt(1000).name).toBe("a");
    expect(well.sectionAt(2880).name).toBe("a");
    expect(well.sectionAt(2880.1).name).toBe("b");
    expect(() => well.sectionAt(5000)).toThrow(expect.objectContaining({ code: "outside" }));
  });
  it("refuses a gap and says both depths", () => {
    expect(() => Well({ sections: [section("a", 0, 100), section("b", 120, 200)] })).toThrow(
      /well\.sections\[1\] "b": leaves a gap below "a": its top is at 120 m and the base above it at 100 m/,
    );
  });
  it("refuses an overlap", () => {
    expect(() => Well({ sections: [section("a", 0, 100), section("b", 90, 200)] })).toThrow(
      expect.objectContaining({ code: "overlap", where: 'well.sections[1] "b"' }),
    );
  });
  it("refuses to be without sections", () => {
    expect(() => Well({ sections: [] })).toThrow(expect.objectContaining({ code: "no-sections" }));
  });
});
