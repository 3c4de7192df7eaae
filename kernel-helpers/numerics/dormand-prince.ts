// Dormand and Prince, J. Comput. Appl. Math. 6 (1980) 19, the 5(4) pair with 7 stages; rows of the
// tableau. The last row is also the fifth-order result, so that the seventh stage starts the next step.
const A = [
  [],
  [1 / 5],
  [3 / 40, 9 / 40],
  [44 / 45, -56 / 15, 32 / 9],
  [19372 / 6561, -25360 / 2187, 64448 / 6561, -212 / 729],
  [9017 / 3168, -355 / 33, 46732 / 5247, 49 / 176, -5103 / 18656],
  [35 / 384, 0, 500 / 1113, 125 / 192, -2187 / 6784, 11 / 84],
] as const satisfies readonly (readonly number[])[];
const C = [0, 1 / 5, 3 / 10, 4 / 5, 8 / 9, 1, 1] as const;
// Fifth-order minus fourth-order weights.
const E = [71 / 57600, 0, -71 / 16695, 71 / 1920, -17253 / 339200, 22 / 525, -1 / 40] as const;
// Fourth-order dense output: Hairer, Norsett and Wanner, Solving Ordinary Differential Equations I,
// 2nd ed. (1993), section II.6.
const D = [
  -12715105075 / 11282082432,
  0,
  87487479700 / 32700410799,
  -10690763975 / 1880347072,
  701980252875 / 199316789632,
  -1453857185 / 822651844,
  69997945 / 29380423,
] as const;

/** One trial step: the state at its end, the estimated error of each component, and the stages. */
export interface Trial {
  readonly x: number;
  readonly h: number;
  readonly from: readonly number[];
  readonly to: readonly number[];
  readonly error: readonly number[];
  readonly stages: readonly (readonly number[])[];
}

/** A fifth-order step of dy/dx = rate(x, y); `first` is the rate at its start. */
export function dormandPrinceStep(
  rate: (x: number, y: readonly number[]) => readonly number[],
  start: {
    readonly x: number;
    readonly y: readonly number[];
    readonly first: readonly number[];
    readonly h: number;
  },
): Trial {
  const { x, y, first, h } = start;
  const stages: (readonly number[])[] = [first];
  let to: readonly number[] = y;
  for (let s = 1; s < 7; s++) {
    to = y.map((yi, i) => yi + h * weigh(A[s] as readonly number[], stages, i));
    stages.push(rate(x + (C[s] as number) * h, to));
  }
  const error = y.map((_, i) => h * weigh(E, stages, i));
  return { x, h, from: y, to, error, stages };
}

/** The state within an accepted step, at a part 0..1 of it. */
export function dormandPrinceAt(trial: Trial, part: number): readonly number[] {
  const { h, from, to, stages } = trial;
  return from.map((y0, i) => {
    const rise = (to[i] as number) - y0;
    const entry = h * ((stages[0] as readonly number[])[i] as number) - rise;
    const exit = rise - h * ((stages[6] as readonly number[])[i] as number) - entry;
    const bend = h * weigh(D, stages, i);
    return y0 + part * (rise + (1 - part) * (entry + part * (exit + (1 - part) * bend)));
  });
}

function weigh(w: readonly number[], stages: readonly (readonly number[])[], i: number): number {
  let sum = 0;
  for (let s = 0; s < w.length; s++)
    sum += (w[s] as number) * ((stages[s] as readonly number[])[i] as number);
  return sum;
}
