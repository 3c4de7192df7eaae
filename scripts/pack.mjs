// Stages what a user of the package needs, its templates and licence included, and packs it into out/.
import { spawnSync } from "node:child_process";
import { cpSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("..", import.meta.url));
const helpers = join(root, "kernel-helpers");
const stage = mkdtempSync(join(tmpdir(), "stillwell-pack-"));
try {
  for (const part of ["bin", "dist", "starter", "vendor"])
    cpSync(join(helpers, part), join(stage, part), { recursive: true });
  rmSync(join(stage, "dist", ".ready"), { force: true });
  rmSync(join(stage, "dist", ".tsbuildinfo"), { force: true });
  cpSync(join(root, "templates"), join(stage, "templates"), { recursive: true });
  for (const file of ["LICENSE", "README.md", "CHANGELOG.md"])
    cpSync(join(root, file), join(stage, file));
  const { devDependencies: _, ...json } = JSON.parse(
    readFileSync(join(helpers, "package.json"), "utf8"),
  );
  writeFileSync(
    join(stage, "package.json"),
    `${JSON.stringify({ ...json, files: ["bin", "dist", "starter", "vendor", "templates"] }, null, 2)}\n`,
  );
  const out = join(root, "out");
  mkdirSync(out, { recursive: true });
  const npm = process.env.npm_execpath;
  const args = ["pack", "--loglevel=error", "--pack-destination", out];
  const r = npm
    ? spawnSync(process.execPath, [npm, ...args], { cwd: stage, encoding: "utf8" })
    : spawnSync("npm", args, { cwd: stage, encoding: "utf8", shell: process.platform === "win32" });
  if (r.status !== 0) throw new Error(r.stderr);
  console.log(join("out", r.stdout.trim().split("\n").at(-1)));
} finally {
  rmSync(stage, { recursive: true, force: true });
}
