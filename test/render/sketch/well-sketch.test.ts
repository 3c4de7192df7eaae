import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { textWidth } from "../../../kernel-helpers/render/lettering/text-width.js";
import { wellSketch, type WellSketch } from "../../../kernel-helpers/render/sketch/well-sketch.js";
import { codeOf } from "../../code-of.js";
import { there } from "../there.js";

const given: WellSketch = {
  description: "The well",
  sections: [
    { name: "outer casing", top: 0, base: 1000, bore: 0.315, outer: 0.34, kind: "casing" },
    { name: "inner casing", top: 0, base: 2500, bore: 0.217, outer: 0.244, kind: "casing" },
    { name: "liner", top: 2400, base: 3500, bore: 0.157, outer: 0.178, kind: "liner" },
    { name: "open hole", top: 3500, base: 4000, bore: 0.152, kind: "open hole" },
  ],
  depthRange: [0, 4000],
  depthUnit: "m",
  diameterInDepthUnits: 1,
  width: 240,
  height: 480,
  plotTop: 40,
  plotBottom: 440,
};
const pixelsPerMetre = 400 / 4000;

interface Rect {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}
const number = (text: string, name: string): number =>
  Number(new RegExp(` ${name}="(-?[\\d.]+)"`).exec(text)?.[1]);
const rects = (svg: string): Rect[] =>
  [...svg.matchAll(/<rect [^>]*>/g)].map(([tag]) => ({
    x: number(tag, "x"),
    y: number(tag, "y"),
    width: number(tag, "width"),
    height: number(tag, "height"),
  }));
const texts = (svg: string): { text: string; x: number; y: number; isEnd: boolean }[] =>
  [...svg.matchAll(/<text ([^>]*)>([^<]*)<\/text>/g)].map((m) => ({
    text: there(m[2]),
    x: number(` ${there(m[1])}`, "x"),
    y: number(` ${there(m[1])}`, "y"),
    isEnd: there(m[1]).includes('text-anchor="end"'),
  }));

