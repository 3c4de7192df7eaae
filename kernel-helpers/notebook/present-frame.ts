import { inspect } from "node:util";
import { decimalsFor, formatFixed, formatNumber } from "../units/index.js";
import type { Presenter } from "./presenter.js";

const LONGEST = 40;
const ENDS = 15;

interface Frame {
  readonly columns: readonly unknown[];
  readonly index: readonly unknown[];
  readonly values: readonly unknown[];
}

/** Data frames and series (told by `$columns`), as a table; the middle of a long one is left out. */
export const presentFrame: Presenter = {
  claims: isFrame,
  bundle: (value) => {
    const cells = isFrame(value) ? cellsOf(value) : [];
    return { "text/plain": asText(cells), "text/html": asHtml(cells) };
  },
};

function isFrame(x: unknown): x is Frame {
  if (typeof x !== "object" || x === null || !("$columns" in x)) return false;
  const { columns, index, values } = x as Partial<Record<keyof Frame, unknown>>;
  return Array.isArray(columns) && Array.isArray(index) && Array.isArray(values);
}

/** Rows of text, the head first, each with its index. */
function cellsOf({ columns, index, values }: Frame): string[][] {
  const rows = values.map((row) => (Array.isArray(row) ? (row as unknown[]) : [row]));
  const columnText = columns.map((_, c) => columnFormat(rows.map((row) => row[c])));
  const line = (r: number): string[] => [
    String(index[r]),
    ...columnText.map((say, c) => say(rows[r]?.[c])),
  ];
  const all = [...rows.keys()];
  const body =
    all.length <= LONGEST
      ? all.map(line)
      : [
          ...all.slice(0, ENDS).map(line),
          [`… ${all.length} rows`, ...columns.map(() => "…")],
          ...all.slice(-ENDS).map(line),
        ];
  return [["", ...columns.map(String)], ...body];
}

/** One number of decimals for a column, unless its numbers span too much for that. */
function columnFormat(column: readonly unknown[]): (x: unknown) => string {
  const sizes = column
    .filter((x) => typeof x === "number" && Number.isFinite(x) && x !== 0)
    .map((x) => Math.abs(x as number));
  const largest = sizes.reduce((a, b) => Math.max(a, b), 0);
  const smallest = sizes.reduce((a, b) => Math.min(a, b), Infinity);
  const decimals = sizes.every(Number.isInteger) ? 0 : decimalsFor(largest, 5);
  const isEven = largest < 1e7 && smallest > 1e-4 * largest && smallest >= 1e-4;
  return (x) => {
    if (typeof x !== "number")
      return x === null || x === undefined ? "" : typeof x === "string" ? x : inspect(x);
    if (!Number.isFinite(x)) return String(x);
    return isEven || x === 0 ? formatFixed(x, decimals) : formatNumber(x, 5);
  };
}

function asText(cells: readonly (readonly string[])[]): string {
  const widths = (cells[0] ?? []).map((_, c) =>
    Math.max(...cells.map((row) => (row[c] ?? "").length)),
  );
  return cells
    .map((row) =>
      row
        .map((cell, c) => cell.padStart(widths[c] ?? 0))
        .join("  ")
        .trimEnd(),
    )
    .join("\n");
}

function asHtml([head = [], ...body]: readonly (readonly string[])[]): string {
  const row = (cells: readonly string[], tag: "th" | "td"): string =>
    `<tr>${cells.map((cell, c) => `<${c === 0 ? "th" : tag}>${escapeHtml(cell)}</${c === 0 ? "th" : tag}>`).join("")}</tr>`;
  return `<table><thead>${row(head, "th")}</thead><tbody>${body.map((cells) => row(cells, "td")).join("")}</tbody></table>`;
}

const escapeHtml = (text: string): string =>
  text.replace(
    /[&<>"]/g,
    (c) => ({ "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;" })[c] ?? c,
  );
