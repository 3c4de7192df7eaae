import type { Kind, Quantity } from "../units/index.js";
import type { Bound } from "./bound.js";
import type { Values } from "./readings.js";

/** What a name may stand for: a kind of quantity, or something made of kinds. */
export type Type = Present | Optional;
export type Present = Kind | Struct | AnyOf | List | OneOf | Profile | Text;
export type Shape = { readonly [name: string]: Type };

/** One named input or result of a declaration. */
export interface Field<T extends Type = Type> {
  readonly kind: T;
  readonly note: string;
  /** TeX, as printed in the equation. */
  readonly symbol?: string;
  /** What can be at all; anything else is refused. */
  readonly possible?: Bound;
  /** The range the source states (or `stated: false`: that we advise). Outside it is a finding. */
  readonly range?: Range;
  readonly stated?: boolean;
}
/** Lowest and highest value in SI, ends included; an open end is infinite. */
export type Range = readonly [low: number, high: number];
export type Fields<F extends Shape> = { readonly [N in keyof F]: Field<F[N]> };

/** A named group of fields with behaviour: an entity, or a model's result. */
export interface Struct<I extends string = string, F extends Shape = Shape, V = unknown> {
  readonly type: "struct";
  readonly id: I;
  readonly revision: number;
  readonly title: string;
  readonly fields: Fields<F>;
  build(values: Values<F>): V;
}
/** One of several structs, told apart by id. */
export interface AnyOf<S extends Struct = Struct> {
  readonly type: "anyOf";
  readonly among: readonly S[];
}
export interface List<T extends Type = Type> {
  readonly type: "list";
  readonly each: T;
}
export interface OneOf<C extends string = string> {
  readonly type: "oneOf";
  readonly among: readonly C[];
}
/** A quantity along the hole. */
export interface Profile<K extends Kind = Kind> {
  readonly type: "profile";
  readonly of: K;
}
/** May be absent, which is `null`. */
export interface Optional<T extends Present = Present> {
  readonly type: "optional";
  readonly of: T;
}
export interface Text {
  readonly type: "text";
}

export interface Along<K extends Kind> {
  readonly depth: readonly Quantity<"measuredDepth">[];
  readonly value: readonly Quantity<K>[];
}

export const list = <T extends Type>(each: T): List<T> => ({ type: "list", each });
export const oneOf = <C extends string>(...among: C[]): OneOf<C> => ({ type: "oneOf", among });
export const profile = <K extends Kind>(of: K): Profile<K> => ({ type: "profile", of });
export const anyOf = <S extends readonly Struct[]>(...among: S): AnyOf<S[number]> => ({
  type: "anyOf",
  among,
});
export const optional = <T extends Present>(of: T): Optional<T> => ({ type: "optional", of });
export const text: Text = { type: "text" };

/** How a type is called in a message: `"pressure"`, `"list of bore section"`. */
export function typeName(t: Type): string {
  if (typeof t === "string") return t;
  switch (t.type) {
    case "struct":
      return t.id;
    case "anyOf":
      return t.among.map((s) => s.id).join(" or ");
    case "list":
      return `list of ${typeName(t.each)}`;
    case "oneOf":
      return t.among.map((c) => JSON.stringify(c)).join(" or ");
    case "profile":
      return `profile of ${t.of}`;
    case "optional":
      return `${typeName(t.of)} or null`;
    case "text":
      return "text";
  }
}
