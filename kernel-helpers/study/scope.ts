import type { Method, Model, OneOf, Shape, Struct, Type, Values } from "../method/index.js";
import { entityUse } from "../method/index.js";
import type { Kind, QuantityInput, Unit } from "../units/index.js";
import type { ChartUse } from "./chart-use.js";
import { encode } from "./encode.js";
import { checkUse, compareUse, formulaUse, marginOf, type Verdict } from "./inline-uses.js";
import type { Sense, TableColumn } from "./item.js";
import type { Node } from "./node.js";
import type { AssumedNotes, CheckNotes, FileOf, GivenNotes, Named } from "./notes.js";
import { Recorder } from "./recorder.js";
import { typeJson } from "./type-json.js";
import {
  isRef,
  type AnyRef,
  type FieldsOf,
  type Ref,
  type Shown,
  type Wired,
  type Wires,
} from "./wires.js";

/** A part of a study that records: the study itself, or one of its sections. */
export class Scope extends Recorder {
  /** A number with its unit as typed, a whole object, or one of several choices; with its source. */
  given<K extends Kind>(
    id: string,
    typed: number | string,
    unit: Unit<K>,
    notes: GivenNotes,
  ): Ref<K>;
  given<E extends Struct>(
    id: string,
    entity: E,
    fields: Wires<FieldsOf<E>>,
    notes: GivenNotes & FileOf,
  ): Ref<E>;
  given<C extends string>(id: string, among: OneOf<C>, choice: C, notes: GivenNotes): Ref<OneOf<C>>;
  given(id: string, a: unknown, b: unknown, notes: GivenNotes & FileOf): unknown {
    return this.state(id, a, b, { op: "given", notes });
  }

  /** The same for what nobody measured: with the reason, and how and by whom it can be verified. */
  assumed<K extends Kind>(
    id: string,
    typed: number | string,
    unit: Unit<K>,
    notes: AssumedNotes,
  ): Ref<K>;
  assumed<E extends Struct>(
    id: string,
    entity: E,
    fields: Wires<FieldsOf<E>>,
    notes: AssumedNotes & FileOf,
  ): Ref<E>;
  assumed<C extends string>(
    id: string,
    among: OneOf<C>,
    choice: C,
    notes: AssumedNotes,
  ): Ref<OneOf<C>>;
  assumed(id: string, a: unknown, b: unknown, notes: AssumedNotes & FileOf): unknown {
    return this.state(id, a, b, { op: "assumed", notes });
  }

  /** A typed object made of recorded values; its fields are reached with `.at("density")`. */
  entity<E extends Struct>(
    id: string,
    entity: E,
    fields: Wires<FieldsOf<E>>,
    notes: Named = {},
  ): Ref<E> {
    return this.apply("entity", id, entityUse(entity), fields, notes) as unknown as Ref<E>;
  }
  /** One published method. */
  step<S extends Shape, K extends Kind>(
    id: string,
    method: Method<S, K>,
    args: Wires<S>,
    notes: Named = {},
  ): Ref<K> {
    return this.apply("step", id, method, args, {
      symbol: method.result.symbol,
      ...notes,
    }) as unknown as Ref<K>;
  }
  /** One model; its results are reached with `.at("upflow")`. */
  run<I extends string, S extends Shape, R extends Shape>(
    id: string,
    model: Model<I, S, R>,
    args: Wires<S>,
    notes: Named = {},
  ): Ref<Struct<I, R, Values<R>>> {
    return this.apply("run", id, model, args, notes) as unknown as Ref<Struct<I, R, Values<R>>>;
  }

  /** An expression of your own, checked for dimensions: `s.formula("net", "v - u", { v, u }, "velocity")`. */
  formula<K extends Kind>(
    id: string,
    text: string,
    args: { readonly [name: string]: AnyRef<Kind> | QuantityInput<"dimensionless"> },
    kind: K,
    notes: Named = {},
  ): Ref<K> {
    this.sheet.ledger.admit(id);
    const argKinds = Object.fromEntries(
      Object.entries(args).map(([n, x]) => [
        n,
        isRef(x) ? this.kindOf(x, `${id}.${n}`) : ("dimensionless" as const),
      ]),
    );
    const use = formulaUse(id, text, argKinds, kind);
    const { args: nodes, done } = this.evaluate(id, use, args);
    return this.keep(
      {
        ...this.common(id, notes),
        op: "formula",
        text,
        kinds: argKinds,
        args: nodes,
        type: kind,
        result: done.result,
        findings: done.findings,
      },
      done,
    ) as unknown as Ref<K>;
  }

