import { InputError } from "../../errors/index.js";
import type { WellSketch } from "./well-sketch.js";

/** Refuses what cannot be drawn, naming the field. */
export function checkSketch(sketch: WellSketch): void {
  const { sections, depthRange, width, height, plotTop, plotBottom, seabed, pack } = sketch;
  const [top, bottom] = depthRange;
  if (sketch.description.trim() === "")
    throw refused("description", "is empty", "what the sketch shows, in words");
  if (!(Number.isFinite(top) && Number.isFinite(bottom) && top < bottom))
    throw refused("depthRange", `is ${top} to ${bottom}`, "the shallower depth first");
  if (!(plotTop >= 0 && plotTop + 40 <= plotBottom && plotBottom <= height))
    throw refused(
      "plotTop, plotBottom",
      `are ${plotTop} and ${plotBottom} px in a figure of ${height} px`,
      "0 ≤ plotTop, plotTop + 40 ≤ plotBottom ≤ height",
    );
  if (!(width >= 160)) throw refused("width", `is ${width} px`, "at least 160 px");
  if (sections.length === 0) throw refused("sections", "holds nothing", "at least one section");
  sections.forEach((s, i) => {
    const where = `sections[${i}]`;
    if (!(Number.isFinite(s.top) && Number.isFinite(s.base) && s.top < s.base))
      throw refused(where, `runs from ${s.top} to ${s.base}`, "its top above its base");
    if (!(s.bore > 0 && s.bore < Infinity))
      throw refused(`${where}.bore`, `is ${s.bore}`, "a diameter above zero");
    if (s.outer !== undefined && !(s.outer >= s.bore && s.outer < Infinity))
      throw refused(`${where}.outer`, `is ${s.outer}`, `at least the bore, ${s.bore}`);
  });
  const inRange = (depth: number): boolean => depth >= top && depth <= bottom;
  sketch.marks?.forEach((mark, i) => {
    if (!inRange(mark.depth))
      throw refused(`marks[${i}].depth`, `is ${mark.depth}`, `a depth from ${top} to ${bottom}`);
  });
  if (seabed !== undefined && !inRange(seabed))
    throw refused("seabed", `is ${seabed}`, `a depth from ${top} to ${bottom}`);
  if (pack && !(pack.top <= pack.base))
    throw refused("pack", `runs from ${pack.top} to ${pack.base}`, "its top above its base");
  const factor = sketch.diameterInDepthUnits;
  if (factor !== undefined && !(factor > 0 && factor < Infinity))
    throw refused("diameterInDepthUnits", `is ${factor}`, "a number above zero");
}

const refused = (where: string, problem: string, expected: string): InputError =>
  new InputError({ code: "bad-sketch", where, problem, expected });
