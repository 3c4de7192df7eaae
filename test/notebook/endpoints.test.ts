import { describe, expect, it } from "vitest";
import { address, newEndpoints } from "../../kernel-helpers/notebook/endpoints.js";

describe("where a kernel and its client meet", () => {
  it("is in the folder, by sockets that nobody else can open, where the system has them", async () => {
    const endpoints = await newEndpoints("/private");
    const hasSockets = process.platform !== "win32";
    expect(endpoints.transport).toBe(hasSockets ? "ipc" : "tcp");
    expect(address(endpoints, endpoints.shell_port)).toMatch(
      hasSockets ? /^ipc:\/\/\/private\/k-1$/ : /^tcp:/,
    );
    expect(endpoints.key).toMatch(/^[0-9a-f]{64}$/);
  });
  it("is on five ports of the loopback address when that is asked for, or a path is too long", async () => {
    for (const endpoints of [
      await newEndpoints("/private", "tcp"),
      await newEndpoints(`/${"long/".repeat(30)}`),
    ]) {
      const { shell_port, iopub_port, stdin_port, control_port, hb_port } = endpoints;
      const ports = [shell_port, iopub_port, stdin_port, control_port, hb_port];
      expect(new Set(ports).size).toBe(5);
      for (const port of ports) expect(port).toBeGreaterThan(1023);
      expect(address(endpoints, shell_port)).toBe(`tcp://127.0.0.1:${shell_port}`);
    }
  });
  it("has a new key each time", async () => {
    const [a, b] = [await newEndpoints("/x"), await newEndpoints("/x")];
    expect(a.key).not.toBe(b.key);
  });
});
