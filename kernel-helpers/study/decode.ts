import { StudyError } from "../errors/index.js";
import { readProfile, typeName, type Along, type Type } from "../method/index.js";
import { isKind, type Kind } from "../units/index.js";
import type { Node } from "./node.js";

export interface Live {
  readonly type: Type;
  readonly live: unknown;
}
export type Get = (id: string) => Live;

/** A node → the live value a computation receives. Recording, replay and samples all make arguments this way. */
export function decode(type: Type, node: Node, get: Get, where: string): unknown {
  if ("ref" in node) return readRef(type, node, get, where);
  if (isKind(type)) {
    if ("si" in node && node.kind === type && Number.isFinite(node.si)) return node.si;
    throw malformed(type, where);
  }
  switch (type.type) {
    case "optional":
      return "absent" in node ? null : decode(type.of, node, get, where);
    case "list":
      if ("list" in node)
        return node.list.map((n, i) => decode(type.each, n, get, `${where}[${i}]`));
      break;
    case "oneOf":
      if ("choice" in node && type.among.includes(node.choice)) return node.choice;
      break;
    case "text":
      if ("text" in node) return node.text;
      break;
    case "profile":
      if ("along" in node && node.along === type.of)
        return { depth: node.depth, value: node.value };
      break;
    case "anyOf": {
      const struct = "fields" in node ? type.among.find((s) => s.id === node.of) : undefined;
      if (struct) return decode(struct, node, get, where);
      break;
    }
    case "struct":
      if ("fields" in node && node.of === type.id) {
        if (node.revision !== type.revision)
          throw new StudyError({
            code: "revised",
            where,
            problem: `was made with ${type.id} revision ${node.revision}; this version has revision ${type.revision}`,
          });
        return type.build(
          Object.fromEntries(
            Object.entries(type.fields).map(([n, f]) => {
              const field = node.fields[n];
              if (field === undefined) throw malformed(f.kind, `${where}.${n}`);
              return [n, decode(f.kind, field, get, `${where}.${n}`)];
            }),
          ),
        );
      }
  }
  throw malformed(type, where);
}

function readRef(
  type: Type,
  node: Extract<Node, { ref: string }>,
  get: Get,
  where: string,
): unknown {
  let at: Live = get(node.ref);
  for (const p of node.path) {
    const next = partType(at.type, p, node.ref);
    at = {
      type: next,
      live:
        typeof p === "object"
          ? readProfile(
              at.live as Along<Kind>,
              decode("measuredDepth", p.depth, get, node.ref) as number,
              node.ref,
            )
          : own(at.live, p, node.ref),
    };
  }
  if (fits(at.type, type)) return at.live; // the item as it is now, not as the reference remembers it
  throw new StudyError({
    code: "wrong-kind",
    where,
    problem: `got ${typeName(at.type)} from "${node.ref}"`,
    expected: typeName(type),
  });
}

function fits(got: Type, wanted: Type): boolean {
  if (typeName(got) === typeName(wanted)) return true;
  if (typeof wanted === "string") return false;
  if (wanted.type === "optional") return fits(got, wanted.of);
  return wanted.type === "anyOf" && wanted.among.some((s) => fits(got, s));
}

/** The type of a part: a field by name, a member by index, a profile at a depth. */
export function partType(type: Type, p: unknown, where: string): Type {
  if (typeof type !== "string") {
    if (type.type === "struct" && typeof p === "string" && Object.hasOwn(type.fields, p)) {
      const field = type.fields[p];
      if (field) return field.kind;
    }
    if (type.type === "list" && typeof p === "number") return type.each;
    if (type.type === "profile" && typeof p === "object") return type.of;
  }
  throw new StudyError({
    code: "missing",
    where,
    problem: `a ${typeName(type)} has no part ${JSON.stringify(p)}`,
  });
}

function own(x: unknown, key: string | number, where: string): unknown {
  if (typeof x === "object" && x !== null && Object.hasOwn(x, key))
    return (x as { readonly [key: string | number]: unknown })[key];
  throw new StudyError({ code: "missing", where, problem: `has no "${key}"` });
}

const malformed = (type: Type, where: string): StudyError =>
  new StudyError({
    code: "malformed",
    where,
    problem: `the record does not hold a ${typeName(type)} here`,
  });
