// Sources under strict TypeScript; then what must be refused, against the built declarations, by both
// compilers that analysts meet: the current one, and the one inside the kernel, with old `node` resolution.
import { spawnSync } from "node:child_process";
import { fileURLToPath } from "node:url";

const root = fileURLToPath(new URL("..", import.meta.url));
const run = (compiler, ...args) => {
  const r = spawnSync(process.execPath, [`node_modules/${compiler}/bin/tsc`, ...args], {
    cwd: root,
    stdio: "inherit",
  });
  if (r.status !== 0) process.exit(r.status ?? 1);
};
run("typescript", "-p", "kernel-helpers", "--noEmit");
run("typescript", "-p", "test");
for (const compiler of ["typescript", "typescript-5.0"]) {
  console.log(`refusals, ${compiler}`);
  run(
    compiler,
    "--noEmit",
    "--strict",
    "--target",
    "es2022",
    "--module",
    "commonjs",
    "--moduleResolution",
    "node",
    "--skipLibCheck",
    "false",
    "--types",
    "node",
    "test/types/refused.test-d.ts",
  );
}
