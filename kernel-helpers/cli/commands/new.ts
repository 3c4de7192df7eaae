import { existsSync, mkdirSync, readdirSync, readFileSync, statSync } from "node:fs";
import { basename, join, relative, resolve } from "node:path";
import { InputError } from "../../errors/index.js";
import { readJsonFile, writeFileAtomic } from "../../files/index.js";
import { packageRoot } from "../../notebook/package-root.js";
import type { CommandContext } from "./command-context.js";

export interface NewOptions {
  /** What the study depends on: a version, a folder or a packed file; the running package when left out. */
  readonly from?: string;
}
interface PackageJson {
  [key: string]: unknown;
}

/** `stillwell new`: a study folder that runs. Nothing that is there already is overwritten. */
export function newStudy(
  folder: string,
  options: NewOptions,
  { terminal }: CommandContext,
): number {
  const root = packageRoot();
  if (existsSync(folder) && !statSync(folder).isDirectory())
    throw new InputError({
      code: "not-a-folder",
      where: folder,
      problem: "is a file",
      expected: "a folder, or a name for a new one",
    });
  mkdirSync(folder, { recursive: true });
  const own = readJsonFile(join(root, "package.json"), "package.json of stillwell") as PackageJson;
  const written: string[] = [];
  const put = (name: string, data: string | Buffer): void => {
    const file = join(folder, name);
    if (existsSync(file)) return;
    mkdirSync(join(file, ".."), { recursive: true });
    writeFileAtomic(file, data);
    written.push(name);
  };
  const starter = join(root, "starter");
  for (const name of readdirSync(starter))
    put(/^(gitignore|npmrc)$/.test(name) ? `.${name}` : name, readFileSync(join(starter, name)));
  const stub = join(root, "vendor", "tf-stub");
  for (const name of readdirSync(stub))
    put(join("vendor", "tf-stub", name), readFileSync(join(stub, name)));

  const file = join(folder, "package.json");
  const before = existsSync(file)
    ? (readJsonFile(file, file) as PackageJson)
    : { name: nameOf(folder), private: true };
  writeFileAtomic(
    file,
    `${JSON.stringify(withStillwell(before, own, options.from ?? fallback(root, folder)), null, 2)}\n`,
  );
  written.push("package.json");

  terminal.out(`${folder}: ${written.join(", ")}`);
  terminal.out(`Next: cd ${folder}, npm install, npm start.`);
  return 0;
}

/** An installed copy is named by what installed it; a checkout by its folder. */
function fallback(root: string, folder: string): string {
  const own = readJsonFile(join(root, "package.json"), "package.json of stillwell") as {
    version: string;
  };
  return root.split(/[\\/]/).includes("node_modules")
    ? own.version
    : `file:${relative(resolve(folder), root).replaceAll("\\", "/")}`;
}

/** Adds what a study needs; what is there already stays. Overrides count only in a root package.json. */
function withStillwell(before: PackageJson, own: PackageJson, from: string): PackageJson {
  const peers = own["peerDependencies"] as Record<string, string>;
  const merge = (key: string, add: Record<string, unknown>): Record<string, unknown> => ({
    ...add,
    ...((before[key] as Record<string, unknown> | undefined) ?? {}),
  });
  return {
    ...before,
    scripts: merge("scripts", { start: "stillwell package study.ipynb --out out" }),
    dependencies: merge("dependencies", {
      ...peers,
      "@tensorflow/tfjs-node": "file:./vendor/tf-stub",
      stillwell: from,
    }),
    overrides: merge("overrides", {
      "danfojs-node": {
        xlsx: "npm:@e965/xlsx@^0.20.3",
        "@tensorflow/tfjs-node": "$@tensorflow/tfjs-node",
        request: "npm:@cypress/request@^3.0.9",
      },
    }),
    allowScripts: merge("allowScripts", { zeromq: false, puppeteer: false, "core-js": false }),
  };
}

const nameOf = (folder: string): string =>
  basename(resolve(folder))
    .toLowerCase()
    .replace(/[^a-z0-9._-]+/g, "-")
    .replace(/^[._-]+/, "") || "study";
