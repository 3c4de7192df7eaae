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

describe("a cell past its limit", () => {
  it("is interrupted; the kernel lives on where that is enough and is killed where it is not", async () => {
    const kernel = await start();
    const pid = kernel.pid ?? 0;
    expect((await kernel.execute("for (;;) {}", { timeoutMs: 500 })).status).toBe("timeout");
    expect((await kernel.execute("1", { timeoutMs: 20_000 })).status).toBe("ok");
    // A loop that computes after an await cannot be interrupted.
    const result = await kernel.execute("await null; for (;;) {}", {
      timeoutMs: 500,
      graceMs: 300,
    });
    expect(result.status).toBe("timeout");
    await kernel.stop();
    expect(isAlive(pid)).toBe(false);
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
  const client = new URL(`file://${packageRoot()}/dist/notebook/index.js`).href;
  const program = (ending: string): string => `
    import { KernelClient, kernelCommand } from ${JSON.stringify(client)};
    const kernel = await KernelClient.start({
      argv: kernelCommand(), cwd: process.cwd(), startTimeoutMs: 60000 });
    void kernel.execute("await null; for (;;) {}", { timeoutMs: null });
    setTimeout(() => { console.log(kernel.pid); ${ending} }, 300);
    setInterval(() => 0, 1000);`;

  const endings = [
    { how: "by Ctrl-C", ending: "", signal: "SIGINT" },
    { how: "by an exception", ending: 'throw new Error("unforeseen")', signal: null },
    { how: "by SIGKILL, with the kernel busy", ending: "", signal: "SIGKILL" },
  ] as const;
  it("however it ends, the kernel and its folder are gone too", async () => {
    const seen = endings.map(async ({ how, ending, signal }) => {
      const args = ["--input-type=module", "-e", program(ending)];
      const stdio = ["ignore", "pipe", "ignore"] as const;
      const child = spawn(process.execPath, args, { cwd: folders.work, stdio: [...stdio] });
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
