import { InputError } from "../errors/index.js";
import { kinds, type Kind } from "../units/index.js";

/** What a number can be at all. */
export interface Bound {
  readonly above?: number;
  readonly from?: number;
  readonly below?: number;
  readonly to?: number;
}
export const positive: Bound = { above: 0 };
export const notNegative: Bound = { from: 0 };
/** Between nothing and all, neither included: a voidage. */
export const properFraction: Bound = { above: 0, below: 1 };
export const fractionOrWhole: Bound = { from: 0, to: 1 };

/** Throws unless the number is finite and within its bound; `where` names the field. */
export function assertPossible(
  x: unknown,
  kind: Kind,
  bound: Bound | undefined,
  where: string,
): asserts x is number {
  if (typeof x === "number" && Number.isFinite(x) && holds(x, bound)) return;
  const { si, words } = kinds[kind];
  throw new InputError({
    code: typeof x === "number" && Number.isFinite(x) ? "out-of-bounds" : "not-a-number",
    where,
    problem: `cannot be ${typeof x === "string" ? JSON.stringify(x) : String(x)}${si === "1" ? "" : ` ${si}`}`,
    expected: bound ? `${words} ${sayBound(bound)}` : words,
  });
}

const holds = (x: number, b: Bound | undefined): boolean =>
  !b ||
  ((b.above === undefined || x > b.above) &&
    (b.from === undefined || x >= b.from) &&
    (b.below === undefined || x < b.below) &&
    (b.to === undefined || x <= b.to));

export function sayBound(b: Bound): string {
  const low =
    b.above !== undefined
      ? `above ${b.above}`
      : b.from !== undefined
        ? `of at least ${b.from}`
        : "";
  const high =
    b.below !== undefined ? `below ${b.below}` : b.to !== undefined ? `of at most ${b.to}` : "";
  return [low, high].filter(Boolean).join(" and ");
}
