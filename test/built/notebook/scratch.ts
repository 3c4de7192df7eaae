import { mkdirSync, mkdtempSync, readdirSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, expect } from "vitest";

/**
 * A folder outside the repository, with no node_modules above it, and a private folder for
 * temporary files, so that a test can see what is left there. Both are gone after the file's tests.
 */
export function scratchFolders(): { readonly work: string; readonly temporary: string } {
  const folders = { work: "", temporary: "" };
  const before = process.env["TMPDIR"];
  let all = "";
  beforeAll(() => {
    all = mkdtempSync(join(tmpdir(), "nb-"));
    folders.work = join(all, "work");
    folders.temporary = join(all, "t");
    mkdirSync(folders.work);
    mkdirSync(folders.temporary);
    process.env["TMPDIR"] = folders.temporary;
  });
  afterAll(() => {
    if (before === undefined) delete process.env["TMPDIR"];
    else process.env["TMPDIR"] = before;
    const left = readdirSync(folders.temporary);
    rmSync(all, { recursive: true });
    expect(left).toEqual([]);
  });
  return folders;
}

export function isAlive(pid: number): boolean {
  try {
    process.kill(pid, 0);
    return true;
  } catch {
    return false;
  }
}

/** Waits for something to become true; the assertion that follows fails if it never does. */
export async function until(holds: () => boolean, limitMs: number): Promise<boolean> {
  const end = Date.now() + limitMs;
  while (!holds() && Date.now() < end) await new Promise((resolve) => setTimeout(resolve, 20));
  return holds();
}

/** Writes a notebook of these code cells. */
export function writeNotebook(file: string, cells: readonly string[]): void {
  const code = cells.map((source, i) => ({
    cell_type: "code",
    id: `c${i}`,
    source,
    metadata: {},
    execution_count: 99,
    outputs: [{ output_type: "stream", name: "stdout", text: "of an earlier run" }],
  }));
  const words = { cell_type: "markdown", id: "m0", source: ["# A\n", "study"], metadata: {} };
  const metadata = { kernelspec: { name: "stillwell", language: "typescript" } };
  const whole = { nbformat: 4, nbformat_minor: 5, metadata, cells: [words, ...code] };
  writeFileSync(file, JSON.stringify(whole));
}
