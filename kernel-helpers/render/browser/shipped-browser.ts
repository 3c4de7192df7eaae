import { randomBytes } from "node:crypto";
import { createReadStream, createWriteStream, existsSync, readFileSync } from "node:fs";
import { chmod, lstat, mkdir, readFile, readdir, rename, rm, writeFile } from "node:fs/promises";
import { dirname, join } from "node:path";
import { pipeline } from "node:stream/promises";
import { brotliDecompressSync, createBrotliDecompress } from "node:zlib";
import { RenderError } from "../../errors/index.js";
import { fontConfiguration } from "./font-configuration.js";
import type { Environment, FoundBrowser } from "./found-browser.js";
import { missingPackage, optionalPackage } from "./optional-package.js";
import { untar } from "./untar.js";

export const shippedBrowserPackage = "@sparticuz/chromium";
const staleAfter = 3_600_000; // ms

/** Only its data files are used: its own launcher switches protections off and unpacks to a shared folder. */
export function shippedBrowserFiles(): { readonly folder: string; readonly version: string } {
  const main = optionalPackage(shippedBrowserPackage);
  if (main === null) throw missingPackage(shippedBrowserPackage, "use the shipped browser");
  let folder = dirname(main);
  while (!existsSync(join(folder, "bin", "chromium.br"))) {
    const up = dirname(folder);
    if (up === folder)
      throw new RenderError({
        code: "bad-package",
        where: shippedBrowserPackage,
        problem: "holds no bin/chromium.br",
        remedy: "install it again",
      });
    folder = up;
  }
  const facts: unknown = JSON.parse(readFileSync(join(folder, "package.json"), "utf8"));
  const version =
    typeof facts === "object" && facts !== null && "version" in facts ? String(facts.version) : "0";
  return { folder: join(folder, "bin"), version };
}

/**
 * The browser that comes with the package, unpacked once per user and version (about 2 s, 206 MB).
 * Unpacking goes to a private folder that is then renamed, so that two processes at once, or one
 * that was stopped half-way, leave either a whole browser or none.
 */
export async function shippedBrowser({
  env,
  cache,
  signal,
}: {
  env: Environment;
  cache: string;
  signal?: AbortSignal;
}): Promise<FoundBrowser> {
  const source = shippedBrowserFiles();
  const final = join(cache, `chromium-${source.version}`);
  await mkdir(cache, { recursive: true, mode: 0o700 });
  if (!(await isWhole(final))) {
    await removeStale(cache);
    const making = `${final}.${process.pid}.${randomBytes(4).toString("hex")}.part`;
    try {
      await unpack({ from: source.folder, making, final, ...(signal ? { signal } : {}) });
      await putInPlace(making, final);
    } finally {
      await rm(making, { recursive: true, force: true });
    }
  }
  const lib = join(final, "lib");
  const others = env["LD_LIBRARY_PATH"];
  return {
    executable: join(final, "chromium"),
    kind: "shipped",
    version: source.version,
    headless: "shell",
    env: {
      ...env,
      LD_LIBRARY_PATH: others ? `${lib}:${others}` : lib,
      FONTCONFIG_FILE: join(final, "fonts.conf"),
    },
    args: [],
  };
}

interface Unpacking {
  readonly from: string;
  readonly making: string;
  readonly final: string;
  readonly signal?: AbortSignal;
}

async function unpack({ from, making, final, signal }: Unpacking): Promise<void> {
  await mkdir(making, { mode: 0o700 });
  const executable = join(making, "chromium");
  await pipeline(
    createReadStream(join(from, "chromium.br")),
    createBrotliDecompress(),
    createWriteStream(executable),
    signal ? { signal } : {},
  );
  await chmod(executable, 0o755);
  for (const name of ["al2023", "swiftshader", "fonts"]) {
    signal?.throwIfAborted();
    untar(brotliDecompressSync(await readFile(join(from, `${name}.tar.br`))), making);
  }
  // The archive's own configuration names folders of another system.
  await writeFile(
    join(making, "fonts.conf"),
    fontConfiguration({ fonts: join(final, "fonts"), cache: join(final, "fontconfig") }),
  );
  // Written last; its size check tells a browser that the disk lost part of.
  await writeFile(join(making, "whole.json"), JSON.stringify({ bytes: await size(executable) }));
}

async function putInPlace(making: string, final: string): Promise<void> {
  try {
    await rename(making, final);
  } catch (error) {
    if (await isWhole(final)) return; // another process was first
    const aside = `${making}.old`;
    try {
      await rename(final, aside);
      await rename(making, final);
    } catch {
      if (!(await isWhole(final)))
        throw new RenderError({
          code: "bad-cache-folder",
          where: final,
          problem: "the shipped browser cannot be put there",
          remedy: "free the folder, or set STILLWELL_CACHE to another",
          cause: error,
        });
    } finally {
      await rm(aside, { recursive: true, force: true });
    }
  }
}

/** Whether the folder holds a whole browser that nobody else could have written. */
async function isWhole(folder: string): Promise<boolean> {
  const found = await lstat(folder).catch(() => null);
  if (found === null) return false;
  const owner = process.getuid?.();
  if (!found.isDirectory() || (owner !== undefined && (found.uid !== owner || found.mode & 0o022)))
    throw new RenderError({
      code: "bad-cache-folder",
      where: folder,
      problem: "is not a folder that only you can write to, and a browser would be run from it",
      remedy: "remove it, or set STILLWELL_CACHE to a folder of your own",
    });
  try {
    const stamp: unknown = JSON.parse(await readFile(join(folder, "whole.json"), "utf8"));
    return (
      typeof stamp === "object" &&
      stamp !== null &&
      "bytes" in stamp &&
      stamp.bytes === (await size(join(folder, "chromium")))
    );
  } catch {
    return false;
  }
}

/** Removes what processes that were stopped half-way have left. */
async function removeStale(cache: string): Promise<void> {
  for (const name of await readdir(cache)) {
    if (!/^chromium-.*\.part(\.old)?$/.test(name)) continue;
    const path = join(cache, name);
    const found = await lstat(path).catch(() => null);
    if (found && Date.now() - found.mtimeMs > staleAfter)
      await rm(path, { recursive: true, force: true });
  }
}

const size = async (path: string): Promise<number> => (await lstat(path)).size;
