import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, it } from "vitest";
import {
  describeFailure,
  runNotebook,
  type RunNotebookParts,
  type RunOutcome,
} from "../../../kernel-helpers/notebook/index.js";
import { isAlive, scratchFolders, writeNotebook } from "./scratch.js";

const folders = scratchFolders();
interface Stored {
  readonly cells: readonly {
    readonly cell_type: string;
    readonly execution_count?: number | null;
    readonly outputs?: readonly { readonly text?: readonly string[] }[];
  }[];
}

let made = 0;
async function runCells(cells: readonly string[], parts: Partial<RunNotebookParts> = {}) {
  made += 1;
  const file = join(folders.work, `study-${made}.ipynb`);
  const output = join(folders.work, "out", `study-${made}.ipynb`);
  writeNotebook(file, cells);
  const before = readFileSync(file, "utf8");
  const outcome: RunOutcome = await runNotebook({ file, output, cellTimeoutMs: 30_000, ...parts });
  expect(readFileSync(file, "utf8")).toBe(before);
  const stored = JSON.parse(readFileSync(output, "utf8")) as Stored;
  const code = stored.cells.filter((cell) => cell.cell_type === "code");
  const texts = code.map(({ outputs = [] }) => outputs.flatMap(({ text = [] }) => text).join(""));
  expect(readdirSync(folders.temporary)).toEqual([]);
  const [pid = ""] = texts;
  if (/^\d+\n$/.test(pid)) expect(isAlive(Number(pid))).toBe(false);
  return { outcome, code, texts };
}
const sayPid = "console.log(process.pid)";

describe("a run from top to bottom", () => {
  it("stores outputs and counts in a copy, reports progress and brings back the drafts", async () => {
    const progress: unknown[] = [];
    const { outcome, code, texts } = await runCells(
      [
        sayPid,
        "",
        'import { mm } from "stillwell";\nconsole.log(process.env.STILLWELL_HEADLESS, process.env.OWN, process.cwd())',
        `\nReflect.set(globalThis, Symbol.for("stillwell.studies"), new Map([["a/b", { record: () => ({ n: mm(3) }) }]]));`,
      ],
      { env: { OWN: "mine" }, onProgress: (p) => progress.push(p) },
    );
    expect(outcome).toMatchObject({ status: "ok", failedCell: null, cellsRun: 3, codeCells: 4 });
    expect(outcome.drafts).toEqual(new Map([["a/b", { n: 0.003 }]]));
    expect(texts[1]).toBe("");
    expect(texts[2]).toBe(`1 mine ${folders.work}\n`);
    expect(code.map((cell) => cell.execution_count)).toEqual([1, null, 2, 3]);
    expect(progress).toMatchObject([
      { index: 1, of: 4, firstLine: sayPid },
      { index: 3, firstLine: 'import { mm } from "stillwell";' },
      { index: 4 },
    ]);
    expect(readdirSync(folders.work)).not.toContain(".stillwell");
    expect(describeFailure(outcome)).toBe("");
  });
  it("stops at the first cell that fails, and keeps no output of an earlier run", async () => {
    const { outcome, code, texts } = await runCells([
      'import { psi, type Quantity } from "stillwell";\nconst f = (d: Quantity<"length">) => d;',
      "const p = psi(5200);\nf(p);",
      "console.log('never')",
    ]);
    expect(outcome).toMatchObject({
      status: "failed",
      cellsRun: 1,
      failedCell: { index: 2, ename: "TypeMismatch", line: 2 },
    });
    expect(code.map((cell) => cell.execution_count)).toEqual([1, 2, null]);
    expect(texts[2]).toBe("");
    const said = describeFailure(outcome);
    expect(said).toContain("> 2 | f(p);");
    expect(said.split("expected a length, got an absolute pressure")).toHaveLength(2);
  });
});

describe("a run that is cut short", () => {
  it("by the limit of a cell is a timeout, even in a loop that no interrupt reaches", async () => {
    const { outcome } = await runCells([sayPid, "await null;\nfor (;;) {}"], {
      cellTimeoutMs: 900,
    });
    expect(outcome).toMatchObject({ status: "timeout", cellsRun: 1, failedCell: { index: 2 } });
    expect(describeFailure(outcome)).toContain("after its limit of 0.9 s");
  });
  it("by a kernel that dies says how it died, and has the drafts of the cells before", async () => {
    const { outcome } = await runCells([
      `${sayPid};\nReflect.set(globalThis, Symbol.for("stillwell.studies"), new Map([["s", { record: () => 1 }]]));`,
      "process.exit(3)",
    ]);
    expect(outcome).toMatchObject({ status: "died", failedCell: { index: 2 } });
    expect(outcome.drafts).toEqual(new Map([["s", 1]]));
    expect(describeFailure(outcome)).toContain("the kernel ended with exit code 3");
  });
  it("by its caller is interrupted, between cells, within one, and before the first", async () => {
    const within = new AbortController();
    const { outcome } = await runCells(
      [sayPid, "await new Promise(() => setInterval(() => 0, 1000))"],
      {
        signal: within.signal,
        onProgress: ({ index }) => index === 2 && setTimeout(() => within.abort(), 200),
      },
    );
    expect(outcome).toMatchObject({ status: "interrupted", cellsRun: 1, failedCell: { index: 2 } });
    const file = join(folders.work, "study-1.ipynb");
    const signal = AbortSignal.abort();
    expect(await runNotebook({ file, cellTimeoutMs: null, signal })).toMatchObject({
      status: "interrupted",
      cellsRun: 0,
      failedCell: null,
    });
  });
});

it("a file that cannot be read or written is named", async () => {
  const missing = join(folders.work, "missing.ipynb");
  await expect(runNotebook({ file: missing, cellTimeoutMs: null })).rejects.toMatchObject({
    name: "NotebookError",
    code: "unreadable",
    where: missing,
  });
  const file = join(folders.work, "study-1.ipynb");
  const output = join(file, "inside-a-file.ipynb");
  await expect(runNotebook({ file, output, cellTimeoutMs: 30_000 })).rejects.toMatchObject({
    code: "unwritable",
  });
  expect(readdirSync(folders.temporary)).toEqual([]);
});
