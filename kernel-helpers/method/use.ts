import type { Fields, Shape, Type } from "./descriptors.js";
import type { Finding } from "./finding.js";
import type { Values } from "./readings.js";

/** An answer that is not a number: "no flowing solution", with the reason. */
export interface Stop {
  readonly stop: string;
  readonly because: string;
}
export const isStop = (x: unknown): x is Stop =>
  typeof x === "object" && x !== null && typeof (x as Stop).stop === "string" && "because" in x;

/** What came of applying a declared thing to its inputs. */
export interface Outcome {
  readonly live: unknown;
  readonly findings: readonly Finding[];
  /** Ids of the methods a model evaluated on its converged state. */
  readonly looked: readonly string[];
  /** How a solver fared: iterations, residuals. Not compared in replay. */
  readonly diagnostics: { readonly [name: string]: number | string };
}

export interface Source {
  /** Id in references.json, or "derivation" for an exact result derived in the note. */
  readonly cite: string;
  readonly where: string;
}

/** To a study, method, model and entity are one thing: named inputs, an output type, a pure function. */
export interface Use<S extends Shape = Shape, T extends Type = Type> {
  readonly role: "method" | "model" | "entity";
  readonly id: string;
  readonly revision: number;
  readonly title: string;
  readonly inputs: Fields<S>;
  readonly output: T;
  /** Ids and revisions of the methods this one composes. */
  readonly uses: readonly { readonly id: string; readonly revision: number }[];
  apply(args: Values<S>): Outcome;
}
