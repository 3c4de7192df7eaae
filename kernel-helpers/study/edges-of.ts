import { nodesOf, type Item } from "./item.js";
import { edges } from "./node.js";

/** Ids an item stands on, each once. */
export function standsOn(item: Item): string[] {
  const ids = nodesOf(item).flatMap(([, node]) => edges(node));
  return [...new Set(item.op === "conclude" ? [...ids, ...item.checks] : ids)];
}
