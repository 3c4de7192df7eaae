import { homedir } from "node:os";
import { isAbsolute, join } from "node:path";
import { RenderError } from "../../errors/index.js";
import type { Environment } from "./found-browser.js";

/** The folder of this user in which unpacked files are kept between runs. */
export function cacheFolder({
  env,
  platform,
}: {
  env: Environment;
  platform: NodeJS.Platform;
}): string {
  const chosen = env["STILLWELL_CACHE"];
  if (chosen) {
    if (isAbsolute(chosen)) return chosen;
    throw new RenderError({
      code: "bad-cache-folder",
      where: "STILLWELL_CACHE",
      problem: `is the relative path "${chosen}"`,
      expected: "an absolute path",
    });
  }
  const home = env["HOME"] ?? homedir();
  if (platform === "win32")
    return join(env["LOCALAPPDATA"] ?? join(home, "AppData", "Local"), "stillwell");
  if (platform === "darwin") return join(home, "Library", "Caches", "stillwell");
  const xdg = env["XDG_CACHE_HOME"];
  // The base directory specification says that a relative path is to be ignored.
  return join(xdg && isAbsolute(xdg) ? xdg : join(home, ".cache"), "stillwell");
}
