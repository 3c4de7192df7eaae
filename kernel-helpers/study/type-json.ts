import type { Type } from "../method/index.js";
import type { Kind } from "../units/index.js";

/** A type as the record keeps it; structs by name, their fields stand once under `declared`. */
export type TypeJson =
  | Kind
  | { readonly type: "struct"; readonly id: string }
  | { readonly type: "anyOf"; readonly among: readonly string[] }
  | { readonly type: "list"; readonly each: TypeJson }
  | { readonly type: "oneOf"; readonly among: readonly string[] }
  | { readonly type: "profile"; readonly of: Kind }
  | { readonly type: "optional"; readonly of: TypeJson }
  | { readonly type: "text" };

export function typeJson(t: Type): TypeJson {
  if (typeof t === "string") return t;
  switch (t.type) {
    case "struct":
      return { type: "struct", id: t.id };
    case "anyOf":
      return { type: "anyOf", among: t.among.map((s) => s.id) };
    case "list":
      return { type: "list", each: typeJson(t.each) };
    case "oneOf":
      return { type: "oneOf", among: [...t.among] };
    case "profile":
      return { type: "profile", of: t.of };
    case "optional":
      return { type: "optional", of: typeJson(t.of) };
    case "text":
      return { type: "text" };
  }
}
