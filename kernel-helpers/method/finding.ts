/** Something a reader must know about a result that is not an error: it travels with the result. */
export interface Finding {
  readonly code: "out-of-range" | "pass-the-reference" | "advice";
  /** The method, model or item that says it. */
  readonly by: string;
  /** One sentence. */
  readonly says: string;
  /** For ranges: which group, its worst value and the range. */
  readonly group?: string;
  readonly worst?: number;
  readonly range?: readonly [number | null, number | null];
  /** For models: at how many of how many places. */
  readonly count?: readonly [outside: number, of: number];
}
