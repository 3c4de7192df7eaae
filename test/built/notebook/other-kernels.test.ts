import { mkdirSync, symlinkSync } from "node:fs";
import { createRequire } from "node:module";
import { dirname, join } from "node:path";
import { expect, it } from "vitest";
import { KernelClient } from "../../../kernel-helpers/notebook/index.js";
import { packageRoot } from "../../../kernel-helpers/notebook/package-root.js";
import { scratchFolders } from "./scratch.js";

const folders = scratchFolders();

it("the compiled package loads in the stock kernel, with its types, over TCP", async () => {
  mkdirSync(join(folders.work, "node_modules"));
  symlinkSync(packageRoot(), join(folders.work, "node_modules", "stillwell"));
  const tslab = dirname(createRequire(import.meta.url).resolve("tslab/package.json"));
  const kernel = await KernelClient.start({
    argv: [
      process.execPath,
      join(tslab, "bin", "tslab"),
      "kernel",
      "--config-path",
      "{connection_file}",
    ],
    cwd: folders.work,
    transport: "tcp",
    startTimeoutMs: 60_000,
  });
  try {
    const run = (code: string) => kernel.execute(code, { timeoutMs: 30_000 });
    const first = await run(
      'import { ergun, mm, psi, type Quantity } from "stillwell";\nconsole.log(mm(3), ergun.id);',
    );
    expect(first).toMatchObject({ status: "ok" });
    expect(JSON.stringify(first.outputs)).toContain("0.003 ergun-1952");
    const wrong = await run('console.log("ran"); const q: Quantity<"length"> = psi(3);');
    expect(wrong.status).toBe("failed");
    expect(JSON.stringify(wrong.outputs)).toContain("is not assignable to type");
    expect(JSON.stringify(wrong.outputs)).not.toContain('"ran');
  } finally {
    await kernel.stop();
  }
});
