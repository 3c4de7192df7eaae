import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { dirname, join } from "node:path";
import type ts from "@tslab/typescript-for-tslab";

export interface TypeResolutionParts {
  readonly compiler: typeof ts;
  readonly root: string;
  readonly cwd: string;
}

type Resolver = Required<
  Pick<
    ts.WatchCompilerHostOfFilesAndCompilerOptions<ts.BuilderProgram>,
    "resolveModuleNameLiterals"
  >
>;

/**
 * How the cells' compiler finds types: our name is always this package, other names are looked up
 * from the notebook's folder first and from ours where that fails.
 */
export function typeResolution({ compiler, root, cwd }: TypeResolutionParts) {
  const ours = join(root, typesIn(root));
  const home = join(root, "home.ts");
  const nodeTypes = findNodeTypes(root);

  const options = (given: ts.CompilerOptions): ts.CompilerOptions => ({
    ...given,
    moduleResolution: compiler.ModuleResolutionKind.Bundler,
    strictNullChecks: true,
    inlineSourceMap: true,
    // Only to give declarations a name that stands in any folder; names are found below.
    paths: { stillwell: [ours], "*": moduleFolders(root).map((folder) => `${folder}/*`) },
    types: ["node"],
    ...(nodeTypes === null
      ? {}
      : { typeRoots: [nodeTypes, ...(given.typeRoots ?? []).filter((r) => r.startsWith(cwd))] }),
  });

  const resolver = (
    host: ts.ModuleResolutionHost,
  ): Resolver & { hasInvalidatedResolutions: () => boolean } => ({
    resolveModuleNameLiterals: (literals, from, redirected, given, file) => {
      const { paths: _, ...plain } = given;
      return literals.map((literal) => {
        const name = literal.text;
        if (name === "stillwell")
          return {
            resolvedModule: {
              resolvedFileName: ours,
              extension: ".d.ts",
              isExternalLibraryImport: true,
            },
          };
        const mode = compiler.getModeForUsageLocation(file, literal);
        const look = (place: string): ts.ResolvedModuleWithFailedLookupLocations =>
          compiler.resolveModuleName(name, place, plain, host, undefined, redirected, mode);
        const found = look(from);
        if (found.resolvedModule || /^[./]/.test(name)) return found;
        const fallback = look(home);
        return fallback.resolvedModule ? fallback : found;
      });
    },
    // Without this every resolution of every file is made again for each cell.
    hasInvalidatedResolutions: () => false,
  });
  return { options, resolver };
}

function typesIn(root: string): string {
  const parsed: unknown = JSON.parse(readFileSync(join(root, "package.json"), "utf8"));
  const types = typeof parsed === "object" && parsed !== null && "types" in parsed && parsed.types;
  return typeof types === "string" ? types : "dist/index.d.ts";
}

function moduleFolders(root: string): string[] {
  return (createRequire(join(root, "package.json")).resolve.paths("x") ?? []).filter((folder) =>
    folder.endsWith("node_modules"),
  );
}

/** The folder that holds the types of Node, ours or those that tslab brings. */
function findNodeTypes(root: string): string | null {
  const own = createRequire(join(root, "package.json"));
  for (const from of [own, createRequire(own.resolve("tslab/package.json"))]) {
    try {
      return dirname(dirname(from.resolve("@types/node/package.json")));
    } catch {
      continue;
    }
  }
  return null;
}
