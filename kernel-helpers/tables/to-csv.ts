import { assertColumns, columnLabel, type Cell, type Column } from "./column.js";

/**
 * A table as comma-separated text (RFC 4180: CRLF, quotes doubled), with units in the header row.
 *
 * Numbers keep every digit, so that reading them back gives the same numbers; a missing value is
 * empty. A text that a spreadsheet would run as a formula (it begins with = + - @, a tab or a
 * carriage return, and is not a number) gets an apostrophe before it, which spreadsheets take as
 * "this is text"; no other cell is changed.
 *
 * Throws InputError: `ragged-columns`, `no-columns`, `no-head`, `duplicate-head`, `mixed-column`,
 * `wrong-cell`, `not-a-number`.
 */
export function toCsv({ columns }: { readonly columns: readonly Column[] }): string {
  assertColumns(columns, "table");
  const rows = [columns.map((c) => field(columnLabel(c)))];
  const length = columns[0]?.values.length ?? 0;
  for (let i = 0; i < length; i++) rows.push(columns.map((c) => field(c.values[i] as Cell)));
  return rows.map((row) => `${line(row)}\r\n`).join("");
}

// A row of one empty field would be an empty line, which readers skip.
const line = (row: readonly string[]): string =>
  row.length === 1 && row[0] === "" ? '""' : row.join(",");

function field(x: Cell): string {
  if (x === null) return "";
  if (typeof x !== "string") return Object.is(x, -0) ? "0" : String(x);
  const text = isFormula(x) ? `'${x}` : x;
  return /[",\r\n]|^\s|\s$/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}

const isFormula = (text: string): boolean =>
  /^[=+\-@\t\r]/.test(text) && !/^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(text);
