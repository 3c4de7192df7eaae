import type {
  AnyOf,
  List,
  OneOf,
  Optional,
  OptionalNames,
  Profile,
  Shape,
  Struct,
  Text,
  Type,
  Value,
  Along,
} from "../method/index.js";
import type { Column, Frame } from "../tables/index.js";
import type { Kind, QuantityInput, Unit } from "../units/index.js";
import type { Path } from "./node.js";

/** A handle to a recorded item, or to a part of one. `value` reads the study as it is now. */
export interface Ref<T> {
  readonly __ref: T;
  readonly id: string;
  readonly path: Path;
  readonly value: Value<T>;
  /** A part: a field by name, a member by index, a profile at a depth (which may itself be a Ref). */
  readonly at: At<T>;
  /** A profile, a list or a result of profiles as columns with units, for `toCsv` or to compute with. */
  columns(): Column[];
  /** The same as a danfojs frame, loaded when first asked for. */
  frame(): Promise<Frame>;
  /** For texts: the same value, shown in a unit of the author's choice. */
  readonly in: T extends Kind ? (unit: Unit<T>) => Shown : never;
}
/** Any handle to something of a type, whatever can be done with it: what lists and sentences take. */
export type AnyRef<T> = Pick<Ref<T>, "__ref" | "id" | "path" | "value">;
export interface Shown {
  readonly shown: AnyRef<Type>;
  readonly unit: string;
}

export type At<T> =
  T extends Struct<infer _I, infer F, infer _V>
    ? <N extends keyof F & string>(name: N) => Ref<F[N]>
    : T extends List<infer E>
      ? (index: number) => Ref<E>
      : T extends Profile<infer K>
        ? (depth: Wired<"measuredDepth">) => Ref<K>
        : never;

/** What a recorded call accepts for a type: a value, a Ref, or a tree of both. */
export type Wired<T> =
  | Ref<T>
  | (T extends Kind
      ? QuantityInput<T>
      : T extends Struct<infer _I, infer F, infer _V>
        ? Wires<F>
        : T extends AnyOf<infer S>
          ? Wired<S>
          : T extends List<infer E>
            ? readonly Wired<E>[]
            : T extends OneOf<infer C>
              ? C
              : T extends Profile<infer K>
                ? Along<K>
                : T extends Optional<infer O>
                  ? Wired<O> | null
                  : T extends Text
                    ? string
                    : never);
export type Wires<F extends Shape> = {
  readonly [N in Exclude<keyof F, OptionalNames<F>>]: Wired<F[N]>;
} & { readonly [N in OptionalNames<F>]?: Wired<F[N]> };

export type FieldsOf<E> = E extends Struct<infer _I, infer F, infer _V> ? F : never;

/** By tag, not by class: the package may be loaded twice in one kernel. */
export const isRef = (x: unknown): x is AnyRef<Type> =>
  typeof x === "object" && x !== null && "__ref" in x && "path" in x;
