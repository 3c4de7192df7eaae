import { SolveError } from "../errors/index.js";
import type { Kind, Quantity, Unit } from "../units/index.js";
import { assertFields, fieldRules } from "./assert-fields.js";
import type { Fields, Range, Shape } from "./descriptors.js";
import type { Finding } from "./finding.js";
import { RangeWatch, type RangeRule } from "./range-check.js";
import type { Bare, Entered, Values } from "./readings.js";
import type { Outcome, Source, Use } from "./use.js";

/** What a check value rests on; a number from our own code is never one. */
export type Basis =
  | "published worked example"
  | "published table"
  | "standard"
  | "general reference library"
  | "exact limit or identity"
  | "common practice, no source"
  | "from memory";

/** One value from outside the project. */
export interface CheckRow<S extends Shape, K extends Kind> {
  readonly given: Entered<S>;
  /** As printed; half its last digit is the tolerance unless `within` says otherwise. */
  readonly printed: string;
  /** Unit of `printed`; SI when left out. */
  readonly in?: Unit<K>;
  /** Relative tolerance, with the reason. */
  readonly within?: number;
  readonly because?: string;
}
export interface Check<S extends Shape, K extends Kind> {
  readonly from: Source;
  readonly basis: Basis;
  readonly rows: readonly CheckRow<S, K>[];
}

/** On which side a method errs, so that each conclusion can take the unfavourable one. */
export interface Direction {
  readonly safeFor: string;
  readonly unsafeFor: string;
}

export interface MethodParts<S extends Shape, K extends Kind> {
  readonly id: string;
  /** Raised whenever a result can change. */
  readonly revision: number;
  readonly title: string;
  /**
   * The right-hand side; the output symbol stands before it. A relation that is solved for its output
   * is written whole, behind `x:\\ ` with x the symbol it is solved for.
   */
  readonly tex: string;
  readonly source: Source;
  readonly inputs: Fields<S>;
  /** Ranges of groups made of inputs. */
  readonly within?: {
    readonly [group: string]: {
      readonly of: (args: Bare<S>) => number;
      readonly range: Range;
      readonly stated: boolean;
      readonly note?: string;
    };
  };
  readonly output: { readonly kind: K; readonly symbol: string; readonly note: string };
  readonly compute: (args: Bare<S>) => number;
  /** The methods this one composes. */
  readonly uses?: readonly MethodFacts[];
  readonly checks: readonly Check<S, K>[];
  readonly direction?: Direction;
  /** Cautions that a package shows when this method is used. */
  readonly cautions?: readonly string[];
  /** Why the equation does not keep its form under a change of units, where it does not. */
  readonly dimensional?: string;
  /** Methods for the same thing share a family: they are each other's alternates. */
  readonly family: string;
}

/** What can be told of a method whatever its inputs are: for registries, records and catalogues. */
export interface MethodFacts {
  readonly role: "method";
  readonly id: string;
  readonly revision: number;
  readonly title: string;
  readonly family: string;
  readonly tex: string;
  readonly source: Source;
  readonly inputs: Fields<Shape>;
  readonly result: { readonly kind: Kind; readonly symbol: string; readonly note: string };
  readonly rules: readonly RangeRule[];
  readonly uses: readonly MethodFacts[];
  readonly checks: readonly {
    readonly from: Source;
    readonly basis: Basis;
    readonly rows: readonly { readonly printed: string }[];
  }[];
  readonly direction?: Direction;
  readonly cautions?: readonly string[];
  readonly dimensional?: string;
}

export interface Method<S extends Shape = Shape, K extends Kind = Kind>
  extends
    Use<S, K>,
    Pick<
      MethodParts<S, K>,
      "family" | "tex" | "source" | "within" | "checks" | "direction" | "cautions" | "dimensional"
    > {
  /** Explore: checks what is possible, returns a quantity. */
  (args: Entered<S>): Quantity<K>;
  readonly role: "method";
  readonly uses: readonly MethodFacts[];
  readonly result: { readonly kind: K; readonly symbol: string; readonly note: string };
  /** For solvers: bare SI numbers, names checked, nothing else. */
  readonly si: (args: Bare<S>) => number;
  /** Range findings of these arguments. */
  readonly findings: (args: Entered<S>) => readonly Finding[];
  readonly rules: readonly RangeRule[];
}

export function method<S extends Shape, K extends Kind>(parts: MethodParts<S, K>): Method<S, K> {
  const { compute, inputs, output, uses = [], within = {}, ...rest } = parts;
  const rules: RangeRule[] = [
    ...fieldRules(inputs),
    ...Object.entries(within).map(([group, g]) => ({
      group,
      kind: "dimensionless" as const,
      range: g.range,
      stated: g.stated,
      ...(g.note === undefined ? {} : { note: g.note }),
      of: g.of,
    })),
  ];
  const value = (args: Values<S>): number => {
    assertFields(inputs, args, parts.id);
    const x = compute(args as Bare<S>);
    if (Number.isFinite(x)) return x + 0;
    throw new SolveError({
      code: "not-finite",
      where: parts.id,
      problem: `gives ${String(x)} for ${JSON.stringify(args)} (SI)`,
    });
  };
  const findings = (args: Values<S>): Finding[] => {
    const watch = new RangeWatch();
    watch.look(parts.id, rules, args as never);
    return watch.findings();
  };
  const apply = (args: Values<S>): Outcome => ({
    live: value(args),
    findings: findings(args),
    looked: [],
    diagnostics: {},
  });
  const call = (args: Entered<S>): Quantity<K> => value(args as Values<S>) as Quantity<K>;
  return Object.assign(call, {
    ...rest,
    role: "method" as const,
    inputs,
    within,
    uses,
    output: output.kind,
    result: output,
    si: compute,
    findings: findings as (args: Entered<S>) => Finding[],
    rules,
    apply,
  });
}
