import { dormandPrinceAt, type Trial } from "./dormand-prince.js";
import { findRoot } from "./find-root.js";
import { finiteAt } from "./finite-at.js";
import {
  assertOdeProblem,
  type OdeEvent,
  type OdePoint,
  type OdeProblem,
  type OdeState,
} from "./ode-problem.js";
import { odeSteps } from "./ode-steps.js";

export interface OdeSolution<S extends OdeState> {
  /** At the wanted places that were reached, or at the start and every step's end. */
  readonly points: readonly OdePoint<S>[];
  readonly end: OdePoint<S>;
  readonly events: readonly (OdePoint<S> & { readonly name: string })[];
  /** The event that ended it, or null when `to` was reached. */
  readonly endedBy: string | null;
  readonly steps: number;
  readonly rejected: number;
}

/**
 * Integrates dy/dx = rate(x, y) with adaptive steps, for problems that are not stiff: Dormand and
 * Prince's 5(4) pair, with fourth-order output within a step.
 *
 * The root mean square over the components of error/(absolute + relative·|y|) is kept below 1 in each
 * step. An event is a change of sign between the ends of a step, located to 1e-12 of the step; one
 * that is zero at the start is not counted.
 *
 * Throws SolveError: `not-finite` (the rate is not finite at the start, or however short the step),
 * `step-too-small` (stiff or singular), `too-many-steps`; each says where it stood.
 */
export function integrateOde<S extends OdeState>(problem: OdeProblem<S>): OdeSolution<S> {
  assertOdeProblem(problem);
  const { from, to, start, at, events = [] } = problem;
  const sign = to >= from ? 1 : -1;
  const points: OdePoint<S>[] = [];
  const passed: (OdePoint<S> & { readonly name: string })[] = [];
  let end: OdePoint<S> = { x: from, y: start };
  const levelsAt = ({ x, y }: OdePoint<S>): number[] =>
    events.map((e) => finiteAt(e.of(x, y), x, e.name));
  let levels = levelsAt(end);
  let wanted = 0;
  let steps = 0;
  let rejected = 0;
  const solution = (endedBy: string | null): OdeSolution<S> => ({
    points,
    end,
    events: passed,
    endedBy,
    steps,
    rejected,
  });

  if (!at) points.push(end);
  for (; at && at[wanted] === from; wanted++) points.push(end);
  for (const step of odeSteps(problem)) {
    const { trial } = step;
    steps++;
    rejected = step.rejected;
    const within = (x: number): OdePoint<S> =>
      x === step.end
        ? { x, y: trial.to as S }
        : { x, y: dormandPrinceAt(trial, (x - trial.x) / trial.h) as S };
    let endedBy: string | null = null;
    end = within(step.end);
    const after = levelsAt(end);
    for (const { event, x } of crossings(events, levels, after, trial)) {
      const place = within(x);
      passed.push({ name: event.name, ...place });
      if (!event.isLast) continue;
      endedBy = event.name;
      end = place;
      break;
    }
    for (; at && wanted < at.length; wanted++) {
      const x = at[wanted] as number;
      if (sign * x > sign * end.x) break;
      points.push(within(x));
    }
    if (!at) points.push(end);
    if (endedBy !== null) return solution(endedBy);
    levels = after;
  }
  return solution(null);
}

/** The events of a step in order of travel. */
function crossings<S extends OdeState>(
  events: readonly OdeEvent<S>[],
  before: readonly number[],
  after: readonly number[],
  trial: Trial,
): { readonly event: OdeEvent<S>; readonly x: number }[] {
  const found: { event: OdeEvent<S>; x: number; part: number }[] = [];
  events.forEach((event, i) => {
    const a = before[i] as number;
    const b = after[i] as number;
    const isRising = a < 0 && b >= 0;
    const isFalling = a > 0 && b <= 0;
    if (
      !(isRising && event.direction !== "falling") &&
      !(isFalling && event.direction !== "rising")
    )
      return;
    const level = (part: number): number =>
      part === 0
        ? a
        : part === 1
          ? b
          : event.of(trial.x + part * trial.h, dormandPrinceAt(trial, part) as S);
    const part = findRoot(level, 0, 1, { absolute: 1e-12, where: event.name });
    found.push({ event, part, x: trial.x + part * trial.h });
  });
  return found.sort((p, q) => p.part - q.part);
}
