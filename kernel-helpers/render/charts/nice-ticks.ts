import { InputError } from "../../errors/index.js";

export interface Ticks {
  /** The nth multiple of the step, without the error that multiplying adds. */
  readonly multiple: (n: number) => number;
  readonly values: readonly number[];
  readonly step: number;
  /** As many as the step needs. */
  readonly decimals: number;
}

/** Round numbers within a range, about `count` of them: steps of 1, 2 or 5 times a power of ten. */
export function niceTicks([from, to]: readonly [number, number], count: number): Ticks {
  if (!(Number.isFinite(from) && Number.isFinite(to) && from < to))
    throw new InputError({
      code: "bad-range",
      where: "axis",
      problem: `its range is ${from} to ${to}`,
      expected: "two numbers, the smaller one first",
    });
  const raw = (to - from) / Math.max(count, 1);
  const power = Math.floor(Math.log10(raw));
  const mantissa = raw / 10 ** power;
  const factor = mantissa < 1.5 ? 1 : mantissa < 3.5 ? 2 : mantissa < 7.5 ? 5 : 10;
  const digits = factor === 10 ? power + 1 : power;
  const unit = factor === 10 ? 1 : factor;
  // Multiples of a power of ten below one are not exact; quotients are.
  const value = (n: number): number =>
    digits < 0 ? (n * unit) / 10 ** -digits : n * unit * 10 ** digits;
  const step = value(1);
  const slack = 1e-9;
  const values: number[] = [];
  for (let n = Math.ceil(from / step - slack); n <= Math.floor(to / step + slack); n++)
    values.push(value(n) + 0); // no −0
  return { multiple: value, values, step, decimals: Math.max(0, -digits) };
}

/** A range widened to the round numbers around it; a single value gets room on both sides. */
export function niceRange(values: readonly number[], count: number): readonly [number, number] {
  let from = Infinity;
  let to = -Infinity;
  for (const value of values) {
    from = Math.min(from, value);
    to = Math.max(to, value);
  }
  if (from === to) {
    const room = from === 0 ? 1 : Math.abs(from) * 0.1;
    from -= room;
    to += room;
  }
  const { step, multiple } = niceTicks([from, to], count);
  const slack = 1e-9;
  return [
    multiple(Math.floor(from / step + slack)) + 0,
    multiple(Math.ceil(to / step - slack)) + 0,
  ];
}
