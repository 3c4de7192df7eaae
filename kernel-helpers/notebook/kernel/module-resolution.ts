import Module, { createRequire } from "node:module";
import { join } from "node:path";

/** The hook that Node's loader offers, though not in its documentation. */
interface Loader {
  _resolveFilename: (id: string, ...rest: readonly unknown[]) => string;
}

/**
 * What a cell loads at run time: our name is always this package, from any folder; other packages
 * are looked up from the notebook's folder first and from ours where that fails.
 */
export function resolveFromPackage(name: string, root: string): void {
  const loader = Module as unknown as Loader;
  const own = createRequire(join(root, "package.json"));
  const before = loader._resolveFilename;
  let isOwnLookup = false;
  const fromPackage = (id: string): string => {
    isOwnLookup = true;
    try {
      return own.resolve(id);
    } finally {
      isOwnLookup = false;
    }
  };
  loader._resolveFilename = function (this: unknown, id, ...rest) {
    if (isOwnLookup) return before.call(this, id, ...rest);
    if (id === name || id.startsWith(`${name}/`)) return fromPackage(id);
    try {
      return before.call(this, id, ...rest);
    } catch (error) {
      if (!isNotFound(error) || /^[./]/.test(id)) throw error;
      try {
        return fromPackage(id);
      } catch {
        // The first search names the notebook's own folder.
        throw error;
      }
    }
  };
}

const isNotFound = (error: unknown): boolean =>
  error instanceof Error && "code" in error && error.code === "MODULE_NOT_FOUND";
