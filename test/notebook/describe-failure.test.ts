import { describe, expect, it } from "vitest";
import {
  describeFailure,
  type FailedCell,
  type RunOutcome,
} from "../../kernel-helpers/notebook/index.js";

const cell: FailedCell = {
  index: 3,
  source: "const p = psi(5200);\nergun({ d: p });\n",
  ename: "TypeMismatch",
  evalue: "expected a length, got an absolute pressure",
  traceback: [
    "line 2: expected a length, got an absolute pressure\n  ergun({ d: p });\n          ^",
  ],
  line: 2,
};
const outcome = (over: Partial<RunOutcome>): RunOutcome => ({
  status: "failed",
  file: "study.ipynb",
  failedCell: cell,
  cellsRun: 2,
  codeCells: 7,
  ms: 10,
  drafts: new Map(),
  ...over,
});
const times = (text: string, part: string): number => text.split(part).length - 1;

describe("the text of a failure", () => {
  it("is empty when nothing failed", () => {
    expect(describeFailure(outcome({ status: "ok", failedCell: null }))).toBe("");
  });
  it("gives the cell, its source with the line marked, and the message once", () => {
    const text = describeFailure(outcome({}));
    expect(text).toBe(
      [
        "study.ipynb: cell 3 of 7 failed, at line 2.",
        "",
        "  1 | const p = psi(5200);",
        "> 2 | ergun({ d: p });",
        "",
        "TypeMismatch: expected a length, got an absolute pressure",
      ].join("\n"),
    );
  });
  it("gives every further diagnostic and every frame, without repeating a source line", () => {
    const traceback = [
      "RangeError: too deep",
      "line 2:\n  ergun({ d: p });\n  ^",
      "    at f (cell 1, line 4)",
    ];
    const text = describeFailure(
      outcome({ failedCell: { ...cell, ename: "RangeError", evalue: "too deep", traceback } }),
    );
    expect(times(text, "too deep")).toBe(1);
    expect(times(text, "ergun({ d: p });")).toBe(1);
    expect(text).toContain("at f (cell 1, line 4)");
    const two = [...cell.traceback, "line 9: D is missing\n  x\n  ^"];
    expect(describeFailure(outcome({ failedCell: { ...cell, traceback: two } }))).toContain(
      "line 9: D is missing",
    );
  });
  it.each([
    ["timeout", "ran too long"],
    ["died", "ended the kernel"],
    ["interrupted", "was interrupted"],
  ] as const)("says what happened to a cell that ended by %s", (status, words) => {
    const evalue = "the one sentence";
    const failedCell = { ...cell, ename: status, evalue, traceback: [evalue], line: null };
    const text = describeFailure(outcome({ status, failedCell }));
    expect(text).toContain(`cell 3 of 7 ${words}.`);
    expect(times(text, evalue)).toBe(1);
    expect(text).not.toContain(">");
  });
  it("says so when no cell had begun", () => {
    expect(describeFailure(outcome({ status: "interrupted", failedCell: null }))).toBe(
      "study.ipynb: was interrupted before the first cell ran.",
    );
  });
});
