import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { dirname, join } from "node:path";
import { afterAll, describe, expect, it } from "vitest";
import { declaredSources, type DeclaredSource } from "../../scripts/declared-sources.mjs";
import { lockFaults, lockOf } from "../../scripts/method-lock.mjs";

const base = {
  "physics/drag/a.ts": `
    import { method } from "../../method/index.js";
    import { factor as by, TABLE } from "./index.js";
    import { b } from "./b.js";
    /** Twice. */
    export const a = method({
      id: "a-1999", revision: 3, title: "A", tex: "2x",
      inputs: { x: { kind: "length", symbol: "x", note: "a length", range: [0, 1] } },
      output: { kind: "length", symbol: "y", note: "a result" },
      uses: [b],
      compute: ({ x }) => { const note = 2; return note * x * by(x) + TABLE[0] + b.si({ x }); },
      checks: [],
    });`,
  "physics/drag/b.ts": `
    import { method } from "../../method/index.js";
    const ID = "b-2000";
    export const b = method({ id: ID, revision: 1, inputs: {}, compute: () => 1 });`,
  "physics/drag/factor.ts": `
    import { limit } from "../../numerics/limit.js";
    const FACTOR: number = 1_000;
    export const unused = 5;
    export function factor(x: number): number { return limit(x) + FACTOR; }`,
  "physics/drag/table.ts": "export const TABLE = [1, 2, 3];",
  "physics/drag/index.ts": `
    export * from "./table.js";
    export { factor } from "./factor.js";`,
};
type Files = typeof base;

const folders: string[] = [];
afterAll(() => {
  for (const folder of folders) rmSync(folder, { recursive: true, force: true });
});
function declared(change: Partial<Record<keyof Files, (text: string) => string>> = {}) {
  const folder = mkdtempSync(join(tmpdir(), "lock-"));
  folders.push(folder);
  for (const [path, text] of Object.entries(base) as [keyof Files, string][]) {
    mkdirSync(dirname(join(folder, path)), { recursive: true });
    writeFileSync(join(folder, path), change[path]?.(text) ?? text);
  }
  return declaredSources(folder);
}
const swap =
  (from: string, to: string) =>
  (text: string): string => {
    if (!text.includes(from)) throw new Error(`${from} is not in the text`);
    return text.replace(from, to);
  };
const lock = lockOf(declared());
const codes = (sources: readonly DeclaredSource[]): string[] =>
  lockFaults(sources, lock).map((f) => `${f.id} ${f.code}`);
const inA = (from: string, to: string): string[] =>
  codes(declared({ "physics/drag/a.ts": swap(from, to) }));

describe("the hash of a declaration", () => {
  it("is that of every declaration, with its file and what it reaches", () => {
    expect(
      declared().map(({ id, revision, where, reaches }) => [id, revision, where, reaches]),
    ).toEqual([
      ["a-1999", 3, "physics/drag/a.ts", ["b-2000"]],
      ["b-2000", 1, "physics/drag/b.ts", []],
    ]);
    expect(codes(declared())).toEqual([]);
  });
  it.each([
    ["a comment", "/** Twice. */", "/** Two times. */ // indeed"],
    ["the title", 'title: "A"', 'title: "Another"'],
    ["the equation's TeX", 'tex: "2x"', 'tex: "2\\\\,x"'],
    ["a note", 'note: "a length"', 'note: "some length"'],
    ["a symbol", 'symbol: "y"', 'symbol: "z"'],
    ["the checks", "checks: []", "checks: [{ printed: 1 }]"],
    ["spaces and line ends", "({ x }) => {", "({x})\n=>\n{"],
    ["parentheses", "note * x * by(x)", "((note * x) * by(x))"],
    ["a type", "({ x }) =>", "({ x }: { x: number }) =>"],
  ])("does not change with %s", (_, from, to) => {
    expect(inA(from, to)).toEqual([]);
  });
  it.each([
    ["a coefficient", "const note = 2", "const note = 2.01"],
    ["an operator", "note * x *", "note * x /"],
    ["the grouping", "x * by(x) + TABLE[0]", "x * (by(x) + TABLE[0])"],
    ["a sign", "return note", "return -note"],
    ["a range", "range: [0, 1]", "range: [0, 2]"],
    ["the kind of an input", 'kind: "length", symbol: "x"', 'kind: "area", symbol: "x"'],
    ["what it uses", "TABLE[0]", "TABLE[1]"],
  ])("changes with %s", (_, from, to) => {
    expect(inA(from, to)).toEqual(["a-1999 changed"]);
  });
  it("changes with a function, a constant and a table of other files that it reaches", () => {
    const changed = ["a-1999 changed"];
    const factor = (from: string, to: string): string[] =>
      codes(declared({ "physics/drag/factor.ts": swap(from, to) }));
    expect(factor("limit(x) +", "limit(x) -")).toEqual(changed);
    expect(factor("1_000", "1001")).toEqual(changed);
    expect(factor("1_000", "1000")).toEqual([]);
    expect(factor("unused = 5", "unused = 6")).toEqual([]);
    expect(codes(declared({ "physics/drag/table.ts": swap("2", "9") }))).toEqual(changed);
  });
  it("leaves a declaration that it uses to that one's own revision", () => {
    expect(codes(declared({ "physics/drag/b.ts": swap("=> 1", "=> 2") }))).toEqual([
      "b-2000 changed",
    ]);
  });
});

describe("what a declaration reaches", () => {
  const reaches = (from: string, to: string): readonly string[] | undefined =>
    declared({ "physics/drag/a.ts": swap(from, to) })[0]?.reaches;
  it("is a method that its function calls, not one whose field it shares", () => {
    expect(reaches("uses: [b],", "")).toEqual(["b-2000"]);
    const shared = declared({
      "physics/drag/a.ts": (text) =>
        swap("uses: [b],", "extra: b.inputs.x,")(swap("+ b.si({ x })", "")(text)),
    });
    expect(shared[0]?.reaches).toEqual([]);
  });
});

describe("the lock", () => {
  it("asks to be brought up to date after a raised revision", () => {
    expect(inA("revision: 3", "revision: 4")).toEqual(["a-1999 raised"]);
  });
  it("refuses a lowered revision, a new id and one that is gone", () => {
    expect(inA("revision: 3", "revision: 2")).toEqual(["a-1999 lowered"]);
    expect(inA("a-1999", "a-2001")).toEqual(["a-1999 gone", "a-2001 new"]);
  });
  it("tells what to do about a changed computation", () => {
    const [fault] = lockFaults(declared({ "physics/drag/b.ts": swap("=> 1", "=> 2") }), lock);
    expect(fault?.says).toMatch(/raise the revision .* "Numbers that changed" in CHANGELOG\.md/);
  });
});

describe("a declaration that cannot be locked is refused", () => {
  it.each([
    ["made inside a function", "export const b = method(", "export const f = () => method("],
    ["with a computed id", "id: ID", "id: ID + 1"],
    ["with a computed revision", "revision: 1", "revision: 1 + 1"],
  ])("%s", (_, from, to) => {
    expect(() => declared({ "physics/drag/b.ts": swap(from, to) })).toThrow(
      /b\.ts: declare each method/,
    );
  });
  it("twice under one id", () => {
    expect(() => declared({ "physics/drag/b.ts": swap('"b-2000"', '"a-1999"') })).toThrow(
      /"a-1999" is declared in/,
    );
  });
});
