// Compiles kernel-helpers/ into kernel-helpers/dist/ from scratch, so that no file of a deleted source stays behind.
import { spawnSync } from "node:child_process";
import { rmSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("..", import.meta.url));
rmSync(join(root, "kernel-helpers", "dist"), { recursive: true, force: true });
// tslab's own compiler owns node_modules/.bin/tsc, so ours is called by path.
const tsc = join(root, "node_modules", "typescript", "bin", "tsc");
const r = spawnSync(process.execPath, [tsc, "-p", join(root, "kernel-helpers")], {
  stdio: "inherit",
});
process.exit(r.status ?? 1);
