import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import fc from "fast-check";
import { afterAll, describe, expect, it } from "vitest";
import { jsonFault } from "../../kernel-helpers/files/json-fault.js";
import { readJsonFile } from "../../kernel-helpers/files/read-json-file.js";
import { codeOf } from "../code-of.js";

const folder = mkdtempSync(join(tmpdir(), "read-"));
afterAll(() => {
  rmSync(folder, { recursive: true, force: true });
});
const fileWith = (data: string | Uint8Array): string => {
  const file = join(folder, "a.json");
  writeFileSync(file, data);
  return file;
};
const read = (data: string | Uint8Array) => (): unknown => readJsonFile(fileWith(data), "record");

describe("readJsonFile", () => {
  it("reads JSON, with or without a byte-order mark", () => {
    expect(read('{"a": [1, null, "µ"]}')()).toEqual({ a: [1, null, "µ"] });
    expect(read('\ufeff{"a": 1}')()).toEqual({ a: 1 });
  });
  it("names what is missing, and where", () => {
    const none = join(folder, "none.json");
    expect(codeOf(() => readJsonFile(none, "record"))).toBe("file-missing");
    expect(() => readJsonFile(none, "record")).toThrow(`record (${none}): does not exist`);
    expect(codeOf(() => readJsonFile(join(fileWith("1"), "b"), "record"))).toBe("file-missing");
    expect(codeOf(() => readJsonFile(folder, "record"))).toBe("is-a-folder");
  });
  it("tells an empty file from one that was cut off and one that is wrong", () => {
    expect(codeOf(read(""))).toBe("file-empty");
    expect(codeOf(read(" \n"))).toBe("file-empty");
    expect(codeOf(read('{"a": [1, 2'))).toBe("file-truncated");
    expect(codeOf(read('{"a": 1,}'))).toBe("not-json");
    expect(read('{"a": 1,\n "b": tru}')).toThrow(/line 2, column 10/);
  });
  it("refuses bytes that are not UTF-8, and a file that is too large", () => {
    expect(codeOf(read(new Uint8Array([0x22, 0xb5, 0x22])))).toBe("not-utf-8");
    const file = fileWith("[1, 2, 3]");
    expect(codeOf(() => readJsonFile(file, "record", { largest: 8 }))).toBe("file-too-large");
    expect(readJsonFile(file, "record", { largest: 9 })).toEqual([1, 2, 3]);
  });
});

describe("jsonFault", () => {
  const parses = (text: string): boolean => {
    try {
      JSON.parse(text);
      return true;
    } catch {
      return false;
    }
  };
  it("finds no fault in anything that can be written as JSON", () => {
    fc.assert(
      fc.property(fc.jsonValue(), fc.constantFrom(0, 1, "\t"), (value, indent) => {
        expect(jsonFault(JSON.stringify(value, null, indent))).toBeNull();
      }),
    );
  });
  it("agrees with the parser on damaged text", () => {
    const piece = fc.constantFrom(
      ...['{"a":', "}", "[", "]", ",", "1", "-", "01", "1.", "1e", "true", "nul", '"x"', '"'],
      ...['"\\u12"', '"\\n"', '"\n"', ":", " ", "\n", "NaN", "'a'", "\u00a0"],
    );
    fc.assert(
      fc.property(fc.array(piece, { maxLength: 8 }), (pieces) => {
        const text = pieces.join("");
        expect(jsonFault(text) === null).toBe(parses(text));
      }),
      { numRuns: 2000 },
    );
  });
  it("says that text is cut off wherever it was cut", () => {
    const text = '{"a": [1.5e3, "b\\u00b5", {"c": true}], "d": null}';
    for (let n = 1; n < text.length; n++) {
      expect(jsonFault(text.slice(0, n))?.isCutOff).toBe(true);
    }
  });
  const faults: readonly [string, number, number][] = [
    ['{"a":1,}', 1, 8],
    ["[1 2]", 1, 4],
    ["{a:1}", 1, 2],
    ['{"a":\n01}', 2, 2],
    ["[1]x", 1, 4],
    ['["a\nb"]', 1, 4],
    ["[truth]", 1, 5],
    ["[-x]", 1, 3],
  ];
  it.each(faults)("places the fault in %j", (text, line, column) => {
    expect(jsonFault(text)).toEqual({ line, column, isCutOff: false });
  });
  it("follows any depth", () => {
    const deep = "[".repeat(200_000);
    expect(jsonFault(deep)).toEqual({ line: 1, column: 200_001, isCutOff: true });
  });
});
