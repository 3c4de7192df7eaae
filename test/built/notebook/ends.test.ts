import { spawn } from "node:child_process";
import { readdirSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, it } from "vitest";
import { kernelCommand, KernelClient } from "../../../kernel-helpers/notebook/index.js";
import { packageRoot } from "../../../kernel-helpers/notebook/package-root.js";
import { isAlive, scratchFolders, until } from "./scratch.js";

const folders = scratchFolders();
const start = (argv: readonly string[] = kernelCommand()): Promise<KernelClient> =>
  KernelClient.start({ argv, cwd: folders.work, startTimeoutMs: 60_000 });
const left = (): string[] => readdirSync(folders.temporary);

describe("a kernel that ends by itself", () => {
  it("is told at once to the cell that ran and to those after it; nothing is left", async () => {
    const kernel = await start();
    // The limit of a cell does not end a kernel that an interrupt reaches.
    expect((await kernel.execute("for (;;) {}", { timeoutMs: 400 })).status).toBe("timeout");
    expect((await kernel.execute("1", { timeoutMs: 20_000 })).status).toBe("ok");
    const result = await kernel.execute("process.exit(3)", { timeoutMs: 20_000 });
    expect(result.status).toBe("died");
    expect(kernel.ended).toBe("ended with exit code 3");
    expect((await kernel.execute("1", { timeoutMs: null })).status).toBe("died");
    await expect(kernel.request("kernel_info", {}, 5000)).rejects.toMatchObject({
      code: "no-answer",
    });
    await kernel.stop();
    expect(left()).toEqual([]);
  });
  it("is an error with its last words when it never answered", async () => {
    const argv = [process.execPath, "-e", "console.error('out of order'); process.exit(1)"];
    await expect(start(argv)).rejects.toMatchObject({
      code: "kernel-did-not-start",
      problem: "ended with exit code 1: out of order",
    });
    await expect(start([join(folders.work, "no-such-program")])).rejects.toThrow(/ENOENT/);
    const silent = [process.execPath, "-e", "setInterval(() => 0, 1000)"];
    await expect(
      KernelClient.start({ argv: silent, cwd: folders.work, startTimeoutMs: 300 }),
    ).rejects.toMatchObject({ code: "kernel-did-not-start" });
    expect(left()).toEqual([]);
  });
});

describe("stopping", () => {
  it("ends a kernel that does not listen, with what its cells started", async () => {
    const kernel = await start();
    const { outputs } = await kernel.execute(
      `import { spawn } from "node:child_process";
const sleeper = spawn(process.execPath, ["-e", "setInterval(() => 0, 1000)"], { stdio: "ignore" });
sleeper.pid`,
      { timeoutMs: 20_000 },
    );
    const [output] = outputs;
    const sleeper =
      output?.output_type === "execute_result" ? Number(output.data["text/plain"]) : 0;
    expect(isAlive(sleeper)).toBe(true);
    const busy = kernel.execute("await null; for (;;) {}", { timeoutMs: null });
    await new Promise((resolve) => setTimeout(resolve, 300));
    await Promise.all([kernel.stop(), kernel.stop()]);
    expect((await busy).status).toBe("died");
    expect(await until(() => !isAlive(sleeper), 2000)).toBe(true);
    expect(left()).toEqual([]);
  });
});

describe("when the program that started a kernel ends", () => {
  const compiled = (file: string): string =>
    JSON.stringify(new URL(`file://${packageRoot()}/dist/notebook/${file}`).href);
  const idle = `
    import { KernelProcess } from ${compiled("kernel-process.js")};
    const argv = [process.execPath, "-e", "setInterval(() => 0, 1000)"];
    const kernel = await KernelProcess.start({ argv, cwd: process.cwd() });`;
  // A kernel that computes for ever must find out by itself.
  const busy = `
    import { KernelClient, kernelCommand } from ${compiled("index.js")};
    const argv = kernelCommand();
    const kernel = await KernelClient.start({ argv, cwd: process.cwd(), startTimeoutMs: 60000 });
    void kernel.execute("await null; for (;;) {}", { timeoutMs: null });
    await new Promise((resolve) => setTimeout(resolve, 300));`;
  const endings = [
    { how: "by Ctrl-C", program: idle, ending: "", signal: "SIGINT" },
    {
      how: "by an exception",
      program: idle,
      ending: "throw new Error('unforeseen')",
      signal: null,
    },
    { how: "by its own exit", program: idle, ending: "process.exit(0)", signal: null },
    { how: "by SIGKILL, with the kernel busy", program: busy, ending: "", signal: "SIGKILL" },
  ] as const;
  it("however it ends, the kernel and its folder are gone too", async () => {
    const seen = endings.map(async ({ how, program, ending, signal }) => {
      const text = `${program}\nconsole.log(kernel.pid); setInterval(() => 0, 1000);\n${ending}`;
      const child = spawn(process.execPath, ["--input-type=module", "-e", text], {
        cwd: folders.work,
        stdio: ["ignore", "pipe", "ignore"],
      });
      const ended = new Promise((resolve) => child.on("exit", (_code, by) => resolve(by)));
      const pid = await new Promise<number>((resolve) =>
        child.stdout.on("data", (bytes: Buffer) => resolve(Number(bytes.toString()))),
      );
      expect(pid).toBeGreaterThan(0);
      if (signal) child.kill(signal);
      expect(await ended).toBe(signal);
      return { how, isGone: await until(() => !isAlive(pid), 5000) };
    });
    expect(await Promise.all(seen)).toEqual(endings.map(({ how }) => ({ how, isGone: true })));
    expect(await until(() => left().length === 0, 2000)).toBe(true);
  });
});
