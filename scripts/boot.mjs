// What makes a fresh clone ready. It imports only node's own modules, since nothing else is there yet.
import { spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { existsSync, mkdirSync, readFileSync, readdirSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("..", import.meta.url));
const [major = 0, minor = 0] = process.versions.node.split(".").map(Number);
if (major < 20 || (major === 20 && minor < 19) || (major === 22 && minor < 12) || major === 21) {
  console.error(`Node 20.19 or newer (or 22.12 or newer) is needed; this is ${process.version}.`);
  process.exit(1);
}

const run = (file, args, what) => {
  const r = spawnSync(process.execPath, [file, ...args], { cwd: root, stdio: "inherit" });
  if (r.status === 0) return;
  console.error(`${what} failed${r.status === null ? ` (${r.signal ?? r.error?.message})` : ""}.`);
  process.exit(r.status ?? 1);
};

/** Does the work unless the stamp already holds this hash; the stamp is written only on success. */
const once = (stamp, hash, say, work) => {
  const have = existsSync(stamp) ? readFileSync(stamp, "utf8") : "";
  if (have === hash) return;
  console.log(say(have !== ""));
  rmSync(stamp, { force: true });
  work();
  mkdirSync(join(stamp, ".."), { recursive: true });
  writeFileSync(stamp, hash);
};

const sources = (dir) =>
  readdirSync(dir, { withFileTypes: true })
    .filter((e) => !["dist", "node_modules"].includes(e.name))
    .flatMap((e) => (e.isDirectory() ? sources(join(dir, e.name)) : [join(dir, e.name)]))
    .sort();
const hashOf = (files, ...more) => {
  const h = createHash("sha256");
  for (const f of files) h.update(f.slice(root.length)).update(readFileSync(f));
  for (const m of more) h.update(m);
  return h.digest("hex");
};

const lock = join(root, "package-lock.json");
const abi = `${process.platform} ${process.arch} ${process.versions.modules}`;
once(
  join(root, "node_modules", ".ready"),
  hashOf([lock], abi),
  (again) =>
    again
      ? "The lock file has changed: installing again …"
      : "First run: installing packages (a minute or two) …",
  () => {
    const npm = process.env.npm_execpath;
    const args = ["ci", "--no-audit", "--no-fund", "--loglevel=error"];
    if (npm) return run(npm, args, "Installing");
    const r = spawnSync("npm", args, {
      cwd: root,
      stdio: "inherit",
      shell: process.platform === "win32",
    });
    if (r.status !== 0) process.exit(r.status ?? 1);
  },
);
const helpers = join(root, "kernel-helpers");
once(
  join(helpers, "dist", ".ready"),
  hashOf(sources(helpers), readFileSync(lock), abi),
  () => "Building …",
  () => run(join(root, "scripts", "build.mjs"), [], "Building"),
);

const [what, ...args] = process.argv.slice(2);
if (what === "test")
  run(join(root, "node_modules", "vitest", "vitest.mjs"), ["run", ...args], "Testing");
if (what === "start") run(join(root, "scripts", "start.mjs"), args, "The sample run");
