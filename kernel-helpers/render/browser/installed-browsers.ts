import { posix, win32 } from "node:path";
import type { Environment } from "./found-browser.js";

const linuxNames = [
  "chromium",
  "chromium-browser",
  "google-chrome-stable",
  "google-chrome",
  "chrome-headless-shell",
];

/** Where Chrome or Chromium stands when it is installed, best first; which of them exist is not asked. */
export function installedBrowserPaths({
  env,
  platform,
}: {
  env: Environment;
  platform: NodeJS.Platform;
}): readonly string[] {
  if (platform === "win32") return windowsPaths(env);
  if (platform === "darwin") return macPaths(env);
  const folders = [
    "/usr/bin",
    "/usr/local/bin",
    ...(env["PATH"] ?? "").split(":").filter((folder) => folder.startsWith("/")),
  ];
  return distinct([
    ...linuxNames.flatMap((name) => folders.map((folder) => posix.join(folder, name))),
    "/opt/google/chrome/chrome",
    "/snap/bin/chromium",
  ]);
}

function macPaths(env: Environment): readonly string[] {
  const folders = ["/Applications", ...(env["HOME"] ? [`${env["HOME"]}/Applications`] : [])];
  return ["Google Chrome", "Chromium"].flatMap((name) =>
    folders.map((folder) => `${folder}/${name}.app/Contents/MacOS/${name}`),
  );
}

function windowsPaths(env: Environment): readonly string[] {
  const folders = ["PROGRAMFILES", "PROGRAMFILES(X86)", "LOCALAPPDATA"].flatMap(
    (name) => env[name] ?? [],
  );
  return distinct(
    [["Google", "Chrome"], ["Chromium"]].flatMap((product) =>
      folders.map((folder) => win32.join(folder, ...product, "Application", "chrome.exe")),
    ),
  );
}

const distinct = (paths: readonly string[]): readonly string[] => [...new Set(paths)];
