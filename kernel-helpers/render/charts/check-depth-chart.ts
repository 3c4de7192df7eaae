import { InputError } from "../../errors/index.js";
import type { DepthChart } from "./depth-chart.js";

/** Refuses what cannot be drawn, naming the field. */
export function checkDepthChart(chart: DepthChart): void {
  const { series, depthRange, plotTop, plotBottom, height } = chart;
  if (chart.description.trim() === "")
    throw refused("description", "is empty", "what the chart shows, in words");
  if (series.length === 0) throw refused("series", "holds nothing", "at least one line");
  if (!(depthRange[0] < depthRange[1]) || !depthRange.every(Number.isFinite))
    throw refused("depthRange", `is ${depthRange.join(" to ")}`, "the shallower depth first");
  if (chart.xRange && !(chart.xRange[0] < chart.xRange[1]))
    throw refused("xRange", `is ${chart.xRange.join(" to ")}`, "the smaller value first");
  if (!(plotTop >= 0 && plotTop + 40 <= plotBottom && plotBottom <= height))
    throw refused(
      "plotTop, plotBottom",
      `are ${plotTop} and ${plotBottom} px in a figure of ${height} px`,
      "0 ≤ plotTop, plotTop + 40 ≤ plotBottom ≤ height",
    );
  series.forEach((s, i) => {
    const where = `series[${i}]`;
    if (s.depth.length !== s.value.length || s.depth.length === 0)
      throw refused(
        where,
        `has ${s.depth.length} depths and ${s.value.length} values`,
        "as many of one as of the other, and at least one",
      );
    for (const name of ["depth", "value"] as const) {
      const bad = s[name].findIndex((v) => !Number.isFinite(v));
      if (bad >= 0)
        throw refused(`${where}.${name}[${bad}]`, `is ${String(s[name][bad])}`, "a number");
    }
  });
  chart.marks?.forEach((mark, i) => {
    if (!(mark.depth >= depthRange[0] && mark.depth <= depthRange[1]))
      throw refused(`marks[${i}].depth`, `is ${mark.depth}`, "a depth in the range of the chart");
  });
  chart.valueMarks?.forEach((mark, i) => {
    if (!Number.isFinite(mark.value))
      throw refused(`valueMarks[${i}].value`, `is ${mark.value}`, "a number");
  });
}

const refused = (where: string, problem: string, expected: string): InputError =>
  new InputError({ code: "bad-chart", where, problem, expected });
