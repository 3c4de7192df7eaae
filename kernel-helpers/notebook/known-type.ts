import type { Kind } from "../units/index.js";

/**
 * What the compiler knows of a value that the value itself does not tell: a quantity is a bare
 * number at run time. Null where there is nothing to tell.
 */
export type KnownType = KnownQuantity | KnownList | KnownFields;
export interface KnownQuantity {
  readonly kind: Kind;
}
export interface KnownList {
  readonly each: KnownType;
}
export interface KnownFields {
  readonly fields: { readonly [name: string]: KnownType };
}
