import type { DeclaredSource } from "./declared-sources.mjs";

export interface Lock {
  readonly [id: string]: { readonly revision: number; readonly hash: string };
}
export interface LockFault {
  readonly id: string;
  readonly code: "gone" | "new" | "lowered" | "raised" | "changed";
  readonly says: string;
}
export function lockOf(declared: readonly DeclaredSource[]): Lock;
export function lockFaults(declared: readonly DeclaredSource[], lock: Lock): LockFault[];
