import { InputError } from "../errors/index.js";
import type { Cell } from "./column.js";

/** Rows and columns to keep, by position (`iloc`) or by label (`loc`). */
export interface Slice<Label> {
  readonly rows?: readonly (number | string)[];
  readonly columns?: readonly Label[];
}

/**
 * A danfojs frame to look at, slice and export. Whatever danfojs computes wrongly or guesses at is
 * refused with the way to do it instead; a slice is guarded as well.
 */
export interface Frame {
  readonly columns: readonly string[];
  readonly index: readonly (number | string)[];
  readonly shape: readonly number[];
  readonly values: readonly (readonly Cell[])[];
  /** A copy of one column, to compute with. */
  column(label: string): Cell[];
  head(rows?: number): Frame;
  tail(rows?: number): Frame;
  iloc(slice: Slice<number | string>): Frame;
  loc(slice: Slice<string>): Frame;
  /** The rows that are marked true. */
  query(keep: readonly boolean[]): Frame;
  drop(labels: { readonly columns: readonly string[] }): Frame;
  copy(): Frame;
  at(row: number | string, column: string): Cell;
  iat(row: number, column: number): Cell;
  toJSON(): { readonly [label: string]: Cell }[];
  toExcel(options: { readonly filePath: string; readonly sheetName?: string }): void;
  toString(): string;
  print(): void;
}

const ALLOWED: ReadonlySet<string> = new Set([
  ...["columns", "index", "shape", "values", "size", "ndim"],
  ...["head", "tail", "iloc", "loc", "query", "drop", "copy", "at", "iat"],
  ...["toJSON", "toExcel", "toString", "print", "constructor"],
]);

const REMEDIES: { readonly [name: string]: string } = {
  toCSV: "use toCsv, which quotes and keeps every digit",
  dtypes: "look at the values: danfojs guesses types from the first rows",
  ctypes: "look at the values: danfojs guesses types from the first rows",
  rename: "give the columns other heads before the frame is made",
  addColumn: "add the column before the frame is made",
};
const OTHERWISE = "take the column with frame.column(label), compute with plain numbers";

type Raw = object & { readonly [name: string]: unknown };

/** Stands before a danfojs frame and lets through only what is right. */
export function guardFrame(raw: object): Frame {
  const target = raw as Raw;
  const labels = target["columns"] as readonly string[];
  const column = (label: string): Cell[] => {
    const at = labels.indexOf(label);
    if (at >= 0) return (target["values"] as Cell[][]).map((row) => row[at] as Cell);
    throw new InputError({
      code: "unknown-column",
      where: "frame",
      problem: `has no column ${JSON.stringify(label)}`,
      expected: labels.map((l) => JSON.stringify(l)).join(", "),
    });
  };
  return new Proxy(target, {
    get(_, name) {
      if (name === "column") return column;
      if (typeof name === "string" && labels.includes(name)) return column(name);
      const found: unknown = Reflect.get(target, name, target);
      if (typeof name === "symbol" || name.startsWith("$") || found === undefined) return found;
      if (!ALLOWED.has(name)) throw refused(name);
      if (typeof found !== "function" || name === "constructor") return found;
      return (...args: unknown[]): unknown => {
        const result: unknown = Reflect.apply(found, target, args);
        return isFrame(result) ? guardFrame(result) : result;
      };
    },
  }) as unknown as Frame;
}

const isFrame = (x: unknown): x is object =>
  typeof x === "object" && x !== null && "$columns" in x && "iloc" in x;

const refused = (name: string): InputError =>
  new InputError({
    code: "not-in-a-frame",
    where: "frame",
    problem: `${name} is not done by danfojs here: its arithmetic, grouping, sorting and types err`,
    remedy: REMEDIES[name] ?? OTHERWISE,
  });
