import { InputError } from "../errors/index.js";

/** What a cell holds; `null` is a missing value. */
export type Cell = number | string | boolean | null;

/** A column of a table: numbers, texts or truth values, one of the three, each possibly missing. */
export interface Column {
  readonly head: string;
  /** Symbol of the unit that the numbers are in. */
  readonly unit?: string;
  readonly values: ArrayLike<Cell>;
}

/** `depth [m]`, or the head alone where there is no unit. */
export const columnLabel = ({ head, unit }: Column): string =>
  unit === undefined ? head : `${head} [${unit}]`;

/** Throws unless there are columns of equal length, each of one type, under different labels. */
export function assertColumns(columns: readonly Column[], where: string): void {
  const [first] = columns;
  if (!first) throw wrong("no-columns", where, "has no columns", "at least one");
  const seen = new Set<string>();
  for (const column of columns) {
    const label = columnLabel(column);
    const place = `${where}.${JSON.stringify(label)}`;
    if (column.head.trim() === "") throw wrong("no-head", place, "a column has no head", "a text");
    if (seen.has(label)) throw wrong("duplicate-head", place, "stands twice", "different heads");
    seen.add(label);
    if (column.values.length !== first.values.length) {
      throw wrong(
        "ragged-columns",
        place,
        `has ${column.values.length} values`,
        `${first.values.length}, as many as ${JSON.stringify(columnLabel(first))}`,
      );
    }
    assertOneType(column.values, place);
  }
}

function assertOneType(values: ArrayLike<Cell>, place: string): void {
  let type: string | null = null;
  for (let i = 0; i < values.length; i++) {
    // A notebook's types do not reach into data that were read from a file.
    const x = values[i] as unknown;
    if (x === null) continue;
    const here = `${place}[${i}]`;
    const found = typeof x;
    if (found !== "number" && found !== "string" && found !== "boolean")
      throw wrong("wrong-cell", here, `is ${found}`, "a number, a text, true, false or null");
    if (typeof x === "number" && !Number.isFinite(x))
      throw wrong("not-a-number", here, `cannot be ${x}`, "a finite number, or null if missing");
    type ??= found;
    if (found !== type)
      throw wrong("mixed-column", here, `is a ${found} in a column of type ${type}`, "one type");
  }
}

const wrong = (code: string, where: string, problem: string, expected: string): InputError =>
  new InputError({ code, where, problem, expected });
