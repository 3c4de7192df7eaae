import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { RenderError } from "../../../kernel-helpers/errors/index.js";
import { findBrowser, type FoundBrowser } from "../../../kernel-helpers/render/browser/index.js";

/** A folder of this test run's own, for the cache and for what browsers write. */
export const folder = mkdtempSync(join(tmpdir(), "stillwell-test-"));
export const removeFolder = (): void => rmSync(folder, { recursive: true, force: true });

// Browsers make their profiles here, so that a test can tell whether they were removed.
process.env["TMPDIR"] = folder;

export const env = { ...process.env, STILLWELL_CACHE: join(folder, "cache") };

/** The browsers of this machine: one on the system, if there is one, and the shipped one on Linux x64. */
export async function browsersHere(): Promise<readonly FoundBrowser[]> {
  const found: FoundBrowser[] = [];
  for (const kind of ["installed", "shipped"] as const)
    try {
      found.push(await findBrowser({ env, kinds: [kind] }));
    } catch (error) {
      if (!(error instanceof RenderError && error.code === "no-browser")) throw error;
    }
  return found;
}
