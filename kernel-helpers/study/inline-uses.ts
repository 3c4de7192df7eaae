import { SolveError, StudyError } from "../errors/index.js";
import { dimensionOf, evaluateFormula, parseFormula } from "../method/formula/index.js";
import { oneOf, type Outcome, type Shape, type Type, type Use } from "../method/index.js";
import { kinds, type Dimension, type Kind } from "../units/index.js";
import type { Sense } from "./item.js";

// A formula, a comparison and a check are uses that the study makes itself, so that recording, replay
// and samples treat them like any declared method.

const bare = { revision: 1, uses: [], role: "method" as const };
const value = (live: unknown): Outcome => ({ live, findings: [], looked: [], diagnostics: {} });

/** An expression an analyst made up, checked for dimensions against the kind it is said to give. */
export function formulaUse(
  id: string,
  text: string,
  args: { readonly [name: string]: Kind },
  kind: Kind,
): Use {
  const formula = parseFormula(text, Object.keys(args));
  const missing = formula.names.find((n) => !Object.hasOwn(args, n));
  if (missing !== undefined)
    throw new StudyError({
      code: "unknown-name",
      where: `${id}: ${text}`,
      problem: `"${missing}" is not among the values handed in`,
      expected: Object.keys(args).join(", ") || "no names at all",
    });
  const unused = Object.keys(args).find((n) => !formula.names.includes(n));
  if (unused !== undefined)
    throw new StudyError({
      code: "unused-name",
      where: `${id}: ${text}`,
      problem: `"${unused}" is handed in but the formula does not use it`,
    });
  const dims: Record<string, Dimension> = Object.fromEntries(
    Object.entries(args).map(([n, k]) => [n, kinds[k].dimension]),
  );
  const got = dimensionOf(formula, dims);
  const want = kinds[kind].dimension;
  if (got.some((x, i) => Math.abs(x - (want[i] ?? 0)) > 1e-12))
    throw new StudyError({
      code: "wrong-dimension",
      where: `${id}: ${text}`,
      problem: `has the dimension ${sayDimension(got)}`,
      expected: `${kinds[kind].words} (${sayDimension(want)})`,
    });
  return {
    ...bare,
    id: "formula",
    title: text,
    inputs: Object.fromEntries(Object.entries(args).map(([n, k]) => [n, { kind: k, note: "" }])),
    output: kind,
    apply: (v) => value(evaluateFormula(formula, v as unknown as Record<string, number>)),
  };
}
const sayDimension = (d: Dimension): string =>
  d
    .map((x, i) => (x === 0 ? "" : `${"MLTΘ".charAt(i)}${x === 1 ? "" : `^${x}`}`))
    .filter(Boolean)
    .join(" ") || "dimensionless";

/** (alternate − main)/|main|. */
export const compareUse = (kind: Kind): Use<Shape, "dimensionless"> => ({
  ...bare,
  id: "compare",
  title: "Relative difference",
  inputs: { main: { kind, note: "" }, alternate: { kind, note: "" } },
  output: "dimensionless",
  apply: (v) => {
    const { main, alternate } = v as unknown as { main: number; alternate: number };
    if (main !== 0) return value((alternate - main) / Math.abs(main));
    if (alternate === 0) return value(0);
    return value({ stop: "no-relative-difference", because: "the main value is zero" });
  },
});

export const verdicts = oneOf("pass", "fail");
export type Verdict = typeof verdicts;

export const checkUse = (type: Type, sense: Sense): Use<Shape, Verdict> => ({
  ...bare,
  id: "check",
  title: "Check",
  inputs: { value: { kind: type, note: "" }, limit: { kind: type, note: "" } },
  output: verdicts,
  apply: (v) => {
    const { value: x, limit } = v as unknown as { value: unknown; limit: unknown };
    if (sense === "is") return value(x === limit ? "pass" : "fail");
    return value((marginOf(sense, x, limit) ?? NaN) >= 0 ? "pass" : "fail");
  },
});

/** Positive on the good side; null for a choice. */
export function marginOf(sense: Sense, x: unknown, limit: unknown): number | null {
  if (sense === "is") return null;
  if (typeof x !== "number" || typeof limit !== "number")
    throw new SolveError({
      code: "wrong-kind",
      where: "check",
      problem: `cannot compare ${String(x)}`,
    });
  return sense === "at least" ? x - limit : limit - x;
}
