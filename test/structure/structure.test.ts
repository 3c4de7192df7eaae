import { describe, expect, it } from "vitest";
import { rules } from "./rules.js";
import { pathsBelow, read, sources } from "./sources.js";

const files = sources();

describe("the sources", () => {
  it("are found", () => {
    const rooms = new Set(files.map((f) => f.path.split("/")[0]));
    for (const room of ["errors", "units", "numerics", "method", "physics", "index.ts"])
      expect(rooms).toContain(room);
  });
  it.each(Object.entries(rules))("%s", (_, rule) => {
    expect(files.flatMap(rule)).toEqual([]);
  });
});

describe("the tests", () => {
  it("are all run: none is skipped, singled out or left to do", () => {
    const pattern =
      /\b(?:it|test|describe)(?:\.each\([^)]*\))?\.(?:skip|only|todo|fails)\b|\bxit\(/;
    const idle = pathsBelow("test").filter((path) => pattern.test(read("test", path)));
    expect(idle).toEqual([]);
  });
});
