import { readFileSync, readdirSync } from "node:fs";
import { join, relative, sep } from "node:path";
import { fileURLToPath } from "node:url";
import { sourceFile, type SourceFile } from "./source-file.js";

export const root = fileURLToPath(new URL("../..", import.meta.url));

const NOT_OURS = new Set(["dist", "vendor", "node_modules", "out"]);

/** Every TypeScript file below a folder of the repository, relative to it. */
export function pathsBelow(folder: string): string[] {
  const below = (dir: string): string[] =>
    readdirSync(dir, { withFileTypes: true }).flatMap((e) => {
      if (e.isDirectory()) return NOT_OURS.has(e.name) ? [] : below(join(dir, e.name));
      return e.name.endsWith(".ts") ? [join(dir, e.name)] : [];
    });
  return below(join(root, folder))
    .map((p) => relative(join(root, folder), p).split(sep).join("/"))
    .sort();
}

export const read = (folder: string, path: string): string =>
  readFileSync(join(root, folder, path), "utf8");

export const sources = (): SourceFile[] =>
  pathsBelow("kernel-helpers").map((path) => sourceFile(path, read("kernel-helpers", path)));
