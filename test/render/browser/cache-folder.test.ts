import { homedir } from "node:os";
import { join } from "node:path";
import { describe, expect, it } from "vitest";
import { cacheFolder } from "../../../kernel-helpers/render/browser/cache-folder.js";
import { codeOf } from "../../code-of.js";

describe("the cache folder", () => {
  const HOME = "/home/u";
  it.each([
    ["linux", { HOME }, "/home/u/.cache/stillwell"],
    ["linux", { HOME, XDG_CACHE_HOME: "/c" }, "/c/stillwell"],
    ["linux", { HOME, XDG_CACHE_HOME: "c" }, "/home/u/.cache/stillwell"],
    ["darwin", { HOME, XDG_CACHE_HOME: "/c" }, "/home/u/Library/Caches/stillwell"],
    ["win32", { HOME, LOCALAPPDATA: "/l" }, join("/l", "stillwell")],
    ["linux", { HOME, STILLWELL_CACHE: "/own" }, "/own"],
  ] as const)("on %s with %j is %s", (platform, env, folder) => {
    expect(cacheFolder({ env, platform })).toBe(folder);
  });
  it("is found without HOME", () => {
    expect(cacheFolder({ env: {}, platform: "linux" })).toBe(join(homedir(), ".cache/stillwell"));
  });
  it("is refused if it is named by a relative path", () => {
    const env = { STILLWELL_CACHE: "cache" };
    expect(codeOf(() => cacheFolder({ env, platform: "linux" }))).toBe("bad-cache-folder");
  });
});
