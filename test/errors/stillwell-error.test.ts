import { describe, expect, it } from "vitest";
import * as errors from "../../kernel-helpers/errors/index.js";

const { InputError, StillwellError } = errors;

describe("an error", () => {
  it("is made of its parts, and says them in one order", () => {
    const e = new InputError({
      code: "out-of-bounds",
      where: "well.sections[1].bore",
      problem: "cannot be -3 in",
      expected: "a length above 0",
      remedy: "check the sign",
    });
    expect(e.message).toBe(
      "well.sections[1].bore: cannot be -3 in; expected a length above 0; check the sign",
    );
    expect([e.code, e.where, e.problem]).toEqual([
      "out-of-bounds",
      "well.sections[1].bore",
      "cannot be -3 in",
    ]);
  });
  it("leaves out what it was not given", () => {
    const e = new InputError({ code: "c", where: "w", problem: "p" });
    expect([e.message, e.expected, e.remedy, e.cause]).toEqual(["w: p", null, null, undefined]);
  });
  it("keeps its cause", () => {
    const cause = new RangeError("inner");
    expect(new InputError({ code: "c", where: "w", problem: "p", cause }).cause).toBe(cause);
  });
  it("is called by its class, in every class", () => {
    for (const [name, Class] of Object.entries(errors)) {
      const e = new Class({ code: "c", where: "w", problem: "p" });
      expect([e.name, e instanceof StillwellError, e instanceof Error]).toEqual([name, true, true]);
      expect(String(e)).toBe(`${name}: w: p`);
    }
  });
});
