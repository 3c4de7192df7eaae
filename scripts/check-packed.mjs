// The packed package, installed in an empty folder, makes a study there, and packages it.
import { spawnSync } from "node:child_process";
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("..", import.meta.url));
const folder = mkdtempSync(join(tmpdir(), "stillwell-user-"));
const run = (command, args, cwd = folder) => {
  const r = spawnSync(command, args, {
    cwd,
    encoding: "utf8",
    shell: process.platform === "win32",
  });
  if (r.status !== 0)
    throw new Error(
      `${command} ${args.join(" ")} ended with ${r.status}\n${r.stdout}\n${r.stderr}`,
    );
  return r.stdout;
};
const must = (isTrue, what) => {
  if (!isTrue) throw new Error(`not so: ${what}`);
  console.log(`  ${what}`);
};
try {
  const packed = join(
    root,
    run(process.execPath, [join(root, "scripts", "pack.mjs")], root)
      .trim()
      .split("\n")
      .at(-1),
  );
  must(existsSync(packed), "the package packs");
  writeFileSync(join(folder, ".npmrc"), "ignore-scripts=true\nfund=false\naudit=false\n");
  run("npm", ["install", "--loglevel=error", packed]);
  must(
    existsSync(join(folder, "node_modules", "stillwell", "dist", "index.js")),
    "it installs in an empty folder",
  );
  run("npx", ["--no-install", "stillwell", "new", ".", "--from", `file:${packed}`]);
  must(existsSync(join(folder, "study.ipynb")), "it makes a study there");
  const json = JSON.parse(readFileSync(join(folder, "package.json"), "utf8"));
  must(json.overrides["danfojs-node"] !== undefined, "with the overrides in the root package.json");
  run("npm", ["install", "--loglevel=error"]);
  run("npm", ["start"]);
  for (const name of ["record.json", "package.html", "package.pdf"])
    must(existsSync(join(folder, "out", "first-study", name)), `it writes ${name}`);
  run("npx", ["--no-install", "stillwell", "replay", join("out", "first-study", "record.json")]);
  must(true, "the record replays");
  console.log("1 passed, 0 failed");
} finally {
  rmSync(folder, { recursive: true, force: true });
}
