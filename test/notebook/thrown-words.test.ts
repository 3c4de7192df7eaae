import { describe, expect, it } from "vitest";
import { InputError } from "../../kernel-helpers/errors/index.js";
import { thrownReport, type SourcePlace } from "../../kernel-helpers/notebook/thrown-words.js";

const source = "const a = 1;\nf(a);\n";
const place = (cell: number, line: number): SourcePlace => ({ cell, file: null, line, column: 1 });
const places: Record<string, SourcePlace> = {
  "cell-3:12": place(3, 2),
  "cell-1:7": place(1, 5),
  "side.js:4": { cell: null, file: "side.ts", line: 3, column: 1 },
};
const report = (thrown: unknown) =>
  thrownReport({
    thrown,
    cell: 3,
    source,
    locate: ({ script, line }) => places[`${script}:${line}`] ?? null,
    isOurs: (frame) => frame.includes("machinery") || frame.includes("node:"),
  });
const withStack = <E extends Error>(error: E, ...frames: string[]): E =>
  Object.assign(error, { stack: [`${error.name}: ${error.message}`, ...frames].join("\n") });

describe("what a cell threw", () => {
  it("gives the message once, the line of the cell, and the analyst's own frames only", () => {
    const error = withStack(
      new RangeError("too deep"),
      "    at Proxy.f (cell-1:7:9)",
      "    at boom (side.js:4:1)",
      "    at cell-3:12:1",
      "    at Script.runInThisContext (node:vm:137:12)",
      "    at run (/machinery/executor.js:1:1)",
      "    at parse (/lib/other.js:8:2)",
    );
    expect(report(error)).toEqual({
      ename: "RangeError",
      evalue: "too deep",
      traceback: [
        "RangeError: too deep",
        "line 2:\n  f(a);\n  ^",
        "    at f (cell 1, line 5)",
        "    at boom (side.ts, line 3)",
        "    at cell 3, line 2",
        "    at parse (/lib/other.js:8)",
      ],
      line: 2,
    });
  });
  it("gives an error of ours as one sentence and its line, even from another copy of the package", () => {
    const told = new InputError({ code: "c", where: "mm", problem: "cannot be 1" });
    const foreign = Object.assign(new Error("mm: cannot be 1"), { code: "c", where: "mm" });
    for (const error of [told, foreign]) {
      const { traceback } = report(withStack(error, "    at f (cell-1:7:9)", "    at cell-3:12:1"));
      expect(traceback.slice(1)).toEqual(["line 2:\n  f(a);\n  ^"]);
      expect(traceback[0]).toMatch(/: mm: cannot be 1$/);
    }
  });
  it("gives the causes", () => {
    const error = new Error("outer", { cause: new TypeError("inner", { cause: "deep" }) });
    expect(report(error).traceback.slice(-2)).toEqual([
      "caused by TypeError: inner",
      "caused by deep",
    ]);
  });
  it("ends a loop of causes", () => {
    const error = new Error("round");
    error.cause = error;
    const told = report(error).traceback.filter((line) => line.startsWith("caused by"));
    expect(told.length).toBeLessThan(10);
  });
  it("takes anything that can be thrown", () => {
    expect(report("plain")).toMatchObject({ ename: "Error", evalue: "plain", line: null });
    expect(report(undefined).evalue).toBe("undefined");
    expect(report({ a: 1 }).evalue).toBe("{ a: 1 }");
    expect(report(Object.assign(new Error("x"), { stack: undefined })).evalue).toBe("x");
  });
  it("calls an interrupt an interrupt", () => {
    const byNode = Object.assign(new Error("Script execution was interrupted by `SIGINT`"), {
      code: "ERR_SCRIPT_EXECUTION_INTERRUPTED",
    });
    for (const error of [byNode, new Error("Interrupted asynchronously")])
      expect(report(error)).toMatchObject({ ename: "Interrupted", line: null });
  });
});
