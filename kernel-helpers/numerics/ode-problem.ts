import { InputError } from "../errors/index.js";

/** A state is a list of numbers of fixed length; a tuple stays a tuple. */
export type OdeState = readonly number[] | readonly [];

export interface OdePoint<S extends OdeState> {
  readonly x: number;
  readonly y: S;
}

/** A place where a function of the state passes zero. */
export interface OdeEvent<S extends OdeState> {
  readonly name: string;
  readonly of: (x: number, y: S) => number;
  readonly direction: "rising" | "falling" | "either";
  /** Whether the integration ends there. */
  readonly isLast: boolean;
}

export interface OdeProblem<S extends OdeState> {
  /** dy/dx, as long as the state. NaN says that a trial left the domain: the step is then cut. */
  readonly rate: (x: number, y: S) => S;
  readonly from: number;
  /** May lie below `from`. */
  readonly to: number;
  readonly start: S;
  /** Error of each component per step, relative to its size. */
  readonly relative: number;
  /** Error per step of components at or near zero: one for all, or one for each. */
  readonly absolute: number | readonly number[];
  /** Where the state is wanted, in order of travel; every step's end when left out. */
  readonly at?: readonly number[];
  readonly events?: readonly OdeEvent<S>[];
  readonly firstStep?: number;
  /** Two zeros of an event within one step are not seen: bound the step where that can happen. */
  readonly largestStep?: number;
  /** Trial steps; 10 000 unless given. */
  readonly maxSteps?: number;
  /** What is being integrated. */
  readonly where?: string;
}

/** Throws unless the problem is complete and its wanted places lie on the way. */
export function assertOdeProblem(p: Omit<OdeProblem<OdeState>, "rate" | "events">): void {
  const { from, to, start, relative, absolute, at = [], where = "integration" } = p;
  const tolerances = typeof absolute === "number" ? [absolute] : absolute;
  const refuse = (code: string, problem: string, expected: string): never => {
    throw new InputError({ code, where, problem, expected });
  };
  if (!Number.isFinite(from) || !Number.isFinite(to))
    refuse("bad-range", `cannot run from ${from} to ${to}`, "two finite ends");
  if (start.length === 0 || !start.every(Number.isFinite))
    refuse("bad-start", `cannot start at [${start.join(", ")}]`, "at least one finite component");
  if (!(relative > 0 && relative < 1))
    refuse("bad-tolerance", `relative tolerance ${relative}`, "a number between 0 and 1");
  if (typeof absolute !== "number" && absolute.length !== start.length)
    refuse("bad-tolerance", `${absolute.length} absolute tolerances`, `one, or ${start.length}`);
  if (!tolerances.every((a) => a > 0 && Number.isFinite(a)))
    refuse("bad-tolerance", `absolute tolerance ${tolerances.join(", ")}`, "positive numbers");
  for (const [name, step] of [
    ["firstStep", p.firstStep],
    ["largestStep", p.largestStep],
  ] as const)
    if (step !== undefined && !(step > 0))
      refuse("bad-step", `${name} ${step}`, "a positive length");
  const sign = to >= from ? 1 : -1;
  at.forEach((x, i) => {
    const before = at[i - 1] ?? from;
    if (sign * x >= sign * before && sign * x <= sign * to) return;
    refuse("bad-output", `${x} is wanted after ${before}`, `places in order from ${from} to ${to}`);
  });
}
