import { describe, expect, it } from "vitest";
import {
  refusal,
  sayDiagnostic,
  type Diagnostic,
} from "../../kernel-helpers/notebook/compiler-words.js";

// The chains are those of TypeScript 5.0, as the compiler gave them.
const at = (code: number, ...chain: string[]): Diagnostic => ({
  file: null,
  line: 2,
  column: 7,
  code,
  chain,
});
const say = (...chain: string[]): string => sayDiagnostic(at(2322, ...chain));

describe("a diagnostic in the analyst's terms", () => {
  it("names two kinds that differ", () => {
    expect(
      say(
        `Type 'Quantity<"pressure">' is not assignable to type 'Quantity<"length">'.`,
        `Type 'Quantity<"pressure">' is not assignable to type '{ readonly __kind: "length"; }'.`,
        "Types of property '__kind' are incompatible.",
        `Type '"pressure"' is not assignable to type '"length"'.`,
      ),
    ).toBe("expected a length, got an absolute pressure");
  });
  it("names every kind that would do", () => {
    expect(
      say(
        "Types of property '__kind' are incompatible.",
        `Type '"temperature"' is not assignable to type '"length" | "verticalDepth" | undefined'.`,
      ),
    ).toBe("expected a length or a true vertical depth, got a temperature");
  });
  it("names the kinds of references and units too", () => {
    const last = `Type '"pressure"' is not assignable to type '"length"'.`;
    for (const brand of ["Ref", "Unit"])
      expect(
        say(`Type '${brand}<"pressure">' is not assignable to type '${brand}<"length">'.`, last),
      ).toBe("expected a length, got an absolute pressure");
  });
  it("says when a reference or a unit stands where a quantity must", () => {
    const given = (type: string): string =>
      say(
        `Type '${type}' is not assignable to type 'Quantity<"length">'.`,
        `Type '${type}' is not assignable to type 'number'.`,
      );
    expect(given('Ref<"pressure">')).toBe(
      "expected a length itself, got a reference to an absolute pressure; its value is in .value",
    );
    expect(given('Unit<"length">')).toBe(
      "expected a length, got a unit; it is called with a number",
    );
  });
  it("asks for a unit also where a reference would do", () => {
    expect(say(`Type 'number' is not assignable to type 'Wired<"length">'.`)).toMatch(
      /^expected a length, got a number without a unit; units: /,
    );
  });
  it("does not take a text that is called like a kind for one", () => {
    expect(say(`Type '"pressure"' is not assignable to type '"length"'.`)).toBe(
      `Type '"pressure"' is not assignable to type '"length"'`,
    );
  });
  it("asks for a unit where a bare number is given, and names some", () => {
    const said = say(
      `Type 'number' is not assignable to type 'Quantity<"length">'.`,
      `Type 'number' is not assignable to type '{ readonly __kind: "length"; }'.`,
    );
    expect(said).toMatch(/^expected a length, got a number without a unit; units: m, mm, /);
  });
  it("says what was given instead of a quantity", () => {
    expect(
      say(
        `Argument of type 'string' is not assignable to parameter of type 'Quantity<"density">'.`,
        "Type 'string' is not assignable to type 'number'.",
      ),
    ).toMatch(/^expected a density, got string; units: /);
  });
  it("names a missing input, and its kind where the compiler tells", () => {
    const type = `'{ readonly d: Quantity<"length">; readonly mu: Quantity<"viscosity">; }'`;
    expect(
      say(
        "Argument of type '{ d: number; }' is not assignable to parameter of type 'X'.",
        `Property 'mu' is missing in type '{ d: number; }' but required in type ${type}.`,
      ),
    ).toBe("mu is missing (a dynamic viscosity)");
    expect(say("Type '{}' is missing the following properties from type 'X': a, b")).toBe(
      "missing: a, b",
    );
  });
  it("names an unknown input and those that there are", () => {
    expect(
      say(
        `Object literal may only specify known properties, and 'dd' does not exist in type 'Entered<{ u: "velocity"; d: "length"; }>'.`,
      ),
    ).toBe("there is no dd here; there are u, d");
    expect(
      say(
        "Object literal may only specify known properties, but 'rh' does not exist in type 'A'. Did you mean to write 'rho'?",
      ),
    ).toBe("there is no rh here; rho is meant?");
  });
  it("cuts long types and keeps everything else as the compiler says it", () => {
    expect(say("Cannot find name 'foo'.")).toBe("Cannot find name 'foo'");
    const long = `Property 'x' does not exist on type '${"a".repeat(300)}'.`;
    expect(say(long).length).toBeLessThan(150);
  });
});

describe("the report of a refused cell", () => {
  const source = "const p = 1;\n\tconst q: number = p.x;\n";
  it("gives the message once, the source line, and a caret under the place", () => {
    const { traceback, line, evalue } = refusal([at(2322, "It does not fit.")], source);
    expect(traceback).toEqual(["line 2: It does not fit\n  \tconst q: number = p.x;\n  \t     ^"]);
    expect({ line, evalue }).toEqual({ line: 2, evalue: "It does not fit" });
  });
  it("is a TypeMismatch for types that do not fit, and not for what is misspelt", () => {
    expect(refusal([at(2345, "x")], source).ename).toBe("TypeMismatch");
    expect(refusal([at(2304, "Cannot find name 'a'.")], source).ename).toBe("CompileError");
    expect(refusal([at(2345, "x"), at(1005, "';' expected.")], source).ename).toBe("SyntaxError");
  });
  it("names a file beside the notebook, whose lines are not the cell's", () => {
    const { traceback, line } = refusal([{ ...at(2322, "No."), file: "side.ts" }], source);
    expect(traceback).toEqual(["side.ts, line 2: No"]);
    expect(line).toBeNull();
  });
});
