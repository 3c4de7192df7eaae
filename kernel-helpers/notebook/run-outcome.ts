/** The cell that ended a run. */
export interface FailedCell {
  /** 1-based among the code cells. */
  readonly index: number;
  readonly source: string;
  readonly ename: string;
  readonly evalue: string;
  readonly traceback: readonly string[];
  /** 1-based in the source, where it is known. */
  readonly line: number | null;
}

/** What came of running a notebook from top to bottom. */
export interface RunOutcome {
  readonly status: "ok" | "failed" | "timeout" | "died" | "interrupted";
  readonly file: string;
  readonly failedCell: FailedCell | null;
  /** Code cells that ran to their end without an error. */
  readonly cellsRun: number;
  readonly codeCells: number;
  readonly ms: number;
  /** The last draft record of each study, by its id. */
  readonly drafts: ReadonlyMap<string, unknown>;
}
