import { SolveError } from "../errors/index.js";
import { dormandPrinceStep, type Trial } from "./dormand-prince.js";
import type { OdeProblem, OdeState } from "./ode-problem.js";

type Rate = (x: number, y: readonly number[]) => readonly number[];

/** An accepted step, and how many trials were rejected up to it. */
export interface OdeStep {
  readonly trial: Trial;
  /** The end of the step: exactly `to` for the last one. */
  readonly end: number;
  readonly rejected: number;
}

/**
 * The accepted steps of an integration, each as long as the tolerance allows. A proportional-integral
 * controller damps their sequence: Hairer, Norsett and Wanner (1993), section II.4.
 */
export function* odeSteps<S extends OdeState>(problem: OdeProblem<S>): Generator<OdeStep> {
  const { from, to, largestStep = Infinity, maxSteps = 10_000, where = "integration" } = problem;
  const rate: Rate = (x, y) => problem.rate(x, y as S);
  const sign = to >= from ? 1 : -1;
  const largest = Math.min(largestStep, Math.abs(to - from));
  const smallest = 16 * Number.EPSILON * Math.max(Math.abs(from), Math.abs(to));

  let x = from;
  let y: readonly number[] = problem.start;
  let first = rate(x, y);
  assertFirst(first, x, y, where);
  let size = Math.min(problem.firstStep ?? guess(problem, rate, first, sign), largest);
  let errorBefore = 1e-4;
  let rejected = 0;
  let isRetry = false;

  for (let count = 0; x !== to; count++) {
    if (count >= maxSteps)
      throw stuck("too-many-steps", `${maxSteps} steps were not enough`, x, y, where);
    const rest = Math.abs(to - x);
    // A sliver that rounding would leave for a step of its own is taken along.
    const isFinal = size >= rest * (1 - 1e-10);
    const length = isFinal ? rest : size;
    const trial = dormandPrinceStep(rate, { x, y, first, h: sign * length });
    const error = norm(trial.error, trial.from, trial.to, problem);
    if (error <= 1) {
      const end = isFinal ? to : x + trial.h;
      yield { trial, end, rejected };
      const growth = 0.9 * Math.max(error, 1e-10) ** -0.17 * errorBefore ** 0.04;
      size = Math.min(length * Math.min(isRetry ? 1 : 10, Math.max(0.2, growth)), largest);
      errorBefore = Math.max(error, 1e-4);
      isRetry = false;
      x = end;
      y = trial.to;
      first = trial.stages[6] as readonly number[];
    } else {
      rejected++;
      isRetry = true;
      size = length * (Number.isFinite(error) ? Math.max(0.2, 0.9 * error ** -0.2) : 0.2);
      if (size > smallest) continue;
      if (!Number.isFinite(error))
        throw stuck("not-finite", "the rate is not finite, however short the step", x, y, where);
      throw stuck("step-too-small", `a step of ${size} is still too long`, x, y, where);
    }
  }
}

/** Root mean square of a vector in units of the tolerance; NaN or infinite when a component is. */
function norm(
  v: readonly number[],
  y0: readonly number[],
  y1: readonly number[],
  { relative, absolute }: Pick<OdeProblem<OdeState>, "relative" | "absolute">,
): number {
  let sum = 0;
  for (let i = 0; i < v.length; i++) {
    const floor = typeof absolute === "number" ? absolute : (absolute[i] as number);
    const size = Math.max(Math.abs(y0[i] as number), Math.abs(y1[i] as number));
    sum += ((v[i] as number) / (floor + relative * size)) ** 2;
  }
  return Math.sqrt(sum / v.length);
}

/** A first step for which an explicit Euler step changes the state little; same source. */
function guess<S extends OdeState>(
  problem: OdeProblem<S>,
  rate: Rate,
  first: readonly number[],
  sign: number,
): number {
  const { from, to, start } = problem;
  const d0 = norm(start, start, start, problem);
  const d1 = norm(first, start, start, problem);
  const whole = Math.abs(to - from);
  const euler = Math.min(d0 < 1e-5 || d1 < 1e-5 ? 1e-6 * whole : 0.01 * (d0 / d1), whole);
  const there = start.map((y, i) => y + sign * euler * (first[i] as number));
  const second = rate(from + sign * euler, there);
  const change = second.map((r, i) => r - (first[i] as number));
  const d2 = norm(change, start, start, problem) / euler;
  if (!Number.isFinite(d2)) return euler;
  const steepest = Math.max(d1, d2);
  const next = steepest <= 1e-15 ? Math.max(1e-6 * whole, euler * 1e-3) : (0.01 / steepest) ** 0.2;
  return Math.min(100 * euler, next);
}

function assertFirst(
  first: readonly number[],
  x: number,
  y: readonly number[],
  where: string,
): void {
  if (first.length !== y.length)
    throw stuck("wrong-length", `the rate has ${first.length} components`, x, y, where);
  if (!first.every(Number.isFinite))
    throw stuck("not-finite", `the rate is [${first.join(", ")}]`, x, y, where);
}

const stuck = (code: string, says: string, x: number, y: readonly number[], where: string) =>
  new SolveError({ code, where, problem: `${says} at ${x}, where the state is [${y.join(", ")}]` });
