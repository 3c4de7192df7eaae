import { assertFields } from "./assert-fields.js";
import type { Fields, Shape, Struct } from "./descriptors.js";
import type { Finding } from "./finding.js";
import type { Method, MethodFacts } from "./method.js";
import { RangeWatch } from "./range-check.js";
import type { Bare, Entered, Plains, Values } from "./readings.js";
import type { Outcome, Stop, Use } from "./use.js";
import type { Kind } from "../units/index.js";

/** Handed to a solver, to report on the converged state. */
export interface Look {
  /** Evaluates a method and notes its range findings, merged over all depths. */
  <S extends Shape, K extends Kind>(method: Method<S, K>, args: Bare<S>, depth?: number): number;
  /** A remark of the model's own that must reach the reader. */
  advise(says: string): void;
  /** Iterations, residuals, step counts. */
  diagnose(name: string, value: number | string): void;
}

/** Keeps the compiler from inferring a shape from what `solve` returns: the declared results rule. */
type Settled<T> = [T][T extends unknown ? 0 : never];

export interface ModelParts<I extends string, S extends Shape, R extends Shape> {
  readonly id: I;
  readonly revision: number;
  readonly title: string;
  /** What it solves and what it leaves out, in sentences for the package. */
  readonly about: readonly string[];
  readonly uses: readonly MethodFacts[];
  /** Numerical tolerances, stated in the package. */
  readonly tolerances: { readonly [name: string]: number };
  readonly inputs: Fields<S>;
  readonly results: Fields<R>;
  readonly cautions?: readonly string[];
  readonly solve: (args: Values<S>, look: Look) => Plains<Settled<R>> | Stop;
}

export interface Explained<R extends Shape> {
  readonly result: Values<R> | Stop;
  readonly findings: readonly Finding[];
  readonly diagnostics: Outcome["diagnostics"];
}

export interface Model<I extends string = string, S extends Shape = Shape, R extends Shape = Shape>
  extends
    Use<S, Struct<I, R, Values<R>>>,
    Pick<ModelParts<I, S, R>, "about" | "tolerances" | "cautions"> {
  /** The result, or a typed stop. */
  (args: Entered<S>): Values<R> | Stop;
  readonly role: "model";
  readonly uses: readonly MethodFacts[];
  /** The result with its findings and diagnostics. */
  readonly explain: (args: Entered<S>) => Explained<R>;
}

export function model<I extends string, S extends Shape, R extends Shape>(
  parts: ModelParts<I, S, R>,
): Model<I, S, R> {
  const { inputs, results, solve, uses, ...rest } = parts;
  const output: Struct<I, R, Values<R>> = {
    type: "struct",
    id: parts.id,
    revision: parts.revision,
    title: parts.title,
    fields: results,
    build: (v) => v,
  };
  const apply = (args: Values<S>): Outcome => {
    assertFields(inputs, args, parts.id);
    const watch = new RangeWatch();
    const advice = new Set<string>();
    const looked = new Set<string>();
    const diagnostics: Record<string, number | string> = {};
    const look: Look = Object.assign(
      <A extends Shape, K extends Kind>(
        method: Method<A, K>,
        a: Bare<A>,
        depth?: number,
      ): number => {
        looked.add(method.id);
        watch.look(method.id, method.rules, a as never, depth ?? null);
        return method.si(a);
      },
      {
        advise: (says: string) => void advice.add(says),
        diagnose: (name: string, x: number | string) => void (diagnostics[name] = x),
      },
    );
    const live = solve(args, look);
    return {
      live,
      findings: [
        ...watch.findings(),
        ...[...advice].map((says): Finding => ({ code: "advice", by: parts.id, says })),
      ],
      looked: [...looked].sort(),
      diagnostics,
    };
  };
  const explain = (args: Entered<S>): Explained<R> => {
    const { live, findings, diagnostics } = apply(args as Values<S>);
    return { result: live as Values<R> | Stop, findings, diagnostics };
  };
  return Object.assign((args: Entered<S>) => explain(args).result, {
    ...rest,
    role: "model" as const,
    inputs,
    uses,
    output,
    apply,
    explain,
  });
}
