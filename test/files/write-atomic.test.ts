import {
  chmodSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readFileSync,
  readdirSync,
  rmSync,
  statSync,
  symlinkSync,
  lstatSync,
  writeFileSync,
} from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { writeFileAtomic } from "../../kernel-helpers/files/write-atomic.js";
import { codeOf } from "../code-of.js";

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), "write-"));
});
afterEach(() => {
  rmSync(folder, { recursive: true, force: true });
});

describe("writeFileAtomic", () => {
  it("writes text and bytes, and leaves nothing else", () => {
    writeFileAtomic(join(folder, "a.json"), "µ = 1 cP\n");
    writeFileAtomic(join(folder, "b.bin"), new Uint8Array([0, 255, 10]));
    expect(readFileSync(join(folder, "a.json"), "utf8")).toBe("µ = 1 cP\n");
    expect([...readFileSync(join(folder, "b.bin"))]).toEqual([0, 255, 10]);
    expect(readdirSync(folder).sort()).toEqual(["a.json", "b.bin"]);
  });
  it("replaces a file and keeps its permissions", () => {
    const file = join(folder, "a");
    writeFileSync(file, "old and longer");
    chmodSync(file, 0o640);
    writeFileAtomic(file, "new");
    expect(readFileSync(file, "utf8")).toBe("new");
    expect(statSync(file).mode & 0o777).toBe(0o640);
  });
  it("follows a link instead of replacing it", () => {
    writeFileSync(join(folder, "real"), "old");
    symlinkSync(join(folder, "real"), join(folder, "link"));
    writeFileAtomic(join(folder, "link"), "new");
    expect(readFileSync(join(folder, "real"), "utf8")).toBe("new");
    expect(lstatSync(join(folder, "link")).isSymbolicLink()).toBe(true);
  });
  it("gives the reader of an open file the old content", () => {
    const file = join(folder, "a");
    writeFileSync(file, "old");
    const before = statSync(file).ino;
    writeFileAtomic(file, "new");
    expect(statSync(file).ino).not.toBe(before);
  });
  it("leaves the old file and no draft when the data cannot be written", () => {
    const file = join(folder, "a");
    writeFileSync(file, "old");
    const broken = Object.create(Uint8Array.prototype) as Uint8Array;
    const act = (): void => {
      writeFileAtomic(file, broken);
    };
    expect(codeOf(act)).toBe("cannot-write");
    expect(act).toThrow(file);
    expect(readFileSync(file, "utf8")).toBe("old");
    expect(readdirSync(folder)).toEqual(["a"]);
  });
  it("refuses a folder, and a path whose folder does not exist", () => {
    mkdirSync(join(folder, "sub"));
    const write = (path: string): string =>
      codeOf(() => {
        writeFileAtomic(path, "x");
      });
    expect(write(join(folder, "sub"))).toBe("is-a-folder");
    expect(write(join(folder, "none", "a"))).toBe("no-folder");
    expect(existsSync(join(folder, "none"))).toBe(false);
  });
});
