import type { Kind } from "../units/index.js";

/** Where a part of a recorded item is: field names, list indices, a depth on a profile. */
export type Path = readonly (string | number | { readonly depth: Node })[];

/** An argument as the record keeps it. Its declared type says how to read it: there are no magic keys. */
export type Node =
  | { readonly ref: string; readonly path: Path }
  | { readonly si: number; readonly kind: Kind }
  | { readonly choice: string }
  | { readonly text: string }
  | { readonly list: readonly Node[] }
  | {
      readonly of: string;
      readonly revision: number;
      readonly fields: { readonly [name: string]: Node };
    }
  | {
      readonly along: Kind;
      readonly depth: readonly number[];
      readonly value: readonly number[];
    }
  | { readonly absent: true };

/** Ids a node stands on, the depths at which profiles are read included. */
export function edges(node: Node): string[] {
  if ("ref" in node)
    return [node.ref, ...node.path.flatMap((p) => (typeof p === "object" ? edges(p.depth) : []))];
  if ("list" in node) return node.list.flatMap(edges);
  if ("fields" in node) return Object.values(node.fields).flatMap(edges);
  return [];
}

/** The literal numbers in a node, each with its path: values stated in place. */
export function literals(node: Node, where: string): { where: string; si: number; kind: Kind }[] {
  if ("si" in node) return [{ where, si: node.si, kind: node.kind }];
  if ("list" in node) return node.list.flatMap((n, i) => literals(n, `${where}[${i}]`));
  if ("fields" in node)
    return Object.entries(node.fields).flatMap(([name, n]) => literals(n, `${where}.${name}`));
  if ("ref" in node)
    return node.path.flatMap((p) =>
      typeof p === "object" ? literals(p.depth, `${where} depth`) : [],
    );
  return [];
}
