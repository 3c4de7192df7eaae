import { descent } from "../../models/index.js";
import { displayUnit, inUnit, type DisplaySystem } from "../../units/index.js";
import { Well } from "../../well/index.js";
import { showColumn } from "../show.js";
import type { Series } from "../view.js";
import { chart } from "./chart.js";
import { drawnWell } from "./drawn-well.js";

/** The well beside upflow, slip and net velocity of a falling body, by depth. */
export const descentChart = chart({
  id: "descent-chart",
  revision: 1,
  title: "Descent by depth",
  inputs: {
    well: { kind: Well, note: "well" },
    descent: { kind: descent.output, note: "descent" },
  },
  draw: ({ well, descent: d }, system) => {
    const parts = [
      { label: "upflow", of: d.upflow },
      { label: "slip", of: d.slip },
      { label: "net, favourable", of: d.net },
      { label: "net, unfavourable", of: d.netLow },
    ];
    const largest = Math.max(...parts.flatMap((p) => p.of.value.map(Math.abs)));
    const unit = displayUnit("velocity", system, largest);
    const depthUnit = displayUnit("measuredDepth", system, 1000);
    const series = parts.map(({ label, of }): Series => ({
      label,
      depth: of.depth.map((x) => inUnit(x as never, depthUnit)),
      value: of.value.map((x) => inUnit(x as never, unit)),
    }));
    const stands = [
      { at: d.standsAt, label: "no deeper, favourable" },
      { at: d.standsAtLow, label: "no deeper, unfavourable" },
    ];
    return {
      drawing: {
        drawing: "well-and-depth",
        ...drawnWell(well, system),
        pack: null,
        xTitle: "velocity (upflow up, slip and net down)",
        unit: unit.symbol,
        series,
        marks: stands.flatMap(({ at, label }) =>
          at === null ? [] : [{ depth: inUnit(at as never, depthUnit), label }],
        ),
      },
      columns: [
        columnOf("measured depth", "measuredDepth", d.upflow.depth, system),
        ...parts.map((p) => columnOf(p.label, "velocity", p.of.value, system)),
      ],
    };
  },
});

const columnOf = (
  head: string,
  kind: "measuredDepth" | "velocity",
  values: readonly number[],
  system: DisplaySystem,
) => ({ head, numeric: true, ...showColumn(kind, values, system) });
