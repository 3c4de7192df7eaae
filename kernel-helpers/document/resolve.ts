import { StudyError } from "../errors/index.js";
import { readProfile, type Stop } from "../method/index.js";
import {
  hasResult,
  type Body,
  type Declaration,
  type DeclaredField,
  type Item,
  type Node,
  type PlainJson,
  type TypeJson,
} from "../study/index.js";
import { isKind } from "../units/index.js";

export interface Known {
  readonly type: TypeJson;
  readonly value: PlainJson;
}
export type Resolved = Known | Stop;
type Fields = { readonly [name: string]: PlainJson };

/** Reads values out of a record: nothing is computed, nothing but the record is needed. */
export class Resolver {
  private readonly items: ReadonlyMap<string, Item>;
  private readonly declared: ReadonlyMap<string, Declaration>;
  constructor(readonly body: Body) {
    this.items = new Map(body.items.map((i) => [i.id, i]));
    this.declared = new Map(body.declared.map((d) => [d.id, d]));
  }

  item(id: string): Item {
    return this.items.get(id) ?? missing(id, "is referred to but is not in the record");
  }
  declaration(id: string): Declaration {
    return this.declared.get(id) ?? missing(id, "is used but its declaration is not in the record");
  }

  /** The fields of a struct: an entity's inputs, or a model's results. */
  fieldsOf(id: string): { readonly [name: string]: DeclaredField } {
    const d = this.declaration(id);
    return d.role === "model" ? d.results : d.inputs;
  }

  ofItem(item: Item): Resolved {
    if (!hasResult(item)) return missing(item.id, `a ${item.op} has no value`);
    return "stop" in item.result ? item.result : { type: item.type, value: item.result.value };
  }

  resolve(node: Node, type: TypeJson): Resolved {
    if ("ref" in node) {
      let at = this.ofItem(this.item(node.ref));
      for (const p of node.path) {
        if ("stop" in at) return at;
        at = this.part(at, p, node.ref);
      }
      return at;
    }
    if ("si" in node) return { type: node.kind, value: node.si };
    if ("choice" in node) return { type, value: node.choice };
    if ("text" in node) return { type: "text" in node ? { type: "text" } : type, value: node.text };
    if ("absent" in node) return { type, value: null };
    if ("along" in node)
      return {
        type: { type: "profile", of: node.along },
        value: { depth: node.depth, value: node.value },
      };
    if ("list" in node) {
      const each = !isKind(type) && type.type === "list" ? type.each : "dimensionless";
      const all = node.list.map((n) => this.resolve(n, each));
      return all.find((r) => "stop" in r) ?? { type, value: all.map((r) => (r as Known).value) };
    }
    const fields = this.fieldsOf(node.of);
    const value: Record<string, PlainJson> = {};
    for (const [n, field] of Object.entries(fields)) {
      const r = this.resolve(node.fields[n] ?? { absent: true }, field.type);
      if ("stop" in r) return r;
      value[n] = r.value;
    }
    return { type: { type: "struct", id: node.of }, value };
  }

  private part(
    { type, value }: Known,
    p: string | number | { readonly depth: Node },
    where: string,
  ): Resolved {
    if (typeof p === "object") {
      const depth = this.resolve(p.depth, "measuredDepth");
      if ("stop" in depth) return depth;
      const of = !isKind(type) && type.type === "profile" ? type.of : "dimensionless";
      return { type: of, value: readProfile(value as never, depth.value as number, where) };
    }
    if (!isKind(type) && type.type === "list" && typeof p === "number") {
      const found = (value as readonly PlainJson[])[p];
      return found === undefined
        ? missing(where, `has no member ${p}`)
        : { type: type.each, value: found };
    }
    if (!isKind(type) && type.type === "struct" && typeof p === "string") {
      const field = this.fieldsOf(type.id)[p];
      const found = (value as Fields)[p];
      if (field && found !== undefined) return { type: field.type, value: found };
    }
    return missing(where, `has no part ${JSON.stringify(p)}`);
  }
}

const missing = (where: string, problem: string): never => {
  throw new StudyError({ code: "not-found", where, problem });
};
