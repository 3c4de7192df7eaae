import { describe, expect, it } from "vitest";
import { CellOutputs, type Displays } from "../../kernel-helpers/notebook/cell-outputs.js";
import { newHeader, type Content } from "../../kernel-helpers/notebook/wire.js";

const message = (type: string, content: Content) => ({
  identities: [],
  header: newHeader(type, "s"),
  parent: null,
  metadata: {},
  content,
});
const gather = (
  messages: readonly (readonly [string, Content])[],
  displays: Displays = new Map(),
) => {
  const outputs = new CellOutputs(displays);
  for (const [type, content] of messages) outputs.take(message(type, content));
  return outputs.list;
};
const shown = (text: string, display_id?: string): Content => ({
  data: { "text/plain": text },
  metadata: {},
  ...(display_id === undefined ? {} : { transient: { display_id } }),
});

describe("the outputs of a cell", () => {
  it("join neighbouring writes to one stream", () => {
    const texts = [
      ["stdout", "a"],
      ["stdout", "b"],
      ["stderr", "c"],
      ["stdout", "d"],
    ] as const;
    expect(gather(texts.map(([name, text]) => ["stream", { name, text }]))).toMatchObject([
      { name: "stdout", text: "ab" },
      { name: "stderr", text: "c" },
      { name: "stdout", text: "d" },
    ]);
  });
  it("are changed by a later cell through their display id", () => {
    const displays: Displays = new Map();
    const first = gather([["display_data", shown("old", "id-1")]], displays);
    const second = gather([["update_display_data", shown("new", "id-1")]], displays);
    expect(first).toMatchObject([{ data: { "text/plain": "new" } }]);
    expect(second).toEqual([]);
  });
  it("are cleared at once, or when the next output comes", () => {
    const write = (text: string) => ["stream", { name: "stdout", text }] as const;
    expect(gather([write("a"), ["clear_output", { wait: false }]])).toEqual([]);
    const waiting = [write("a"), ["clear_output", { wait: true }]] as const;
    expect(gather(waiting)).toMatchObject([{ text: "a" }]);
    expect(gather([...waiting, write("b")])).toMatchObject([{ text: "b" }]);
  });
  it("keep results and errors as a notebook stores them", () => {
    expect(
      gather([
        ["execute_result", { ...shown("7"), execution_count: 2 }],
        ["error", { ename: "E", evalue: "v", traceback: ["E: v"] }],
      ]),
    ).toEqual([
      {
        output_type: "execute_result",
        data: { "text/plain": "7" },
        metadata: {},
        execution_count: 2,
      },
      { output_type: "error", ename: "E", evalue: "v", traceback: ["E: v"] },
    ]);
  });
  it("take no harm from a message that lacks its fields", () => {
    expect(
      gather([
        ["error", {}],
        ["display_data", {}],
        ["status", {}],
      ]),
    ).toEqual([
      { output_type: "error", ename: "Error", evalue: "", traceback: [] },
      { output_type: "display_data", data: {}, metadata: {} },
    ]);
  });
});
