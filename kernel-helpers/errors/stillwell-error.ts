/** What an error is made of; the text is built from these, so that tests and callers need not read prose. */
export interface ErrorParts {
  /** Stable, for tests and programs: `"out-of-bounds"`, `"duplicate-id"`. */
  readonly code: string;
  /** The field, item or file: `well.sections[1].bore`. */
  readonly where: string;
  /** What is wrong, with the value and its unit. */
  readonly problem: string;
  /** What would have been accepted. */
  readonly expected?: string;
  /** What the reader can do now. */
  readonly remedy?: string;
  readonly cause?: unknown;
}

/** `where: what is wrong; expected …; remedy`. */
export class StillwellError extends Error {
  readonly code: string;
  readonly where: string;
  readonly problem: string;
  readonly expected: string | null;
  readonly remedy: string | null;
  constructor(parts: ErrorParts) {
    const { code, where, problem, expected, remedy, cause } = parts;
    super(
      `${where}: ${problem}${expected ? `; expected ${expected}` : ""}${remedy ? `; ${remedy}` : ""}`,
      cause === undefined ? undefined : { cause },
    );
    this.name = new.target.name;
    this.code = code;
    this.where = where;
    this.problem = problem;
    this.expected = expected ?? null;
    this.remedy = remedy ?? null;
  }
}

/** A value that cannot be: a negative diameter, an unknown unit, a gap between sections. */
export class InputError extends StillwellError {}
/** A computation that found no answer it can defend. */
export class SolveError extends StillwellError {}
/** A study that contradicts itself, or a record that is not one. */
export class StudyError extends StillwellError {}
/** A notebook that cannot be run. */
export class NotebookError extends StillwellError {}
/** A package that cannot be written. */
export class RenderError extends StillwellError {}
