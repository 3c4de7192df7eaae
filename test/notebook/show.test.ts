import { afterEach, describe, expect, it, vi } from "vitest";
import { PUBLISH, show } from "../../kernel-helpers/notebook/show.js";

const svg = { [Symbol.for("Jupyter.display")]: () => ({ "image/svg+xml": "<svg/>" }) };

describe("showing a value in the middle of a cell", () => {
  afterEach(() => {
    Reflect.deleteProperty(globalThis, PUBLISH);
    Reflect.deleteProperty(globalThis, "__tslab__");
    vi.restoreAllMocks();
  });
  it("hands the whole bundle to our kernel", async () => {
    const shown: unknown[] = [];
    Reflect.set(globalThis, PUBLISH, (bundle: unknown) => shown.push(bundle));
    await show(svg);
    expect(shown).toEqual([
      { "text/plain": "(shown as image/svg+xml)", "image/svg+xml": "<svg/>" },
    ]);
  });
  it("hands the richest format to another kernel", async () => {
    const raw = vi.fn();
    Reflect.set(globalThis, "__tslab__", { require: () => ({ display: { raw } }) });
    await show(svg);
    expect(raw).toHaveBeenCalledWith("image/svg+xml", "<svg/>");
  });
  it("prints plain text where there is no notebook", async () => {
    const log = vi.spyOn(console, "log").mockImplementation(() => undefined);
    await show({ a: 1 });
    expect(log).toHaveBeenCalledWith("{ a: 1 }");
  });
});
