import { InputError } from "../errors/index.js";
import type { Kind } from "./kinds.js";
import { parseMixedNumber } from "./mixed-number.js";
import type { Quantity, QuantityInput } from "./quantity.js";

/** Where a conversion factor comes from. */
export type FactorSource = "SI" | "NIST SP 811, app. B" | "definition";

/**
 * A unit is a constructor and a value: `psi(5200)` makes a quantity, and `psi` itself can be handed
 * to a study, which keeps the number as typed. `si = x * scale + offset`.
 */
export interface Unit<K extends Kind> {
  (x: number | string): Quantity<K>;
  readonly kind: K;
  readonly symbol: string;
  readonly scale: number;
  readonly offset: number;
  readonly source: FactorSource;
}

export interface UnitParts<K extends Kind> {
  readonly kind: K;
  readonly symbol: string;
  readonly scale: number;
  readonly offset?: number;
  readonly source: FactorSource;
}

export function unit<K extends Kind>(parts: UnitParts<K>): Unit<K> {
  const { kind, symbol, scale, offset = 0, source } = parts;
  const make = (x: number | string): Quantity<K> => {
    const typed = typeof x === "string" ? parseMixedNumber(x) : x;
    const si = typeof typed === "number" ? typed * scale + offset : NaN;
    if (!Number.isFinite(si)) {
      throw new InputError({
        code: "not-a-number",
        where: symbol,
        problem: `cannot be made from ${typeof x === "string" ? JSON.stringify(x) : String(x)}`,
        expected: 'a finite number, or a text such as "9 5/8"',
      });
    }
    return si as Quantity<K>;
  };
  return Object.assign(make, { kind, symbol, scale, offset, source });
}

/** The number that a quantity has in a unit: `inUnit(ft(12), inch) === 144`. */
export const inUnit = <U extends Unit<Kind>>(q: QuantityInput<U["kind"]>, u: U): number =>
  (q - u.offset) / u.scale;
