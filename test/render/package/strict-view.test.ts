import { describe, expect, it } from "vitest";
import { RenderError } from "../../../kernel-helpers/errors/index.js";
import { strictView } from "../../../kernel-helpers/render/package/strict-view.js";

const caught = (read: () => unknown): RenderError => {
  try {
    read();
  } catch (error) {
    if (error instanceof RenderError) return error;
    throw error;
  }
  throw new Error("nothing was thrown");
};

describe("a strict view", () => {
  const view = strictView({ cover: { title: "T", checked: null }, rows: [{ a: 1 }] }, "pkg");
  it("gives what is there, null and false among it", () => {
    expect(view.cover.title).toBe("T");
    expect(view.cover.checked).toBeNull();
    expect(view.rows.map((r) => r.a)).toEqual([1]);
    expect(view.rows.length).toBe(1);
  });
  it("throws an error that names the path of a field that is not there", () => {
    const error = caught(() => (view.cover as unknown as { titel: string }).titel);
    expect(error.code).toBe("unknown-field");
    expect(error.message).toContain("pkg.cover.titel");
    expect(error.message).toContain("title, checked");
  });
  it("throws in lists too", () => {
    expect(caught(() => view.rows[3]).message).toContain("pkg.rows.3");
    expect(caught(() => (view.rows[0] as unknown as { b: number }).b).code).toBe("unknown-field");
  });
});
