import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { InputError } from "../../kernel-helpers/errors/index.js";
import { method, type Method } from "../../kernel-helpers/method/index.js";
import { holdsGravity } from "../../kernel-helpers/physics/gravity.js";
import { methods } from "../../kernel-helpers/physics/registry.js";
import type { AnyArguments, AnyMethod } from "../../kernel-helpers/physics/any-method.js";
import { isKind, kinds, type Kind } from "../../kernel-helpers/units/index.js";
import { argumentsOf, SEED } from "./arguments.js";

/** New base units for mass, length and time; where gravity stands as a number, those that keep it. */
const free = { M: 3, L: 5, T: 7 };
const withGravity = { M: 3, L: 49, T: 7 };
type Base = typeof free;

const factor = (kind: Kind, { M, L, T }: Base): number => {
  const [m, l, t] = kinds[kind].dimension;
  return M ** m * L ** l * T ** t;
};

function rescaled(m: AnyMethod, args: AnyArguments, base: Base): AnyArguments {
  const out: { [name: string]: number | string } = {};
  for (const [name, x] of Object.entries(args)) {
    const kind = m.inputs[name]?.kind;
    out[name] = typeof x === "number" && isKind(kind) ? x * factor(kind, base) : x;
  }
  return out;
}

/** Largest relative departure from the result rescaled by its own kind. */
function departure(m: AnyMethod, base: Base): number {
  let worst = 0;
  fc.assert(
    fc.property(argumentsOf(m), (args) => {
      let here: number;
      try {
        here = m.si(args);
      } catch (e) {
        if (e instanceof InputError) return;
        throw e;
      }
      const there = m.si(rescaled(m, args, base)) / factor(m.result.kind, base);
      const scale = Math.max(Math.abs(here), Math.abs(there));
      if (scale > 0) worst = Math.max(worst, Math.abs(here - there) / scale);
    }),
    SEED,
  );
  return worst;
}

describe("a change of base units", () => {
  it.each(methods.map((m) => [m.id, m] as const))("leaves %s the same law", (_, m) => {
    expect(m.dimensional === undefined || m.dimensional === holdsGravity).toBe(true);
    expect(departure(m, m.dimensional ? withGravity : free)).toBeLessThan(1e-9);
  });
  it.each(methods.filter((m) => m.dimensional).map((m) => [m.id, m] as const))(
    "shows the gravity in %s when it is not kept",
    (_, m) => {
      expect(departure(m, free)).toBeGreaterThan(1e-3);
    },
  );
  it("exposes a law with a wrong power", () => {
    const wrong: Method<{ v: "velocity"; D: "length" }, "frequency"> = method({
      id: "wrong",
      revision: 1,
      family: "wrong",
      title: "wrong",
      tex: "v/D^2",
      source: { cite: "derivation", where: "" },
      inputs: { v: { kind: "velocity", note: "" }, D: { kind: "length", note: "" } },
      output: { kind: "frequency", symbol: "", note: "" },
      compute: ({ v, D }) => v / D ** 2,
      checks: [],
    });
    expect(departure(wrong, free)).toBeGreaterThan(0.5);
  });
});
