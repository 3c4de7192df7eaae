import { StudyError } from "../errors/index.js";
import { standsOn } from "./edges-of.js";
import { isStated, type Item, type Stated } from "./item.js";
import type { Body } from "./record.js";

/** What stands on what, both ways, through the whole record. */
export interface Lineage {
  /** Ids an item stands on directly. */
  below(id: string): readonly string[];
  /** Ids that stand directly on an item. */
  above(id: string): readonly string[];
  /** Everything an item stands on, in the order of the record. */
  allBelow(id: string): readonly string[];
  allAbove(id: string): readonly string[];
  /** The givens and assumptions an item stands on. */
  groundsOf(id: string): readonly Stated[];
}

export function lineage(body: Body): Lineage {
  const items = new Map<string, Item>(body.items.map((i) => [i.id, i]));
  const down = new Map(body.items.map((i) => [i.id, standsOn(i)]));
  const up = new Map<string, string[]>(body.items.map((i) => [i.id, []]));
  for (const [id, ids] of down) for (const to of ids) up.get(to)?.push(id);
  const direct = (of: ReadonlyMap<string, string[]>, id: string): string[] => {
    const found = of.get(id);
    if (found) return found;
    throw new StudyError({ code: "not-found", where: id, problem: "is not in the record" });
  };
  const all = (of: ReadonlyMap<string, string[]>, id: string): string[] => {
    const seen = new Set<string>();
    const queue = [...direct(of, id)];
    for (let next = queue.pop(); next !== undefined; next = queue.pop()) {
      if (seen.has(next)) continue;
      seen.add(next);
      queue.push(...direct(of, next));
    }
    return body.items.filter((i) => seen.has(i.id)).map((i) => i.id);
  };
  return {
    below: (id) => direct(down, id),
    above: (id) => direct(up, id),
    allBelow: (id) => all(down, id),
    allAbove: (id) => all(up, id),
    groundsOf: (id) =>
      all(down, id)
        .map((i) => items.get(i))
        .filter((i): i is Stated => i !== undefined && isStated(i)),
  };
}
