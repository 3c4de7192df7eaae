import { describe, expect, it } from "vitest";
import {
  parseIpynb,
  printIpynb,
  sourceOf,
  storedOutputs,
} from "../../kernel-helpers/notebook/ipynb.js";
import { codeOf } from "../code-of.js";

const code = {
  cell_type: "code",
  source: "1 + 1",
  outputs: [],
  execution_count: null,
  metadata: {},
};
const whole = { nbformat: 4, nbformat_minor: 5, metadata: {}, cells: [code] };
const parse = (x: unknown) => parseIpynb(JSON.stringify(x), "study.ipynb");
const messageOf = (act: () => unknown): string => {
  try {
    act();
  } catch (error) {
    return error instanceof Error ? error.message : "";
  }
  return "";
};

describe("reading a notebook", () => {
  it("keeps what it does not know", () => {
    const kept = { ...whole, metadata: { colour: "blue" }, cells: [{ ...code, id: "a1" }] };
    expect(JSON.parse(printIpynb(parse(kept)))).toEqual(kept);
  });
  it("joins a source that is a list of lines", () => {
    expect(sourceOf({ cell_type: "code", source: ["a\n", "b"] })).toBe("a\nb");
  });
  it("accepts the names that TypeScript kernels go by, and none at all", () => {
    for (const name of ["typescript", "tslab", "TypeScript"])
      expect(parse({ ...whole, metadata: { language_info: { name } } }).cells).toHaveLength(1);
    expect(parse({ ...whole, metadata: { kernelspec: { name: "stillwell" } } }).nbformat).toBe(4);
  });
  it.each([
    ["a Python notebook that was run", { language_info: { name: "python" } }],
    ["a Python notebook that was not", { kernelspec: { name: "python3", display_name: "P" } }],
    ["a JavaScript notebook", { kernelspec: { name: "jslab", language: "javascript" } }],
  ])("refuses %s", (_, metadata) => {
    expect(codeOf(() => parse({ ...whole, metadata }))).toBe("not-typescript");
  });
  it.each([
    ["text that is not JSON", "# not JSON"],
    ["an empty file", ""],
    ["a list", "[]"],
    ["null", "null"],
    ["an object of another sort", '{"name":"x"}'],
    ["a notebook without cells", JSON.stringify({ ...whole, cells: undefined })],
    ["cells that are no list", JSON.stringify({ ...whole, cells: {} })],
    ["a cell without a source", JSON.stringify({ ...whole, cells: [{ cell_type: "code" }] })],
    ["a cell of no known type", JSON.stringify({ ...whole, cells: [{ ...code, cell_type: "x" }] })],
    [
      "a source with a number in it",
      JSON.stringify({ ...whole, cells: [{ ...code, source: [1] }] }),
    ],
  ])("refuses %s", (_, text) => {
    expect(codeOf(() => parseIpynb(text, "f"))).toBe("not-a-notebook");
  });
  it("refuses another format and says which it is", () => {
    const old = { ...whole, nbformat: 3 };
    expect(codeOf(() => parse(old))).toBe("wrong-format");
    expect(messageOf(() => parse(old))).toContain("study.ipynb: is a notebook of format 3");
  });
  it("names the place that does not fit", () => {
    const cells = [code, { ...code, source: 7 }];
    expect(messageOf(() => parse({ ...whole, cells }))).toMatch(
      /^study\.ipynb › cells › 1 › source:/,
    );
  });
});

describe("outputs in a file", () => {
  it("are lists of lines for texts, which join to what was put out", () => {
    const [stream, shown] = storedOutputs([
      { output_type: "stream", name: "stdout", text: "a\nb\n" },
      {
        output_type: "display_data",
        data: {
          "image/svg+xml": "<svg>\n</svg>",
          "application/json": { a: 1 },
          "image/png": "iVB",
        },
        metadata: {},
      },
    ]);
    expect(stream).toMatchObject({ text: ["a\n", "b\n"] });
    expect(shown).toMatchObject({
      data: {
        "image/svg+xml": ["<svg>\n", "</svg>"],
        "application/json": { a: 1 },
        "image/png": "iVB",
      },
    });
  });
});
