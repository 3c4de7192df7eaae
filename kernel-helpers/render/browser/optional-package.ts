import { createRequire } from "node:module";
import { join } from "node:path";
import { RenderError } from "../../errors/index.js";

/** The main file of an optional package: beside this one, or in the project that is being worked in. */
export function optionalPackage(name: string, cwd: string = process.cwd()): string | null {
  for (const from of [import.meta.url, join(cwd, "package.json")]) {
    try {
      return createRequire(from).resolve(name);
    } catch (error) {
      if (!isMissing(error)) throw error;
    }
  }
  return null;
}

export function missingPackage(name: string, needed: string): RenderError {
  return new RenderError({
    code: "missing-package",
    where: name,
    problem: `is not installed; it is needed to ${needed}`,
    remedy: `install it in the project: npm install ${name}`,
  });
}

const isMissing = (error: unknown): boolean =>
  error instanceof Error &&
  "code" in error &&
  (error.code === "MODULE_NOT_FOUND" || error.code === "ERR_PACKAGE_PATH_NOT_EXPORTED");
