import { InputError } from "../errors/index.js";
import * as catalogue from "./catalogue.js";
import type { Kind } from "./kinds.js";
import type { Unit } from "./unit.js";

export const allUnits: readonly Unit<Kind>[] = Object.values(catalogue);

/**
 * The unit that a record or a table header names. What one types for a symbol is taken too: `kg/m3`
 * for kg/m³, `Pa s` for Pa·s, the Greek mu for the micro sign.
 */
export function unitOf<K extends Kind>(kind: K, symbol: string, where: string): Unit<K> {
  const found = allUnits.find((u) => u.kind === kind && plain(u.symbol) === plain(symbol));
  if (found) return found as Unit<K>;
  const known = allUnits.filter((u) => u.kind === kind).map((u) => u.symbol);
  throw new InputError({
    code: "unknown-unit",
    where,
    problem: `"${symbol}" is not a unit of ${kind}`,
    expected: `one of ${known.join(", ")}`,
  });
}

const plain = (symbol: string): string =>
  symbol
    .normalize("NFKC")
    .replace(/[·\s]+/g, " ")
    .trim();
