import { restingPack, packToCut } from "../../models/index.js";
import { displayUnit, inUnit } from "../../units/index.js";
import { Well } from "../../well/index.js";
import { showColumn } from "../show.js";
import { chart, type Drawn } from "./chart.js";
import { drawnWell } from "./drawn-well.js";
import type { Plain } from "../../method/index.js";
import type { DisplaySystem } from "../../units/index.js";

type Pack = Plain<typeof restingPack.output>;

function draw(
  { well, pack }: { well: Plain<typeof Well>; pack: Pack },
  system: DisplaySystem,
): Drawn {
  const parts = [
    { label: "flow gradient", of: pack.gradient },
    { label: "weight gradient", of: pack.weightGradient },
  ];
  const unit = displayUnit("pressureGradient", system, Math.max(...pack.weightGradient.value));
  const depthUnit = displayUnit("measuredDepth", system, 1000);
  const depth = (x: number): number => inUnit(x as never, depthUnit);
  return {
    drawing: {
      drawing: "well-and-depth",
      ...drawnWell(well, system),
      pack: { top: depth(pack.top), base: depth(pack.top + pack.height) },
      xTitle: "pressure gradient",
      unit: unit.symbol,
      series: parts.map(({ label, of }) => ({
        label,
        depth: of.depth.map(depth),
        value: of.value.map((x) => inUnit(x as never, unit)),
      })),
      marks: [{ depth: depth(pack.top), label: "top of the pack" }],
    },
    columns: [
      {
        head: "measured depth",
        numeric: true,
        ...showColumn("measuredDepth", pack.gradient.depth, system),
      },
      ...parts.map(({ label, of }) => ({
        head: label,
        numeric: true,
        ...showColumn("pressureGradient", of.value, system),
      })),
    ],
  };
}

/** The well with a pack in place, beside what the flow pulls and what the weight holds. */
export const packChart = chart({
  id: "pack-chart",
  revision: 1,
  title: "A pack and its hold by depth",
  inputs: { well: { kind: Well, note: "well" }, pack: { kind: restingPack.output, note: "pack" } },
  draw,
});
/** The same for a pack that was sized to cut the flow. */
export const cutChart = chart({
  id: "cut-chart",
  revision: 1,
  title: "A pack that cuts the flow, and its hold by depth",
  inputs: { well: { kind: Well, note: "well" }, pack: { kind: packToCut.output, note: "pack" } },
  draw,
});
