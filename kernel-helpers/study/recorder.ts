import { StudyError } from "../errors/index.js";
import {
  entityUse,
  typeName,
  type Fields,
  type OneOf,
  type Shape,
  type Struct,
  type Type,
  type Use,
} from "../method/index.js";
import { isKind, kinds, type Kind, type Unit } from "../units/index.js";
import { encode } from "./encode.js";
import { evaluate, type Done } from "./evaluate.js";
import type { Item, Verification } from "./item.js";
import type { Node } from "./node.js";
import type { Named, Statement } from "./notes.js";
import { typeJson } from "./type-json.js";
import type { Ref } from "./wires.js";
import type { WorkSheet } from "./work-sheet.js";

/** What every way of recording shares: arguments into nodes, evaluation, and keeping the item. */
export class Recorder {
  protected readonly sheet: WorkSheet;
  protected readonly within: string | null;
  constructor(sheet: WorkSheet, within: string | null) {
    this.sheet = sheet;
    this.within = within;
  }

  protected apply<S extends Shape, T extends Type>(
    op: "entity" | "step" | "run",
    id: string,
    use: Use<S, T>,
    wires: unknown,
    notes: Named,
  ): Ref<Type> {
    this.sheet.ledger.admit(id);
    const { args, done } = this.evaluate(id, use, wires as { readonly [name: string]: unknown });
    this.sheet.uses.set(use.id, use);
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

  protected evaluate(
    id: string,
    use: Use,
    wires: { readonly [name: string]: unknown },
  ): { args: { readonly [name: string]: Node }; done: Done } {
    const args = this.encodeAll(id, use.inputs, wires);
    return { args, done: evaluate(use, id, args, this.sheet.ledger.get) };
  }
  protected encodeAll(
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
  protected kindOf(ref: { readonly __ref: Type }, where: string): Kind {
    if (isKind(ref.__ref)) return ref.__ref;
    throw new StudyError({
      code: "wrong-kind",
      where,
      problem: `is a ${typeName(ref.__ref)}`,
      expected: `a number: ${Object.keys(kinds).slice(0, 3).join(", ")} …`,
    });
  }
  protected common(
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
  protected keep(item: Item, done: Done | null): Ref<Type> {
    this.sheet.ledger.put(item, done);
    return this.sheet.ledger.ref(item.id, done?.type ?? "dimensionless");
  }

  protected state(id: string, a: unknown, b: unknown, { op, notes }: Statement): unknown {
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
}
