import { spawnSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { StudyRecord } from "../../../kernel-helpers/study/index.js";

const root = fileURLToPath(new URL("../../..", import.meta.url));
const out = mkdtempSync(join(tmpdir(), "stillwell-sample-"));
afterAll(() => rmSync(out, { recursive: true, force: true }));
const stillwell = (...args: string[]) =>
  spawnSync(process.execPath, [join(root, "kernel-helpers", "bin", "stillwell.mjs"), ...args], {
    cwd: root,
    encoding: "utf8",
  });

describe("the sample notebook", () => {
  let record: StudyRecord;
  beforeAll(() => {
    const ran = stillwell(
      "package",
      join("notebooks", "first-look.ipynb"),
      "--out",
      out,
      "--no-pdf",
    );
    expect(ran.stderr).not.toContain("failed");
    expect(ran.status).toBe(0);
    record = JSON.parse(
      readFileSync(join(out, "first-look", "record.json"), "utf8"),
    ) as StudyRecord;
  });
  const result = (id: string): unknown => {
    const item = record.body.items.find((i) => i.id === id);
    return item && "result" in item && "value" in item.result ? item.result.value : null;
  };
  it("runs clean, and its record replays without it", () => {
    expect(record.run.clean).toBe(true);
    const replayed = stillwell("replay", join(out, "first-look", "record.json"));
    expect(replayed.stdout).toContain("were recomputed and agree");
    expect(replayed.status).toBe(0);
  });
  it("gives every input a source, every assumption a reason and a way to verify it, every conclusion a check", () => {
    for (const i of record.body.items) {
      if (i.op === "given" || i.op === "assumed") expect(i.because.length).toBeGreaterThan(5);
      if (i.op === "assumed") expect(i.verify?.how.length).toBeGreaterThan(5);
      if (i.op === "conclude") expect(i.checks.length).toBeGreaterThan(0);
    }
  });
  it("leaves no number stated without a source in a calculation", () => {
    const html = readFileSync(join(out, "first-look", "package.html"), "utf8");
    expect(html).not.toMatch(/States (a number|\d+ numbers) in place/);
  });
  it("finds the upflow of 24 000 STB/d at a volume factor of 1.30 in 6.094 in: 3.05 m/s, by hand", () => {
    const q = (24_000 * 1.3 * 0.158987294928) / 86_400;
    expect(result("u-liner")).toBeCloseTo(q / ((Math.PI / 4) * (6.094 * 0.0254) ** 2), 9);
  });
  it("says what it says because of the numbers: balls fail, a nosed bar passes, the stock is short", () => {
    expect([result("falls-ball-2"), result("falls-shot")]).toEqual(["fail", "fail"]);
    expect(result("guided-bar")).toBe("pass");
    expect(result("enough-1")).toBe("fail");
  });
});
