import { mkdirSync, readdirSync, readFileSync, renameSync, writeFileSync } from "node:fs";
import { dirname, join, resolve } from "node:path";
import { NotebookError } from "../errors/index.js";
import { draftId, draftsFolder } from "./draft-files.js";
import { parseIpynb, printIpynb, sourceOf, storedOutputs, type IpynbCell } from "./ipynb.js";
import { KernelClient, type CellResult } from "./kernel-client.js";
import { kernelCommand } from "./kernel-command.js";
import type { FailedCell, RunOutcome } from "./run-outcome.js";

export interface RunProgress {
  /** 1-based among the code cells. */
  readonly index: number;
  readonly of: number;
  readonly firstLine: string;
}

export interface RunNotebookParts {
  readonly file: string;
  /** Where a copy with the outputs is written; the notebook itself only when named here. */
  readonly output?: string;
  /** The longest that one cell may run; null for no limit. */
  readonly cellTimeoutMs: number | null;
  /** Variables for the cells, beside those of this process. */
  readonly env?: NodeJS.ProcessEnv;
  readonly signal?: AbortSignal;
  readonly onProgress?: (progress: RunProgress) => void;
}

const START_MS = 60_000;

/**
 * Runs the code cells of a notebook in order in a fresh kernel, in the notebook's own folder, and
 * stops at the first that fails. Studies find `STILLWELL_HEADLESS=1`; their last drafts are in the
 * outcome. Throws NotebookError when the file is no TypeScript notebook or no kernel starts.
 */
export async function runNotebook(parts: RunNotebookParts): Promise<RunOutcome> {
  const began = performance.now();
  const { file, output, signal } = parts;
  const notebook = parseIpynb(read(file), file);
  const codeCells = notebook.cells.filter((cell) => cell.cell_type === "code");
  // An output of an earlier run must not pass for one of this.
  for (const cell of codeCells) Object.assign(cell, { outputs: [], execution_count: null });
  const ended = (
    over: Pick<RunOutcome, "status" | "failedCell" | "cellsRun" | "drafts">,
  ): RunOutcome => ({
    file,
    codeCells: codeCells.length,
    ms: performance.now() - began,
    ...over,
  });
  if (output !== undefined) makeFolder(output);
  if (signal?.aborted)
    return ended({ status: "interrupted", failedCell: null, cellsRun: 0, drafts: new Map() });

  const kernel = await KernelClient.start({
    argv: kernelCommand(),
    cwd: dirname(resolve(file)),
    env: (folder) => ({
      ...parts.env,
      STILLWELL_HEADLESS: "1",
      STILLWELL_DRAFTS: draftsFolder(folder),
    }),
    startTimeoutMs: START_MS,
  });
  try {
    const over = await runCells(kernel, codeCells, parts);
    const drafts = readDrafts(draftsFolder(kernel.folder));
    if (output !== undefined) write(output, printIpynb(notebook));
    return ended({ ...over, drafts });
  } finally {
    await kernel.stop();
  }
}

async function runCells(
  kernel: KernelClient,
  cells: readonly IpynbCell[],
  { cellTimeoutMs, signal, onProgress }: RunNotebookParts,
): Promise<Pick<RunOutcome, "status" | "failedCell" | "cellsRun">> {
  let cellsRun = 0;
  for (const [i, cell] of cells.entries()) {
    const source = sourceOf(cell);
    const firstLine = source.split("\n").find((line) => line.trim() !== "");
    if (firstLine === undefined) continue;
    onProgress?.({ index: i + 1, of: cells.length, firstLine });
    const result = await kernel.execute(source, {
      timeoutMs: cellTimeoutMs,
      ...(signal ? { signal } : {}),
    });
    const outputs = storedOutputs(result.outputs);
    Object.assign(cell, { outputs, execution_count: result.executionCount });
    if (result.status !== "ok") {
      const why = { index: i + 1, source, ...reasonOf(result, kernel, cellTimeoutMs) };
      return { status: runStatus(result.status), failedCell: why, cellsRun };
    }
    cellsRun += 1;
  }
  return { status: "ok", failedCell: null, cellsRun };
}

/** A cell that is alone in its queue is never aborted, short of a kernel that breaks the rules. */
const runStatus = (status: Exclude<CellResult["status"], "ok">): RunOutcome["status"] =>
  status === "aborted" ? "failed" : status;

function reasonOf(
  { status, error }: CellResult,
  kernel: KernelClient,
  limitMs: number | null,
): Pick<FailedCell, "ename" | "evalue" | "traceback" | "line"> {
  const fatal = /^FATAL ERROR: (.*)$/m.exec(kernel.lastWords)?.[1];
  const own = {
    timeout: `the cell was stopped after its limit of ${(limitMs ?? 0) / 1000} s`,
    died: `the kernel ${kernel.ended ?? "ended"}${fatal ? ` (${fatal})` : ""}`,
    interrupted: "the run was interrupted",
  };
  if (status === "timeout" || status === "died" || status === "interrupted")
    return { ename: status, evalue: own[status], traceback: [own[status]], line: null };
  return (
    error ?? { ename: "Error", evalue: `the kernel answered ${status}`, traceback: [], line: null }
  );
}

function readDrafts(folder: string): Map<string, unknown> {
  const drafts = new Map<string, unknown>();
  for (const name of filesIn(folder)) {
    const id = draftId(name);
    if (id !== null)
      drafts.set(id, JSON.parse(readFileSync(join(folder, name), "utf8")) as unknown);
  }
  return drafts;
}

function filesIn(folder: string): string[] {
  try {
    return readdirSync(folder).sort();
  } catch {
    return [];
  }
}

function read(file: string): string {
  try {
    return readFileSync(file, "utf8");
  } catch (cause) {
    throw new NotebookError({
      code: "unreadable",
      where: file,
      problem: `cannot be read (${cause instanceof Error ? cause.message : String(cause)})`,
      expected: "a Jupyter notebook (.ipynb)",
      cause,
    });
  }
}

/** Done first: nobody wants to learn after a long run that it cannot be stored. */
function makeFolder(file: string): void {
  try {
    mkdirSync(dirname(resolve(file)), { recursive: true });
  } catch (cause) {
    throw unwritable(file, cause);
  }
}

/** Beside its place and then renamed, so that a reader never meets half a notebook. */
function write(file: string, text: string): void {
  const beside = `${file}.${process.pid}.tmp`;
  try {
    writeFileSync(beside, text);
    renameSync(beside, file);
  } catch (cause) {
    throw unwritable(file, cause);
  }
}

const unwritable = (file: string, cause: unknown): NotebookError =>
  new NotebookError({
    code: "unwritable",
    where: file,
    problem: `cannot be written (${cause instanceof Error ? cause.message : String(cause)})`,
    cause,
  });
