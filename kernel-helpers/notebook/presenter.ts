import type { MimeBundle } from "./cell-outputs.js";
import type { KnownType } from "./known-type.js";

/** Shows one sort of value. `known` is what the compiler knows of it, where a kernel asked. */
export interface Presenter {
  claims(value: unknown, known: KnownType | null): boolean;
  bundle(value: unknown, known: KnownType | null): MimeBundle | Promise<MimeBundle>;
}
