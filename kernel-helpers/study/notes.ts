import type { Spread } from "./item.js";

export interface Named {
  /** What the package calls it; the id with spaces when left out. */
  readonly title?: string;
  /** TeX symbol. */
  readonly symbol?: string;
}
export interface GivenNotes extends Named {
  readonly source: string;
  readonly spread?: Spread;
}
export interface AssumedNotes extends Named {
  readonly reason: string;
  /** How it can be verified, by whom (a role), and whether approval has to wait for it. */
  readonly verify: { readonly how: string; readonly by: string; readonly required?: boolean };
  readonly spread?: Spread;
}
export interface FileOf {
  readonly file?: { readonly name: string; readonly sha256: string };
}
export interface CheckNotes extends Named {
  /** Where the limit comes from. */
  readonly because: string;
}

export type Statement =
  | { readonly op: "given"; readonly notes: GivenNotes & FileOf }
  | { readonly op: "assumed"; readonly notes: AssumedNotes & FileOf };
