import { describe, expect, it } from "vitest";
import { depthChart, type DepthChart } from "../../../kernel-helpers/render/charts/depth-chart.js";
import type { ChartSpec, ChartValue } from "../../../kernel-helpers/render/charts/chart-spec.js";
import { codeOf } from "../../code-of.js";
import { there } from "../there.js";

const depth = Array.from({ length: 31 }, (_, i) => 1000 + i * 100);
const given: DepthChart = {
  description: "Pressure against depth",
  series: [
    { label: "flowing", depth, value: depth.map((d) => 8 + d * 0.0085) },
    { label: "pore", depth, value: depth.map((d) => 2 + d * 0.0135) },
  ],
  depthRange: [1000, 4000],
  depthTitle: "Depth [m]",
  xTitle: "Pressure [MPa]",
  marks: [
    { depth: 3000, label: "injection" },
    { depth: 3010, label: "top of pack" },
  ],
  valueMarks: [{ value: 50, label: "limit" }],
  sections: [
    { top: 1000, base: 2500 },
    { top: 2500, base: 4000 },
  ],
  width: 480,
  height: 500,
  plotTop: 40,
  plotBottom: 460,
};

function at(spec: ChartSpec, ...path: (string | number)[]): ChartValue {
  let value: ChartValue = spec;
  for (const key of path) {
    if (typeof value !== "object" || value === null)
      throw new Error(`nothing at ${path.join(".")}`);
    value = Reflect.get(value, key) as ChartValue;
  }
  return value;
}
/** The rows that a named layer draws. */
function rowsOf(spec: ChartSpec, name: string): Record<string, number | string>[] {
  const layers = at(spec, "layer") as { name?: string; data: { values: [] } }[];
  const found = layers.find((l) => l.name === name);
  if (!found) throw new Error(`no layer ${name}`);
  return found.data.values;
}

describe("a depth chart", () => {
  const spec = depthChart(given);

  it("is the same plain data for the same input, and no input is changed", () => {
    const frozen = JSON.stringify(given);
    expect(JSON.stringify(depthChart(given))).toBe(JSON.stringify(spec));
    expect(JSON.parse(JSON.stringify(spec))).toEqual(spec);
    expect(JSON.stringify(given)).toBe(frozen);
  });
  it("gives the depth range exactly the pixels asked for, in a figure of the size asked for", () => {
    const padding = at(spec, "padding") as Record<string, number>;
    expect(at(spec, "height")).toBe(420);
    expect(padding["top"]).toBe(40);
    expect(padding["bottom"]).toBe(40);
    expect(Number(at(spec, "width")) + there(padding["left"]) + there(padding["right"])).toBe(480);
    expect(at(spec, "autosize", "type")).toBe("none");
  });
  it("runs its depth downwards over the whole range, with titles as given", () => {
    const layers = at(spec, "layer") as { name?: string }[];
    const i = layers.findIndex((l) => l.name === "series-1");
    const y = at(spec, "layer", i, "encoding", "y") as { [key: string]: ChartValue };
    expect(y).toMatchObject({ scale: { domain: [1000, 4000], reverse: true, nice: false } });
    expect(y).toMatchObject({ axis: { title: "Depth [m]" } });
    expect(at(spec, "layer", i, "encoding", "x", "axis", "title")).toBe("Pressure [MPa]");
  });
  it("tells its lines apart by dashes as well as colours", () => {
    const marks = [1, 2].map((n) => {
      const layers = at(spec, "layer") as {
        name?: string;
        mark: { color: string; strokeDash: number[] };
      }[];
      return there(layers.find((l) => l.name === `series-${n}`)).mark;
    });
    expect(there(marks[0]).color).not.toBe(there(marks[1]).color);
    expect(there(marks[0]).strokeDash).not.toEqual(there(marks[1]).strokeDash);
  });
  it("names each line in the plot", () => {
    expect(there(rowsOf(spec, "label-1")[0])["text"]).toBe("flowing");
    const row = there(rowsOf(spec, "label-2")[0]);
    expect(row["x"]).toBeGreaterThanOrEqual(0);
    expect(row["y"]).toBeLessThanOrEqual(420);
  });
  it("draws marks at their depth and parts their names", () => {
    const [a, b] = rowsOf(spec, "depth-marks");
    expect(there(a)["y"]).toBe(280);
    expect(Number(there(b)["yLabel"]) - Number(there(a)["yLabel"])).toBeGreaterThanOrEqual(13);
  });
  it("draws only the section ends that lie within", () => {
    expect(rowsOf(spec, "section-ends")).toEqual([{ depth: 2500 }]);
  });
  it("parts the names of values that lie close together", () => {
    const close = depthChart({
      ...given,
      valueMarks: [
        { value: 50, label: "one limit" },
        { value: 50.5, label: "the other limit" },
      ],
    });
    const [a, b] = rowsOf(close, "value-marks");
    expect(Number(there(b)["x"]) - Number(there(a)["x"])).toBeLessThan(10);
    expect(Number(there(b)["xLabel"]) - Number(there(a)["xLabel"])).toBeGreaterThan(50);
  });
  it("writes very small values as powers of ten", () => {
    const small = depthChart({
      ...given,
      series: [{ label: "leak", depth, value: depth.map((d) => d * 1e-8) }],
      valueMarks: [],
    });
    expect(JSON.stringify(small)).toContain("datum.value === 0.00002 ? '2.0 × 10⁻⁵'");
  });
  it("takes the value range it is given", () => {
    const fixed = depthChart({ ...given, xRange: [0, 100] });
    expect(JSON.stringify(fixed)).toContain('"domain":[0,100]');
  });

  const [first] = given.series;
  it.each<[string, Partial<DepthChart>, RegExp]>([
    ["no description", { description: " " }, /description/],
    ["no series", { series: [] }, /series/],
    ["a turned range", { depthRange: [4000, 1000] }, /depthRange: is 4000 to 1000/],
    ["a turned value range", { xRange: [1, 0] }, /xRange/],
    ["a plot outside of the figure", { plotBottom: 900 }, /plotBottom/],
    [
      "unequal lists",
      { series: [{ ...there(first), value: [1] }] },
      /series\[0\]: has 31 depths and 1/,
    ],
    [
      "no number",
      { series: [{ ...there(first), value: depth.map(() => NaN) }] },
      /value\[0\]: is NaN/,
    ],
    ["a mark outside", { marks: [{ depth: 9, label: "x" }] }, /marks\[0\]\.depth: is 9/],
    ["a value mark that is none", { valueMarks: [{ value: NaN, label: "x" }] }, /valueMarks\[0\]/],
    ["no room", { width: 150 }, /width: 150 px/],
  ])("is refused with %s", (_, change, says) => {
    expect(() => depthChart({ ...given, ...change })).toThrow(says);
    expect(codeOf(() => depthChart({ ...given, ...change }))).toMatch(/bad-chart|out-of-bounds/);
  });
});
