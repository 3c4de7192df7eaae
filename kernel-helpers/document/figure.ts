import { StudyError } from "../errors/index.js";
import { typeJson, type Figure, type PlainJson } from "../study/index.js";
import type { Context } from "./context.js";
import type { Chart } from "./figures/chart.js";
import { tableOf, telling, thin } from "./tables.js";
import type { FigureView } from "./view.js";

const MOST_ROWS = 40;
const TWICE = "A depth that stands twice is a joint: the values above it, then those below it.";

/** A recorded figure: its values resolved and drawn, with the same data as a table beside it. */
export function figureView(ctx: Context, item: Figure, charts: readonly Chart[]): FigureView {
  const found = charts.find((c) => c.id === item.chart && c.revision === item.revision);
  if (!found)
    throw new StudyError({
      code: "unknown-chart",
      where: item.id,
      problem: `is drawn by the chart "${item.chart}" revision ${item.revision}, which this version does not have`,
      expected: charts.map((c) => `${c.id} revision ${c.revision}`).join(", "),
    });
  const base = {
    kind: "figure" as const,
    number: ctx.numbering.of(item.id),
    anchor: ctx.numbering.anchor(item.id),
    caption: item.caption,
  };
  const values: Record<string, PlainJson> = {};
  for (const [name, field] of Object.entries(found.inputs)) {
    const r = ctx.resolver.resolve(item.args[name] ?? { absent: true }, typeJson(field.kind));
    if ("stop" in r)
      return { ...base, drawing: null, alternative: null, stop: `not drawn, ${r.because}.` };
    values[name] = r.value;
  }
  const { drawing, columns } = found.draw(values, ctx.system);
  const rows = telling(columns);
  const kept = thin(rows.length, MOST_ROWS).map((i) => rows[i] ?? 0);
  const shown = columns.map((c) => ({ ...c, cells: kept.map((i) => c.cells[i] ?? "–") }));
  const depths = shown[0]?.cells ?? [];
  const data = tableOf(shown, {
    number: null,
    anchor: `${base.anchor}-data`,
    caption: `Data of ${base.number}: ${item.caption}`,
  });
  return {
    ...base,
    drawing,
    stop: null,
    alternative:
      new Set(depths).size === depths.length ? data : { ...data, notes: [...data.notes, TWICE] },
  };
}
