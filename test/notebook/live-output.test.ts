import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { LiveOutput } from "../../kernel-helpers/notebook/kernel/live-output.js";

type Sent = readonly [type: string, text: unknown];
function cell() {
  const sent: Sent[] = [];
  return {
    sent,
    publish: (type: string, content: { readonly [name: string]: unknown }) =>
      void sent.push([type, content["text"] ?? content["data"]]),
  };
}

describe("what a cell puts out while it runs", () => {
  beforeEach(() => vi.useFakeTimers());
  afterEach(() => vi.useRealTimers());

  it("leaves as one message per run of writes, in order with everything else", () => {
    const { sent, publish } = cell();
    const output = new LiveOutput();
    output.belongTo(publish);
    output.write("stdout", "a");
    output.write("stdout", "b");
    output.write("stderr", "c");
    output.publish("display_data", { data: 1 });
    output.write("stdout", "d");
    output.flush();
    expect(sent).toEqual([
      ["stream", "ab"],
      ["stream", "c"],
      ["display_data", 1],
      ["stream", "d"],
    ]);
  });
  it("leaves by itself after a moment, and at once when it is long", () => {
    const { sent, publish } = cell();
    const output = new LiveOutput();
    output.belongTo(publish);
    output.write("stdout", "x");
    expect(sent).toEqual([]);
    vi.advanceTimersByTime(50);
    expect(sent).toEqual([["stream", "x"]]);
    output.write("stdout", "y".repeat(70_000));
    expect(sent).toHaveLength(2);
  });
  it("goes to the cell that was running when it was written", () => {
    const [first, second] = [cell(), cell()];
    const output = new LiveOutput();
    output.belongTo(first.publish);
    output.write("stdout", "first");
    output.belongTo(second.publish);
    output.write("stdout", "second");
    output.flush();
    expect(first.sent).toEqual([["stream", "first"]]);
    expect(second.sent).toEqual([["stream", "second"]]);
  });
});
