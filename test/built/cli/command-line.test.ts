import { spawn, spawnSync } from "node:child_process";
import {
  cpSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  writeFileSync,
} from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { afterAll, beforeAll, describe, expect, it } from "vitest";

const root = fileURLToPath(new URL("../../..", import.meta.url));
const bin = join(root, "kernel-helpers", "bin", "stillwell.mjs");
const folder = mkdtempSync(join(tmpdir(), "stillwell-cli-"));
const study = join(folder, "study.ipynb");
const out = join(folder, "out");
const record = join(out, "first-study", "record.json");
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const stillwell = (...args: string[]) => stillwellWith({}, ...args);
const stillwellWith = (env: NodeJS.ProcessEnv, ...args: string[]) =>
  spawnSync(process.execPath, [bin, ...args], {
    cwd: folder,
    encoding: "utf8",
    env: { ...process.env, ...env },
  });

/** The starter notebook with one cell changed. */
function variant(name: string, change: (source: string) => string): string {
  const nb = JSON.parse(readFileSync(study, "utf8")) as {
    cells: { cell_type: string; source: string[] }[];
  };
  for (const c of nb.cells) if (c.cell_type === "code") c.source = [change(c.source.join(""))];
  const file = join(folder, name);
  writeFileSync(file, JSON.stringify(nb));
  return file;
}

beforeAll(() => {
  cpSync(join(root, "kernel-helpers", "starter", "study.ipynb"), study);
  const ran = stillwell("run", "study.ipynb");
  expect(ran.stderr + ran.stdout).toContain("C1");
  expect(ran.status).toBe(0);
});

describe("stillwell run", () => {
  it("writes a record of a clean run, with the hash of its notebook, and a copy with outputs", () => {
    const r = JSON.parse(readFileSync(record, "utf8")) as {
      run: { clean: boolean; notebook: { name: string; sha256: string } };
    };
    expect(r.run.clean).toBe(true);
    expect(r.run.notebook.name).toBe("study.ipynb");
    expect(r.run.notebook.sha256).toMatch(/^[0-9a-f]{64}$/);
    const nb = JSON.parse(readFileSync(join(out, "study.ipynb"), "utf8")) as {
      cells: { outputs?: unknown[] }[];
    };
    expect(nb.cells.flatMap((c) => c.outputs ?? []).length).toBeGreaterThan(0);
  });
  it("refuses a pressure for a length before the cell runs: the cell, the line, one sentence", () => {
    const file = variant("wrong.ipynb", (s) =>
      s.replace('"6.094", inch,', '"6.094", psi,').replace("mMD, mps }", "mMD, mps, psi }"),
    );
    const r = stillwell("run", file, "--out", join(folder, "wrong"));
    expect(r.status).toBe(1);
    expect(r.stderr).toMatch(/expected a length, got an absolute pressure/);
    expect(r.stderr.match(/expected a length, got an absolute pressure/g)).toHaveLength(1);
    expect(existsSync(join(folder, "wrong", "first-study"))).toBe(false);
  });
  it("shows the cell that throws and its message once", () => {
    const file = variant("throws.ipynb", (s) => s.replace("mMD(2000)", "mMD(-5)"));
    const r = stillwell("run", file, "--out", join(folder, "throws"));
    expect(r.status).toBe(1);
    expect(r.stderr.match(/bore-section\.base: cannot be -5 m/g)).toHaveLength(1);
    expect(r.stderr).not.toContain("node_modules");
  });
  it("stops a cell that runs too long", () => {
    const file = variant("slow.ipynb", (s) =>
      s.includes("descent, {") ? `await 0; for (;;);\n${s}` : s,
    );
    const r = stillwell("run", file, "--out", join(folder, "slow"), "--cell-timeout", "5");
    expect(r.status).toBe(1);
    expect(r.stderr).toContain("limit of 5 s");
  });
  it("ends cleanly when it is interrupted, with no record half made", async () => {
    const file = variant("interrupted.ipynb", (s) =>
      s.includes("descent, {") ? `for (;;) await new Promise((r) => setTimeout(r, 10));` : s,
    );
    const child = spawn(
      process.execPath,
      [bin, "run", file, "--out", join(folder, "interrupted")],
      { cwd: folder },
    );
    let err = "";
    let asked = false;
    child.stderr.on("data", (b: Buffer) => {
      err += b.toString();
      if (err.includes("cell 3 of 3") && !asked) asked = child.kill("SIGINT");
    });
    const code = await new Promise((resolve) => child.on("exit", resolve));
    expect(code).toBe(130);
    expect(existsSync(join(folder, "interrupted", "first-study"))).toBe(false);
  });
  it.each([
    ["a notebook that is none", "{}", /notebook/],
    ["a file that is no JSON", "hello", /JSON|notebook/],
  ])("refuses %s by name", (_, text, says) => {
    writeFileSync(join(folder, "bad.ipynb"), text);
    const r = stillwell("run", "bad.ipynb");
    expect(r.status).toBe(1);
    expect(r.stderr).toMatch(says);
    expect(r.stderr).toContain("bad.ipynb");
    expect(r.stderr).not.toContain("    at ");
  });
  it("refuses a file that is not there", () => {
    const r = stillwell("run", "nowhere.ipynb");
    expect(r.status).toBe(1);
    expect(r.stderr).toContain("nowhere.ipynb");
  });
});

