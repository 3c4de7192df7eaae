import { readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { NotebookError } from "../errors/index.js";

/** The folder of this package, found from where this file lies: in its sources or compiled. */
export function packageRoot(from = fileURLToPath(import.meta.url)): string {
  for (let folder = dirname(from); ; folder = dirname(folder)) {
    if (nameIn(folder) === "stillwell") return folder;
    if (folder !== dirname(folder)) continue;
    throw new NotebookError({
      code: "no-package",
      where: from,
      problem: "lies in no folder of the package stillwell",
      remedy: "install the package again",
    });
  }
}

function nameIn(folder: string): string | null {
  try {
    const parsed: unknown = JSON.parse(readFileSync(join(folder, "package.json"), "utf8"));
    return typeof parsed === "object" && parsed !== null && "name" in parsed
      ? String(parsed.name)
      : null;
  } catch {
    return null;
  }
}
