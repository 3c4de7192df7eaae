import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { dirname, join } from "node:path";
import type ts from "@tslab/typescript-for-tslab";

export interface TypeResolutionParts {
  readonly compiler: typeof ts;
  readonly root: string;
  readonly cwd: string;
}

export interface TypeResolution {
  /** The compiler options of tslab, with ours. */
  readonly options: (given: ts.CompilerOptions) => ts.CompilerOptions;
  /** What is put over the functions of tslab's compiler host. */
  readonly resolver: (host: ts.ModuleResolutionHost) => Resolver;
}
interface Resolver {
  readonly resolveModuleNameLiterals: ts.CompilerHost["resolveModuleNameLiterals"];
  readonly hasInvalidatedResolutions: (file: string) => boolean;
}
type Resolution = ts.ResolvedModuleWithFailedLookupLocations;

/**
 * How the cells' compiler finds types: our name is always this package, other names are looked up
 * from the notebook's folder first and from ours where that fails.
 */
export function typeResolution(parts: TypeResolutionParts): TypeResolution {
  const { compiler } = parts;
  const [root, cwd] = [slashed(parts.root), slashed(parts.cwd)];
  const ours: Resolution = {
    resolvedModule: {
      resolvedFileName: `${root}/${typesIn(root)}`,
      extension: compiler.Extension.Dts,
      isExternalLibraryImport: true,
    },
  };
  const nodeTypes = findNodeTypes(root);

  const options = (given: ts.CompilerOptions): ts.CompilerOptions => ({
    ...given,
    moduleResolution: compiler.ModuleResolutionKind.Bundler,
    strictNullChecks: true,
    inlineSourceMap: true,
    // Only so that the types of declarations have a name that stands in any folder.
    paths: {
      stillwell: [`${root}/${typesIn(root)}`],
      "*": moduleFolders(root).map((folder) => `${folder}/*`),
    },
    types: ["node"],
    typeRoots: [
      ...(nodeTypes === null ? [] : [nodeTypes]),
      ...(given.typeRoots ?? []).filter((r) => nodeTypes === null || r.startsWith(cwd)),
    ],
  });

  const isInstalled = (file: string): boolean =>
    file.includes("/node_modules/") || file.startsWith(`${root}/dist/`);
  const resolver = (host: ts.ModuleResolutionHost): Resolver => {
    // What an installed package imports does not change while a kernel lives.
    const lasting = new Map<string, Resolution>();
    return {
      resolveModuleNameLiterals: (literals, from, redirected, given, file) => {
        const { paths: _, ...plain } = given;
        const lasts = isInstalled(from);
        return literals.map((literal) => {
          const name = literal.text;
          if (name === "stillwell") return ours;
          const mode = compiler.getModeForUsageLocation(file, literal);
          const key = `${from}\n${name}\n${mode ?? ""}`;
          const kept = lasts ? lasting.get(key) : undefined;
          if (kept) return kept;
          const look = (place: string): Resolution =>
            compiler.resolveModuleName(name, place, plain, host, undefined, redirected, mode);
          const near = look(from);
          const isFound = near.resolvedModule !== undefined || /^[./]/.test(name);
          const home = isFound ? near : look(`${root}/home.ts`);
          const found = home.resolvedModule ? home : near;
          if (lasts) lasting.set(key, found);
          return found;
        });
      },
      // Without this the imports of every file are looked up again for each cell.
      hasInvalidatedResolutions: (file) => !isInstalled(file),
    };
  };
  return { options, resolver };
}

/** The compiler writes paths with slashes on every system. */
const slashed = (path: string): string => path.replaceAll("\\", "/");

function typesIn(root: string): string {
  const parsed: unknown = JSON.parse(readFileSync(join(root, "package.json"), "utf8"));
  const types = typeof parsed === "object" && parsed !== null && "types" in parsed && parsed.types;
  return typeof types === "string" ? types : "dist/index.d.ts";
}

function moduleFolders(root: string): string[] {
  return (createRequire(join(root, "package.json")).resolve.paths("x") ?? [])
    .filter((folder) => folder.endsWith("node_modules"))
    .map(slashed);
}

/** The folder that holds the types of Node, ours or those that tslab brings. */
function findNodeTypes(root: string): string | null {
  const own = createRequire(join(root, "package.json"));
  for (const from of [own, createRequire(own.resolve("tslab/package.json"))]) {
    try {
      return slashed(dirname(dirname(from.resolve("@types/node/package.json"))));
    } catch {
      continue;
    }
  }
  return null;
}
