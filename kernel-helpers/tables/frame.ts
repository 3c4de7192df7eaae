import { InputError } from "../errors/index.js";
import { assertColumns, columnLabel, type Cell, type Column } from "./column.js";
import { guardFrame, type Frame } from "./guard-frame.js";
import { loadDanfo, type Danfo } from "./load-danfo.js";

/**
 * Columns as a danfojs frame, to look at, slice and export. Numbers stay float64; the labels carry
 * the units (`depth [m]`).
 *
 * Throws InputError: `reserved-name` (a label that is also a property of a frame), `no-rows`,
 * `not-installed`, and what `toCsv` throws for columns that do not fit together.
 */
export async function frame(columns: readonly Column[]): Promise<Frame> {
  assertColumns(columns, "frame");
  if (columns[0]?.values.length === 0) {
    throw new InputError({
      code: "no-rows",
      where: "frame",
      problem: "has no rows",
      expected: "at least one",
    });
  }
  const danfo = await loadDanfo();
  assertNotReserved(columns.map(columnLabel), danfo);
  const data = Object.fromEntries(columns.map((c) => [columnLabel(c), Array.from(c.values)]));
  return guardFrame(new danfo.DataFrame(data, { dtypes: columns.map(typeLabel) }));
}

// danfojs would guess the type from the first rows. Its "float32" is a label only: the numbers are
// kept as they are.
const typeLabel = ({ values }: Column): string => {
  const first = Array.from<Cell>(values).find((x) => x !== null);
  return typeof first === "string" ? "string" : typeof first === "boolean" ? "boolean" : "float32";
};

function assertNotReserved(labels: readonly string[], { DataFrame }: Danfo): void {
  const probe = new DataFrame({ [PROBE]: [0] }, { dtypes: ["float32"] });
  for (const label of labels) {
    if (!(label in probe)) continue;
    throw new InputError({
      code: "reserved-name",
      where: `frame.${JSON.stringify(label)}`,
      problem: "is a property of a frame, which the column would hide",
      remedy: `choose another head, or add a unit: ${JSON.stringify(`${label} [1]`)}`,
    });
  }
}
const PROBE = " ";
