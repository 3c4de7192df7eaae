import { inspect } from "node:util";
import type { ErrorReport } from "./compiler-words.js";
import { excerpt } from "./excerpt.js";

/** A place in the source of a cell or of a module beside the notebook; both 1-based. */
export interface SourcePlace {
  readonly cell: number | null;
  readonly file: string | null;
  readonly line: number;
  readonly column: number;
}

export interface ThrownParts {
  readonly thrown: unknown;
  /** The cell that ran, and its source. */
  readonly cell: number;
  readonly source: string;
  /** Where in a source a place of a stack frame lies, or null when it is in none of the analyst's. */
  readonly locate: (frame: { script: string; line: number; column: number }) => SourcePlace | null;
  /** True for the stack frames of the machinery that runs cells. */
  readonly isOurs: (frame: string) => boolean;
}

/** What a cell threw: one sentence, and the places in the analyst's own code that led to it. */
export function thrownReport(parts: ThrownParts): ErrorReport {
  const { thrown, cell, source } = parts;
  if (isInterrupt(thrown)) {
    const evalue = "the cell was interrupted";
    return { ename: "Interrupted", evalue, traceback: [evalue], line: null };
  }
  const ename = thrown instanceof Error ? thrown.name : "Error";
  const evalue = messageOf(thrown);
  const frames = framesOf(thrown, parts);
  const at = frames.find(({ place }) => place?.cell === cell)?.place ?? null;
  // Our own errors say where and what in their sentence; the way there is of no use to the reader.
  const shown = isTold(thrown)
    ? []
    : frames.filter(({ place }) => place !== at || frames.length > 1);
  return {
    ename,
    evalue,
    traceback: [
      `${ename}: ${evalue}`,
      ...(at ? [[`line ${at.line}:`, ...excerpt(source, at.line, at.column)].join("\n")] : []),
      ...shown.map(({ text }) => `    at ${text}`),
      ...causes(thrown).map((cause) => `caused by ${cause}`),
    ],
    line: at?.line ?? null,
  };
}

interface Frame {
  readonly text: string;
  readonly place: SourcePlace | null;
}

const FRAME = /^\s+at (?:(.*) \()?(.*?):(\d+):(\d+)\)?$/;

function framesOf(thrown: unknown, { locate, isOurs }: ThrownParts): Frame[] {
  const stack = thrown instanceof Error ? (thrown.stack ?? "") : "";
  return stack.split("\n").flatMap((line): Frame[] => {
    const [, by, script = "", row = "", column = ""] = FRAME.exec(line) ?? [];
    if (script === "") return [];
    const place = locate({ script, line: Number(row), column: Number(column) });
    if (place) {
      const at = `${place.file ?? `cell ${place.cell ?? "?"}`}, line ${place.line}`;
      return [{ text: by ? `${by.replace(/^Proxy\./, "")} (${at})` : at, place }];
    }
    if (isOurs(line)) return [];
    return [{ text: `${by ? `${by} (` : ""}${script}:${row}${by ? ")" : ""}`, place: null }];
  });
}

/** An error of ours, told by its fields: a package can be loaded twice, so not by its class. */
const isTold = (x: unknown): boolean =>
  x instanceof Error &&
  "code" in x &&
  typeof x.code === "string" &&
  "where" in x &&
  typeof x.where === "string";

const isInterrupt = (x: unknown): boolean =>
  x instanceof Error &&
  (("code" in x && x.code === "ERR_SCRIPT_EXECUTION_INTERRUPTED") ||
    x.message === "Interrupted asynchronously");

const messageOf = (x: unknown): string =>
  x instanceof Error ? x.message : typeof x === "string" ? x : inspect(x, { depth: 1 });

function causes(thrown: unknown): string[] {
  const told: string[] = [];
  let next = thrown;
  // A chain of causes may loop.
  while (next instanceof Error && next.cause !== undefined && told.length < 5) {
    next = next.cause;
    told.push(next instanceof Error ? `${next.name}: ${next.message}` : messageOf(next));
  }
  const several = thrown instanceof AggregateError ? thrown.errors.map(messageOf) : [];
  return [...told, ...several];
}