describe("stillwell package", () => {
  it("writes the HTML of a record, whole, and leaves no other file", () => {
    const r = stillwell("package", record, "--no-pdf");
    expect(r.status).toBe(0);
    const html = readFileSync(join(out, "first-study", "package.html"), "utf8");
    const text = html.replace(/<style>[\s\S]*?<\/style>/, "");
    expect(text.trimEnd().endsWith("</html>")).toBe(true);
    expect(/NaN|\[object Object\]|undefined/.exec(text)).toBeNull();
    expect(readdirSync(join(out, "first-study")).sort()).toEqual(["package.html", "record.json"]);
  });
  it("still writes the HTML when no browser can be had, and says what would help", () => {
    const r = stillwellWith(
      { STILLWELL_BROWSER: join(folder, "no-such-browser") },
      "package",
      record,
    );
    expect(r.status).toBe(1);
    expect(r.stderr).toContain("The HTML is complete".slice(4));
    expect(r.stderr).toContain("STILLWELL_BROWSER");
    expect(existsSync(join(out, "first-study", "package.html"))).toBe(true);
    expect(existsSync(join(out, "first-study", "package.pdf"))).toBe(false);
  });
  it("writes both with a browser", () => {
    const r = stillwell("package", record, "--paper", "Letter");
    expect(r.stderr).toBe("  setting the HTML\n  printing the PDF\n");
    expect(r.status).toBe(0);
    expect(
      readFileSync(join(out, "first-study", "package.pdf"))
        .subarray(0, 5)
        .toString(),
    ).toBe("%PDF-");
  });
});

describe("stillwell replay", () => {
  const spoilt = (name: string, change: (text: string) => string): string => {
    const file = join(folder, name);
    writeFileSync(file, change(readFileSync(record, "utf8")));
    return file;
  };
  it("agrees with a record it made", () => {
    const r = stillwell("replay", record);
    expect(r.stdout).toMatch(/All \d+ values of FS-001 rev\. A were recomputed and agree\./);
    expect(r.status).toBe(0);
  });
  it.each([
    [
      "of a newer schema",
      (t: string) => t.replace('"schema": 1', '"schema": 9'),
      /has schema 9; expected at most 1/,
    ],
    ["cut short", (t: string) => t.slice(0, t.length / 2), /cut|end|truncated/i],
    [
      "changed by hand",
      (t: string) => t.replace("a light oil", "a heavy oil"),
      /was changed after it was written/,
    ],
    ["that is empty", () => "", /empty/],
  ])("refuses a record %s", (name, change, says) => {
    const r = stillwell("replay", spoilt(`${name.replace(/ /g, "-")}.json`, change));
    expect(r.status).toBe(1);
    expect(r.stderr).toMatch(says);
  });
});

describe("stillwell", () => {
  it("has help for itself and every command", () => {
    for (const args of [
      ["--help"],
      ["run", "--help"],
      ["package", "--help"],
      ["replay", "--help"],
      ["new", "--help"],
      ["methods", "--help"],
    ]) {
      const r = stillwell(...args);
      expect(r.status).toBe(0);
      expect(r.stdout).toContain("Usage: stillwell");
    }
  });
  it("refuses an unknown command, option or value", () => {
    for (const args of [
      ["fly"],
      ["run", "study.ipynb", "--fast"],
      ["package", record, "--paper", "A5"],
      ["run", "study.ipynb", "--cell-timeout", "-3"],
      ["run"],
    ])
      expect(stillwell(...args).status).toBe(2);
  });
  it("lists the methods with source, range and checks, one of them, or a family", () => {
    const all = stillwell("methods");
    expect(all.stdout).toMatch(/ergun-1952 {2}.*\n {4}source {3}Ergun \(1952\)/);
    expect(all.stdout).toMatch(/checked {2}/);
    expect(stillwell("methods", "kta-1981").stdout.split("\n")[0]).toMatch(/^kta-1981/);
    expect(JSON.parse(stillwell("methods", "--json").stdout)).toHaveLength(
      all.stdout.match(/^\S/gm)?.length ?? 0,
    );
    expect(stillwell("methods", "no-such").status).toBe(1);
  });
  it("makes a study folder and overwrites nothing in it", () => {
    const here = join(folder, "made");
    mkdirSync(here);
    writeFileSync(join(here, "README.md"), "mine");
    writeFileSync(
      join(here, "package.json"),
      JSON.stringify({ name: "mine", scripts: { start: "mine" } }),
    );
    expect(stillwell("new", here).status).toBe(0);
    expect(readFileSync(join(here, "README.md"), "utf8")).toBe("mine");
    const json = JSON.parse(readFileSync(join(here, "package.json"), "utf8")) as {
      name: string;
      scripts: { start: string };
      overrides: object;
    };
    expect(json).toMatchObject({ name: "mine", scripts: { start: "mine" } });
    expect(json.overrides).toHaveProperty("danfojs-node");
    expect(existsSync(join(here, ".npmrc"))).toBe(true);
    expect(stillwell("new", join(here, "README.md")).status).toBe(1);
  });
});
