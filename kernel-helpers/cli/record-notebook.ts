import { createHash } from "node:crypto";
import { mkdirSync, readFileSync } from "node:fs";
import { basename, join } from "node:path";
import { NotebookError } from "../errors/index.js";
import { writeFileAtomic } from "../files/index.js";
import { describeFailure, runNotebook } from "../notebook/index.js";
import { parseRecord, type StudyRecord } from "../study/index.js";
import type { Terminal } from "./terminal.js";

export interface RecordedStudy {
  readonly record: StudyRecord;
  /** Where its files lie. */
  readonly folder: string;
  readonly file: string;
}
export interface RecordParts {
  readonly notebook: string;
  readonly out: string;
  readonly cellTimeoutSeconds: number | null;
  readonly signal: AbortSignal;
  readonly terminal: Terminal;
}

/**
 * Runs a notebook headless and writes what it recorded: a copy of the notebook with its outputs, and
 * a record per study. Null when a cell failed, which has then been told.
 */
export async function recordNotebook(parts: RecordParts): Promise<readonly RecordedStudy[] | null> {
  const { notebook, out, cellTimeoutSeconds, signal, terminal } = parts;
  const name = basename(notebook);
  mkdirSync(out, { recursive: true });
  const output = join(out, name);
  const outcome = await runNotebook({
    file: notebook,
    output,
    cellTimeoutMs: cellTimeoutSeconds === null ? null : cellTimeoutSeconds * 1000,
    signal,
    onProgress: ({ index, of, firstLine }) =>
      terminal.progress(`  cell ${index} of ${of}: ${firstLine.slice(0, 60)}`),
  });
  terminal.settle();
  if (outcome.status !== "ok") {
    terminal.err(describeFailure(outcome));
    return null;
  }
  terminal.err(
    `  ${outcome.cellsRun} cells in ${(outcome.ms / 1000).toFixed(1)} s; with outputs: ${output}`,
  );
  if (outcome.drafts.size === 0)
    throw new NotebookError({
      code: "no-study",
      where: notebook,
      problem: "ran, but recorded no study",
      expected: "a cell with `new Study({ … })`",
    });
  const sha256 = createHash("sha256").update(readFileSync(notebook)).digest("hex");
  return [...outcome.drafts].map(([id, draft]) => {
    const record = asRun(parseRecord(draft, `study "${id}"`), { name, sha256 });
    const folder = join(out, id);
    const file = join(folder, "record.json");
    mkdirSync(folder, { recursive: true });
    writeFileAtomic(file, `${JSON.stringify(record, null, 1)}\n`);
    return { record, folder, file };
  });
}

/** A clean run from the first cell to the last makes an issuable record, unless something in it is stale. */
const asRun = (record: StudyRecord, notebook: { name: string; sha256: string }): StudyRecord => ({
  ...record,
  run: { ...record.run, clean: record.run.stale.length === 0, notebook },
});