  /** A second way to the same number: the relative difference, (alternate − main)/|main|. */
  compare<K extends Kind>(
    id: string,
    main: Ref<K>,
    alternate: Ref<K>,
    notes: Named & { readonly because: string },
  ): Ref<"dimensionless"> {
    this.sheet.ledger.admit(id);
    const of = this.kindOf(main, `${id}.main`);
    const { args, done } = this.evaluate(id, compareUse(of), { main, alternate });
    return this.keep(
      {
        ...this.common(id, notes),
        op: "compare",
        of,
        because: notes.because,
        args,
        type: "dimensionless",
        result: done.result,
        findings: done.findings,
      },
      done,
    ) as unknown as Ref<"dimensionless">;
  }

  /** A value against a limit, with margin and verdict. */
  check<K extends Kind>(
    id: string,
    value: Ref<K>,
    sense: "at least" | "at most",
    limit: Wired<K>,
    notes: CheckNotes,
  ): Ref<Verdict>;
  check<C extends string>(
    id: string,
    value: Ref<OneOf<C>>,
    sense: "is",
    limit: C,
    notes: CheckNotes,
  ): Ref<Verdict>;
  check(
    id: string,
    value: { readonly __ref: Type; readonly value: unknown },
    sense: Sense,
    limit: unknown,
    notes: CheckNotes,
  ): Ref<Verdict> {
    this.sheet.ledger.admit(id);
    const type = value.__ref;
    const { args, done } = this.evaluate(id, checkUse(type, sense), { value, limit });
    const margin =
      "stop" in done.result
        ? null
        : marginOf(sense, value.value, isRef(limit) ? limit.value : limit);
    return this.keep(
      {
        ...this.common(id, notes),
        op: "check",
        sense,
        of: typeJson(type),
        margin,
        because: notes.because,
        args,
        type: typeJson(done.type),
        result: done.result,
        findings: [...done.findings, ...this.sheet.known.findings(args, id)],
      },
      done,
    ) as unknown as Ref<Verdict>;
  }

  /** A sentence with recorded values in it: s.conclude("falls", { checks: [c] })`It falls at ${v}.` */
  conclude(
    id: string,
    notes: Named & { readonly checks: readonly Ref<Verdict>[] },
  ): (words: TemplateStringsArray, ...values: readonly (AnyRef<Type> | Shown | string)[]) => void {
    return (words, ...values) => {
      const parts = words.flatMap((w, i) => {
        const v = values[i];
        if (v === undefined) return [w];
        if (typeof v === "string") return [w, v];
        const [ref, unit] = "shown" in v ? [v.shown, v.unit] : [v, null];
        return [w, { node: encode(ref.__ref, ref, id, this.sheet.ledger.owns), unit }];
      });
      this.keep(
        {
          ...this.common(id, notes),
          op: "conclude",
          parts: parts.filter((p) => p !== ""),
          checks: notes.checks.map((c) => c.id),
        },
        null,
      );
    };
  }

  /** A warning that the package shows in its own place. */
  caution(id: string, text: string, notes: Named = {}): void {
    this.keep({ ...this.common(id, notes), op: "caution", text }, null);
  }

  /** A drawing of recorded values, by a chart's id; nothing is copied. */
  figure<S extends Shape>(
    id: string,
    chart: ChartUse<S>,
    args: Wires<S>,
    notes: Named & { readonly caption: string },
  ): void {
    const nodes = this.encodeAll(id, chart.inputs, args);
    this.keep(
      {
        ...this.common(id, notes),
        op: "figure",
        chart: chart.id,
        revision: chart.revision,
        args: nodes,
        caption: notes.caption,
      },
      null,
    );
  }

  /** Columns of recorded values: a profile or a list, or one reference a row. */
  table(
    id: string,
    notes: Named & {
      readonly caption: string;
      readonly columns: readonly {
        readonly head: string;
        readonly of: AnyRef<Type> | readonly (AnyRef<Type> | string)[];
        readonly unit?: Unit<Kind>;
      }[];
    },
  ): void {
    const { owns } = this.sheet.ledger;
    const columns = notes.columns.map(({ head, of, unit }): TableColumn => ({
      head,
      unit: unit?.symbol ?? null,
      of: isRef(of)
        ? encode(of.__ref, of, `${id}.${head}`, owns)
        : of.map((x, i): Node =>
            typeof x === "string" ? { text: x } : encode(x.__ref, x, `${id}.${head}[${i}]`, owns),
          ),
    }));
    this.keep({ ...this.common(id, notes), op: "table", columns, caption: notes.caption }, null);
  }

  /** A part of the study with a heading of its own. */
  section(id: string, title: string, about?: string): Scope {
    this.sheet.addSection({ id, title, about: about ?? null, within: this.within });
    return new Scope(this.sheet, id);
  }
}
