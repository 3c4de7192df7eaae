import { describe, expect, it } from "vitest";
import { installedBrowserPaths } from "../../../kernel-helpers/render/browser/installed-browsers.js";

describe("the places of an installed browser", () => {
  it("on Linux are the usual ones, then the folders of PATH, of which relative ones are left out", () => {
    const paths = installedBrowserPaths({ env: { PATH: "/opt/b:.:/usr/bin" }, platform: "linux" });
    expect(paths[0]).toBe("/usr/bin/chromium");
    expect(paths).toContain("/opt/b/google-chrome");
    expect(paths.every((p) => p.startsWith("/"))).toBe(true);
    expect(new Set(paths).size).toBe(paths.length);
  });
  it("on macOS are the system's applications and the user's", () => {
    const paths = installedBrowserPaths({ env: { HOME: "/Users/u" }, platform: "darwin" });
    expect(paths[0]).toBe("/Applications/Google Chrome.app/Contents/MacOS/Google Chrome");
    expect(paths).toContain("/Users/u/Applications/Chromium.app/Contents/MacOS/Chromium");
  });
  it("on Windows are the folders that the system names", () => {
    const env = { PROGRAMFILES: "C:\\Program Files", LOCALAPPDATA: "C:\\Users\\u\\AppData\\Local" };
    const paths = installedBrowserPaths({ env, platform: "win32" });
    expect(paths[0]).toBe("C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe");
    expect(paths).toContain("C:\\Users\\u\\AppData\\Local\\Chromium\\Application\\chrome.exe");
    expect(installedBrowserPaths({ env: {}, platform: "win32" })).toEqual([]);
  });
});
