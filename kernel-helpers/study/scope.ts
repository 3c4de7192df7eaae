import { StudyError } from "../errors/index.js";
import {
  entityUse,
  typeName,
  type Fields,
  type Method,
  type Model,
  type OneOf,
  type Shape,
  type Struct,
  type Type,
  type Use,
  type Values,
} from "../method/index.js";
import { isKind, kinds, type Kind, type QuantityInput, type Unit } from "../units/index.js";
import type { ChartUse } from "./chart-use.js";
import { encode } from "./encode.js";
import { evaluate, type Done } from "./evaluate.js";
import { checkUse, compareUse, formulaUse, marginOf, type Verdict } from "./inline-uses.js";
import type { Item, Sense, Spread, TableColumn, Verification } from "./item.js";
import type { Node } from "./node.js";
import type { WorkSheet } from "./work-sheet.js";
import { typeJson } from "./type-json.js";
import { isRef, type FieldsOf, type Ref, type Shown, type Wired, type Wires } from "./wires.js";

export interface Named {
  /** What the package calls it; the id with spaces when left out. */
  readonly title?: string;
  /** TeX symbol. */
  readonly symbol?: string;
}
export interface GivenNotes extends Named {
  readonly source: string;
  readonly spread?: Spread;
}
export interface AssumedNotes extends Named {
  readonly reason: string;
  /** How it can be verified, by whom (a role), and whether approval has to wait for it. */
  readonly verify: { readonly how: string; readonly by: string; readonly required?: boolean };
  readonly spread?: Spread;
}
export interface FileOf {
  readonly file?: { readonly name: string; readonly sha256: string };
}
export interface CheckNotes extends Named {
  /** Where the limit comes from. */
  readonly because: string;
}
type Statement =
  | { readonly op: "given"; readonly notes: GivenNotes & FileOf }
  | { readonly op: "assumed"; readonly notes: AssumedNotes & FileOf };

