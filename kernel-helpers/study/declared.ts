import type {
  Direction,
  Fields,
  MethodFacts,
  Model,
  Shape,
  Source,
  Struct,
  Type,
  Use,
} from "../method/index.js";
import type { Kind } from "../units/index.js";
import { typeJson, type TypeJson } from "./type-json.js";

export interface DeclaredField {
  readonly type: TypeJson;
  readonly symbol: string | null;
  readonly note: string;
}
interface Declared {
  readonly id: string;
  readonly revision: number;
  readonly title: string;
  readonly inputs: { readonly [name: string]: DeclaredField };
}
/** A method as it was when the record was made, so that a package can be made from the record alone. */
export interface DeclaredMethod extends Declared {
  readonly role: "method";
  readonly tex: string;
  readonly source: Source;
  readonly result: { readonly kind: Kind; readonly symbol: string; readonly note: string };
  readonly ranges: readonly {
    readonly group: string;
    readonly kind: Kind;
    readonly range: readonly [number | null, number | null];
    readonly stated: boolean;
    readonly note: string | null;
  }[];
  readonly uses: readonly string[];
  readonly checks: readonly {
    readonly from: Source;
    readonly basis: string;
    readonly rows: number;
  }[];
  readonly direction: Direction | null;
  readonly cautions: readonly string[];
}
export interface DeclaredModel extends Declared {
  readonly role: "model";
  readonly about: readonly string[];
  readonly results: { readonly [name: string]: DeclaredField };
  readonly uses: readonly { readonly id: string; readonly revision: number }[];
  readonly tolerances: { readonly [name: string]: number };
  readonly cautions: readonly string[];
}
export interface DeclaredEntity extends Declared {
  readonly role: "entity";
}
export type Declaration = DeclaredMethod | DeclaredModel | DeclaredEntity;

// The role tells: only `method()` and `model()` make uses of theirs.
const isMethod = (use: Use): use is Use & MethodFacts => use.role === "method" && "tex" in use;
const isModel = (use: Use): use is Use & ModelFacts => use.role === "model" && "about" in use;
type ModelFacts = Pick<Model, "about" | "tolerances" | "cautions" | "uses"> & { output: Struct };

/** Everything the uses of a record declare, once each, sorted by id: methods, models, and the structs of their types. */
export function declaredBy(uses: Iterable<Use | Struct>): Declaration[] {
  const found = new Map<string, Declaration>();
  const addStructs = (fields: Fields<Shape>): void => {
    for (const f of Object.values(fields)) addType(f.kind);
  };
  const addType = (t: Type): void => {
    if (typeof t === "string") return;
    if (t.type === "list") addType(t.each);
    else if (t.type === "optional") addType(t.of);
    else if (t.type === "anyOf") t.among.forEach(addType);
    else if (t.type === "struct" && !found.has(t.id)) {
      found.set(t.id, {
        role: "entity",
        id: t.id,
        revision: t.revision,
        title: t.title,
        inputs: declaredFields(t.fields),
      });
      addStructs(t.fields);
    }
  };
  const addMethod = (u: MethodFacts): void => {
    if (found.has(u.id)) return;
    found.set(u.id, declaredMethod(u));
    u.uses.forEach(addMethod);
  };
  const addModel = (m: Use & ModelFacts): void => {
    if (found.get(m.id)?.role === "model") return;
    found.set(m.id, {
      role: "model",
      id: m.id,
      revision: m.revision,
      title: m.title,
      inputs: declaredFields(m.inputs),
      about: m.about,
      results: declaredFields(m.output.fields),
      uses: m.uses.map(({ id, revision }) => ({ id, revision })),
      tolerances: m.tolerances,
      cautions: m.cautions ?? [],
    });
    addStructs(m.inputs);
    addStructs(m.output.fields);
    m.uses.forEach(addMethod);
  };
  for (const use of uses) {
    if (!("role" in use)) addType(use);
    else if (isMethod(use)) addMethod(use);
    else if (isModel(use)) addModel(use);
    else addType(use.output);
  }
  return [...found.values()].sort((a, b) => (a.id < b.id ? -1 : 1));
}

export const declaredFields = (fields: Fields<Shape>): { readonly [name: string]: DeclaredField } =>
  Object.fromEntries(
    Object.entries(fields).map(([n, f]) => [
      n,
      { type: typeJson(f.kind), symbol: f.symbol ?? null, note: f.note },
    ]),
  );

export const declaredMethod = (u: MethodFacts): DeclaredMethod => ({
  role: "method",
  id: u.id,
  revision: u.revision,
  title: u.title,
  inputs: declaredFields(u.inputs),
  tex: u.tex,
  source: u.source,
  result: u.result,
  ranges: u.rules.map(({ group, kind, range: [low, high], stated, note }) => ({
    group,
    kind,
    range: [Number.isFinite(low) ? low : null, Number.isFinite(high) ? high : null],
    stated,
    note: note ?? null,
  })),
  uses: u.uses.map((m) => m.id),
  checks: u.checks.map(({ from, basis, rows }) => ({ from, basis, rows: rows.length })),
  direction: u.direction ?? null,
  cautions: u.cautions ?? [],
});
