import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, describe, expect, it } from "vitest";
import { untar } from "../../../kernel-helpers/render/browser/untar.js";
import { codeOf } from "../../code-of.js";

const folder = mkdtempSync(join(tmpdir(), "stillwell-test-"));
afterAll(() => rmSync(folder, { recursive: true }));

/** An entry of a ustar archive. */
function entry(name: string, body: string, type = "0", size = body.length): Buffer {
  const head = Buffer.alloc(512);
  head.write(name, 0);
  head.write(size.toString(8).padStart(11, "0"), 124);
  head.write(type, 156);
  head.write("ustar", 257);
  const padded = Buffer.alloc(Math.ceil(body.length / 512) * 512);
  padded.write(body);
  return Buffer.concat([head, padded]);
}
const end = Buffer.alloc(1024);

describe("an archive", () => {
  it("is unpacked with its folders", () => {
    const long = "x".repeat(700);
    const list = [entry("a/", "", "5"), entry("a/b.txt", long), entry("c/d.txt", "two"), end];
    untar(Buffer.concat(list), folder);
    expect(readFileSync(join(folder, "a/b.txt"), "utf8")).toBe(long);
    expect(readFileSync(join(folder, "c/d.txt"), "utf8")).toBe("two");
  });
  it.each([
    ["a name that leads out", entry("../evil", "x")],
    ["a name that leads out further in", entry("a/../../evil", "x")],
    ["an absolute name", entry("/evil", "x")],
    ["a link", entry("link", "", "2")],
    ["a missing end", entry("cut", "x", "0", 5000)],
  ])("with %s is refused", (_, bad) => {
    expect(codeOf(() => untar(Buffer.concat([bad, end]), folder))).toBe("bad-archive");
  });
});