/** A part of a study that records: the study itself, or one of its sections. */
export class Scope {
  protected readonly sheet: WorkSheet;
  protected readonly within: string | null;
  constructor(sheet: WorkSheet, within: string | null) {
    this.sheet = sheet;
    this.within = within;
  }

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
    args: { readonly [name: string]: Ref<Kind> | QuantityInput<"dimensionless"> },
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
        findings: done.findings,
      },
      done,
    ) as unknown as Ref<Verdict>;
  }

  /** A sentence with recorded values in it: s.conclude("falls", { checks: [c] })`It falls at ${v}.` */
  conclude(
    id: string,
    notes: Named & { readonly checks: readonly Ref<Verdict>[] },
  ): (words: TemplateStringsArray, ...values: readonly (Ref<Type> | Shown | string)[]) => void {
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
    const nodes = this.encodeAll(id, chart.inputs, args as { readonly [name: string]: unknown });
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
        readonly of: Ref<Type> | readonly (Ref<Type> | string)[];
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
        : (of as readonly (Ref<Type> | string)[]).map((x, i): Node =>
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

  private state(id: string, a: unknown, b: unknown, { op, notes }: Statement): unknown {
    this.sheet.ledger.admit(id);
    const because = op === "given" ? notes.source : notes.reason;
    const verify: Verification | null =
      op === "given"
        ? null
        : { how: notes.verify.how, by: notes.verify.by, required: notes.verify.required ?? true };
    if (typeof because !== "string" || because.trim() === "")
      throw new StudyError({
        code: "no-source",
        where: id,
        problem: op === "given" ? "has no source" : "has no reason",
        remedy:
          op === "given"
            ? "say where it comes from, or record it as assumed"
            : "say why it is reasonable",
      });
    const common = { ...this.common(id, notes), op, because, verify };
    if (typeof a === "number" || typeof a === "string") {
      const unit = b as Unit<Kind>;
      const value = unit(a);
      this.sheet.known.note(id, unit.kind, value);
      const done: Done = {
        type: unit.kind,
        live: value,
        result: { value },
        findings: [],
        looked: [],
        diagnostics: {},
      };
      return this.keep(
        {
          ...common,
          form: "number",
          type: unit.kind,
          typed: a,
          unit: unit.symbol,
          spread: notes.spread ?? null,
          result: { value },
        },
        done,
      );
    }
    const type = a as OneOf | Struct;
    if (type.type === "oneOf") {
      encode(type, b, id, this.sheet.ledger.owns);
      const result = { value: b as string };
      return this.keep(
        { ...common, form: "choice", type: typeJson(type), result },
        { type, live: b, result, findings: [], looked: [], diagnostics: {} },
      );
    }
    const use = entityUse(type);
    const { args, done } = this.evaluate(id, use, b as { readonly [name: string]: unknown });
    if ("stop" in done.result)
      throw new StudyError({ code: "no-value", where: id, problem: done.result.because });
    this.sheet.uses.set(use.id, type);
    return this.keep(
      {
        ...common,
        form: "object",
        use: type.id,
        revision: type.revision,
        args,
        file: notes.file ?? null,
        type: typeJson(type),
        result: done.result,
      },
      done,
    );
  }

  private apply<S extends Shape, T extends Type>(
    op: "entity" | "step" | "run",
    id: string,
    use: Use<S, T>,
    wires: unknown,
    notes: Named,
  ): Ref<Type> {
    this.sheet.ledger.admit(id);
    const { args, done } = this.evaluate(
      id,
      use as unknown as Use,
      wires as { readonly [name: string]: unknown },
    );
    this.sheet.uses.set(use.id, use as unknown as Use);
    return this.keep(
      {
        ...this.common(id, notes),
        op,
        use: use.id,
        revision: use.revision,
        args,
        type: typeJson(use.output),
        result: done.result,
        findings: [...done.findings, ...this.sheet.known.findings(args, id)],
        looked: done.looked,
        diagnostics: done.diagnostics,
      },
      done,
    );
  }

  private evaluate(
    id: string,
    use: Use,
    wires: { readonly [name: string]: unknown },
  ): { args: { readonly [name: string]: Node }; done: Done } {
    const args = this.encodeAll(id, use.inputs, wires);
    return { args, done: evaluate(use, id, args, this.sheet.ledger.get) };
  }
  private encodeAll(
    id: string,
    inputs: Fields<Shape>,
    wires: { readonly [name: string]: unknown },
  ): { readonly [name: string]: Node } {
    for (const name of Object.keys(wires))
      if (!Object.hasOwn(inputs, name))
        throw new StudyError({
          code: "unknown-field",
          where: `${id}.${name}`,
          problem: "is not an input",
          expected: Object.keys(inputs).join(", "),
        });
    return Object.fromEntries(
      Object.entries(inputs).map(([n, f]) => [
        n,
        encode(f.kind, wires[n], `${id}.${n}`, this.sheet.ledger.owns),
      ]),
    );
  }
  private kindOf(ref: { readonly __ref: Type }, where: string): Kind {
    if (isKind(ref.__ref)) return ref.__ref;
    throw new StudyError({
      code: "wrong-kind",
      where,
      problem: `is a ${typeName(ref.__ref)}`,
      expected: `a number: ${Object.keys(kinds).slice(0, 3).join(", ")} …`,
    });
  }
  private common(
    id: string,
    notes: Named,
  ): { id: string; section: string | null; title: string; symbol: string | null } {
    return {
      id,
      section: this.within,
      title: notes.title ?? id.replace(/[-_.]/g, " "),
      symbol: notes.symbol ?? null,
    };
  }
  private keep(item: Item, done: Done | null): Ref<Type> {
    this.sheet.ledger.put(item, done);
    return this.sheet.ledger.ref(item.id, done?.type ?? "dimensionless");
  }
}
