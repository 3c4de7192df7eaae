import { accessSync, constants, statSync } from "node:fs";
import { basename } from "node:path";
import { RenderError } from "../../errors/index.js";
import { cacheFolder } from "./cache-folder.js";
import type { BrowserKind, Environment, FoundBrowser } from "./found-browser.js";
import { installedBrowserPaths } from "./installed-browsers.js";
import { shippedBrowser, shippedBrowserPackage } from "./shipped-browser.js";

export interface BrowserSearch {
  readonly env: Environment;
  /** The kinds that may be used; all of them, if not given. A browser that was named is never passed over. */
  readonly kinds?: readonly BrowserKind[];
  readonly platform?: NodeJS.Platform;
  readonly arch?: NodeJS.Architecture;
  readonly signal?: AbortSignal;
}

/**
 * The browser that prints: the one STILLWELL_BROWSER names, else Chrome or Chromium on the system,
 * else the shipped one (Linux on x64), unpacked into the user's cache on first use.
 *
 * @throws RenderError `bad-browser` if the named one cannot be run; `no-browser` if there is none.
 */
export async function findBrowser(search: BrowserSearch): Promise<FoundBrowser> {
  const { env, kinds = ["chosen", "installed", "shipped"], signal } = search;
  const { platform = process.platform, arch = process.arch } = search;
  const tried: string[] = [];

  const chosen = env["STILLWELL_BROWSER"];
  if (kinds.includes("chosen")) {
    if (chosen) return chosenBrowser(chosen, env);
    tried.push("STILLWELL_BROWSER (not set)");
  }
  if (kinds.includes("installed")) {
    const path = installedBrowserPaths({ env, platform }).find(isExecutable);
    if (path !== undefined) return onSystem("installed", path, env);
    tried.push("Chrome or Chromium on this system (not found)");
  }
  if (kinds.includes("shipped")) {
    if (platform !== "linux" || arch !== "x64")
      tried.push(`the shipped browser (for Linux on x64, not for ${platform} on ${arch})`);
    else
      try {
        const cache = cacheFolder({ env, platform });
        return await shippedBrowser({ env, cache, ...(signal ? { signal } : {}) });
      } catch (error) {
        if (!(error instanceof RenderError && error.code === "missing-package")) throw error;
        tried.push(`the shipped browser (package ${shippedBrowserPackage} is not installed)`);
      }
  }
  throw new RenderError({
    code: "no-browser",
    where: "browser",
    problem: `none was found to print with; tried in this order: ${tried.join(", ")}`,
    remedy:
      "install Chrome or Chromium, or set STILLWELL_BROWSER to the path of its program, or " +
      `(Linux on x64) run npm install ${shippedBrowserPackage}`,
  });
}

function chosenBrowser(path: string, env: Environment): FoundBrowser {
  if (isExecutable(path)) return onSystem("chosen", path, env);
  throw new RenderError({
    code: "bad-browser",
    where: "STILLWELL_BROWSER",
    problem: `"${path}" is not a program that can be run`,
    expected: "the path of the program of Chrome or Chromium",
    remedy: "correct it, or remove it to have a browser searched for",
  });
}

const onSystem = (kind: BrowserKind, executable: string, env: Environment): FoundBrowser => ({
  executable,
  kind,
  version: null,
  headless: /headless[-_]shell/.test(basename(executable)) ? "shell" : true,
  env,
  args: [],
});

function isExecutable(path: string): boolean {
  try {
    accessSync(path, constants.X_OK);
    return statSync(path).isFile();
  } catch {
    return false;
  }
}
