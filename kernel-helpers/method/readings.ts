import type { Kind, QuantityInput } from "../units/index.js";
import type {
  Along,
  AnyOf,
  List,
  OneOf,
  Optional,
  Profile,
  Shape,
  Struct,
  Text,
} from "./descriptors.js";

/** What a computation receives for a type. */
export type Value<T> = T extends Kind
  ? QuantityInput<T>
  : T extends Struct<infer _I, infer _F, infer V>
    ? V
    : T extends AnyOf<infer S>
      ? Value<S>
      : T extends List<infer E>
        ? readonly Value<E>[]
        : T extends OneOf<infer C>
          ? C
          : T extends Profile<infer K>
            ? Along<K>
            : T extends Optional<infer O>
              ? Value<O> | null
              : T extends Text
                ? string
                : never;

export type OptionalNames<F extends Shape> = {
  [N in keyof F]: F[N] extends Optional ? N : never;
}[keyof F];

export type Values<F extends Shape> = { readonly [N in keyof F]: Value<F[N]> };

/** What a caller passes by hand: fields that may be absent may be left out. */
export type Entered<F extends Shape> = {
  readonly [N in Exclude<keyof F, OptionalNames<F>>]: Value<F[N]>;
} & { readonly [N in OptionalNames<F>]?: Value<F[N]> };

/** What a computation may return for a type: kinds are bare SI numbers. */
export type Plain<T> = T extends Kind
  ? number
  : T extends Struct<infer _I, infer F, infer _V>
    ? Plains<F>
    : T extends AnyOf<infer S>
      ? Plain<S>
      : T extends List<infer E>
        ? readonly Plain<E>[]
        : T extends OneOf<infer C>
          ? C
          : T extends Profile
            ? { readonly depth: readonly number[]; readonly value: readonly number[] }
            : T extends Optional<infer O>
              ? Plain<O> | null
              : T extends Text
                ? string
                : never;
export type Plains<F extends Shape> = { readonly [N in keyof F]: Plain<F[N]> };

/** What `.si` takes: bare SI numbers under checked names. */
export type Bare<F extends Shape> = {
  readonly [N in keyof F]: F[N] extends Kind ? number : Value<F[N]>;
};
