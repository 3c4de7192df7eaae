import type { Kind } from "./kinds.js";

/** A plain SI number whose kind lives in the type only: no boxing, and arithmetic on it is free. */
export type Quantity<K extends Kind> = number & { readonly __kind: K };

/** What a caller may pass for a kind: a bare number is dimensionless and nothing else. */
export type QuantityInput<K extends Kind> = K extends "dimensionless"
  ? number & { readonly __kind?: K }
  : Quantity<K>;
