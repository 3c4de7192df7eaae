import { InputError } from "../errors/index.js";
import * as catalogue from "./catalogue.js";
import type { Kind } from "./kinds.js";
import type { Unit } from "./unit.js";

export const allUnits: readonly Unit<Kind>[] = Object.values(catalogue);

/** The unit that a record or a table header names. */
export function unitOf<K extends Kind>(kind: K, symbol: string, where: string): Unit<K> {
  const found = allUnits.find((u) => u.kind === kind && u.symbol === symbol);
  if (found) return found as Unit<K>;
  const known = allUnits.filter((u) => u.kind === kind).map((u) => u.symbol);
  throw new InputError({
    code: "unknown-unit",
    where,
    problem: `"${symbol}" is not a unit of ${kind}`,
    expected: `one of ${known.join(", ")}`,
  });
}
