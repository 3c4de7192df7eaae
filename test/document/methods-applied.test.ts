import { describe, expect, it } from "vitest";
import { packageView } from "../../kernel-helpers/document/index.js";
import { methodsApplied } from "../../kernel-helpers/document/methods-applied.js";
import { method, oneOf } from "../../kernel-helpers/method/index.js";
import { Study } from "../../kernel-helpers/study/index.js";
import { mps } from "../../kernel-helpers/units/index.js";

const law = (id: string, factor: number) =>
  method({
    id,
    revision: 1,
    family: "test",
    title: `Law ${factor}`,
    tex: `${factor}x`,
    source: { cite: "derivation", where: "definition" },
    inputs: { x: { kind: "velocity", symbol: "x", note: "speed" } },
    output: { kind: "velocity", symbol: "y", note: "speed" },
    compute: ({ x }) => factor * x,
    checks: [],
    cautions: [`Law ${factor} is a guess.`],
  });
const first = law("law-one", 1);
const second = law("law-two", 2);
const third = law("law-three", 3);
const chooser = method({
  id: "law-chosen",
  revision: 1,
  family: "test",
  title: "By a law",
  tex: "y(x)",
  source: { cite: "derivation", where: "definition" },
  uses: [first, second, third],
  inputs: {
    x: { kind: "velocity", symbol: "x", note: "speed" },
    law: { kind: oneOf("law-one", "law-two", "law-three"), note: "law" },
  },
  output: { kind: "velocity", symbol: "y", note: "speed" },
  compute: ({ x, law: name }) =>
    (name === "law-one" ? first : name === "law-two" ? second : third).si({ x }),
  checks: [],
});

function chosenTwice(): Study {
  const s = new Study({
    id: "laws",
    title: "Laws",
    number: "L-1",
    revision: "A",
    purpose: "To choose.",
    decision: "None.",
    prepared: "analyst",
  });
  s.step("by-one", chooser, { x: mps(1), law: "law-one" });
  s.step("by-two", chooser, { x: mps(1), law: "law-two" });
  return s;
}

describe("methods that took part", () => {
  it("include every law that a method was told to use, and none that it was not", () => {
    expect([...methodsApplied(chosenTwice().record().body)].sort()).toEqual([
      "law-chosen",
      "law-one",
      "law-two",
    ]);
  });
  it("alone give cautions and cards, each card naming the steps that used it", () => {
    const { cautions, methods } = packageView(chosenTwice().record(), []);
    expect(cautions.slice(1).map((c) => [c.text, c.from?.to])).toEqual([
      ["Law 1 is a guess.", "method-law-one"],
      ["Law 2 is a guess.", "method-law-two"],
    ]);
    expect(methods.map((m) => [m.id, m.usedIn.map((l) => l.text).join(" ")])).toEqual([
      ["law-chosen", "S1 S2"],
      ["law-one", "S1"],
      ["law-two", "S2"],
    ]);
  });
});