describe("a well sketch", () => {
  const svg = wellSketch(given);

  it("is one image with its description, the same each time", () => {
    expect(svg).toMatch(/^<svg role="img" aria-label="The well" /);
    expect(wellSketch(given)).toBe(svg);
  });
  it("draws each wall over exactly its depths", () => {
    const walls = rects(svg).filter((r) => r.height > 20);
    expect(walls.map((r) => [r.y, r.height])).toEqual(
      given.sections
        .filter((s) => s.kind !== "open hole")
        .flatMap((s) => {
          const wall = [40 + s.top * pixelsPerMetre, (s.base - s.top) * pixelsPerMetre];
          return [wall, wall];
        }),
    );
  });
  it("widens all diameters by one factor, which it states", () => {
    const walls = rects(svg).filter((r) => r.height > 20);
    const bores = [0, 2, 4].map(
      (i) => there(walls[i + 1]).x - there(walls[i]).x - there(walls[i]).width,
    );
    const scale = there(bores[0]) / 0.315;
    expect(there(bores[1]) / 0.217).toBeCloseTo(scale, 0);
    expect(there(bores[2]) / 0.157).toBeCloseTo(scale, 0);
    const stated = /diameters widened ([\d\u202f]+) times/.exec(svg)?.[1] ?? "";
    const factor = Number(stated.replace("\u202f", ""));
    expect(factor / (scale / pixelsPerMetre)).toBeCloseTo(1, 1);
  });
  it("writes depths beside their ticks", () => {
    const ticks = texts(svg).filter((t) => t.isEnd && /^\d/.test(t.text));
    expect(ticks.length).toBeGreaterThan(4);
    for (const t of ticks) expect(t.y - 3.4).toBeCloseTo(40 + Number(t.text) * pixelsPerMetre, 1);
  });
  it("leaves the depths to a chart beside it when told so", () => {
    expect(texts(wellSketch({ ...given, hasDepthAxis: false })).some((t) => t.isEnd)).toBe(false);
  });
  it("fills the bore of each section with the solids in it", () => {
    const packed = wellSketch({ ...given, pack: { top: 3000, base: 4000 } });
    const fills = [...packed.matchAll(/<rect [^>]*fill="#d5dcde"[^>]*>/g)].map(([tag]) => tag);
    expect(fills.map((f) => [number(f, "y"), number(f, "height")])).toEqual([
      [340, 50],
      [390, 50],
    ]);
    expect(number(there(fills[0]), "width")).toBeGreaterThan(number(there(fills[1]), "width"));
  });
  it("cuts what lies outside of its range", () => {
    const part = wellSketch({ ...given, depthRange: [2000, 3000] });
    for (const r of rects(part)) {
      expect(r.y).toBeGreaterThanOrEqual(40);
      expect(r.y + r.height).toBeLessThanOrEqual(440);
    }
    expect(part).not.toContain("outer casing");
    expect(part).not.toContain("open hole");
  });
  it("draws a mark without a label as a line only", () => {
    const marked = wellSketch({ ...given, marks: [{ depth: 3000, label: null }] });
    expect(texts(marked)).toHaveLength(texts(svg).length);
    expect(marked).toContain('y1="340"');
  });
  it("escapes every text", () => {
    const evil = `"><script>alert(1)</script>`;
    const drawn = wellSketch({
      ...given,
      description: evil,
      depthUnit: evil,
      sections: given.sections.map((s) => ({ ...s, name: evil })),
      marks: [{ depth: 10, label: evil }],
    });
    expect(drawn).not.toContain("<script");
    expect(drawn.match(/aria-label="[^"]*"/)?.[0]).toContain("&lt;script&gt;");
  });
  it("never lets two labels overlap nor leave the figure, wherever marks and shoes are", () => {
    const depth = fc.integer({ min: 0, max: 4000 });
    const label = fc.constantFrom("inflow", "injection point", "top of the pack of solids", "leak");
    fc.assert(
      fc.property(
        fc.array(fc.record({ depth, label }), { maxLength: 6 }),
        fc.integer({ min: 200, max: 3300 }),
        (marks, base) => {
          const sections = given.sections.map((s, i) => (i < 2 ? { ...s, base: base + i } : s));
          const boxes = texts(wellSketch({ ...given, sections, marks }))
            .filter((t) => !t.isEnd && t.y < 440)
            .map((t) => ({ ...t, right: t.x + textWidth({ text: t.text, size: 10 }) }));
          boxes.forEach((a, i) => {
            expect(a.right).toBeLessThanOrEqual(244);
            for (const b of boxes.slice(0, i))
              expect(Math.abs(a.y - b.y) >= 11.9 || a.x >= b.right || b.x >= a.right).toBe(true);
          });
        },
      ),
      { numRuns: 60 },
    );
  });

  const [first] = given.sections;
  it.each<[string, Partial<WellSketch>, RegExp]>([
    ["no description", { description: "" }, /description/],
    ["no sections", { sections: [] }, /sections/],
    ["a turned range", { depthRange: [1, 0] }, /depthRange: is 1 to 0/],
    [
      "a turned section",
      { sections: [{ ...there(first), top: 2000 }] },
      /sections\[0\]: runs from 2000/,
    ],
    ["no bore", { sections: [{ ...there(first), bore: 0 }] }, /bore: is 0/],
    [
      "an outside below the bore",
      { sections: [{ ...there(first), outer: 0.1 }] },
      /outer: is 0\.1/,
    ],
    ["a mark outside", { marks: [{ depth: -5, label: "x" }] }, /marks\[0\]\.depth: is -5/],
    ["a seabed outside", { seabed: 9000 }, /seabed/],
    ["a turned pack", { pack: { top: 2, base: 1 } }, /pack/],
    ["a plot outside of the figure", { plotTop: -1 }, /plotTop/],
    ["too narrow a figure", { width: 100 }, /width: is 100 px/],
    ["no factor", { diameterInDepthUnits: 0 }, /diameterInDepthUnits/],
  ])("is refused with %s", (_, change, says) => {
    expect(() => wellSketch({ ...given, ...change })).toThrow(says);
    expect(codeOf(() => wellSketch({ ...given, ...change }))).toBe("bad-sketch");
  });
});
