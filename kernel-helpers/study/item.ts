import type { Finding, Stop } from "../method/index.js";
import type { Kind } from "../units/index.js";
import type { Node } from "./node.js";
import type { PlainJson } from "./plain.js";
import type { TypeJson } from "./type-json.js";

/** The outcome of an item: a value, or a typed stop. What stands on a stop is itself `blocked`. */
export type Result = { readonly value: PlainJson } | Stop;

interface Common {
  readonly id: string;
  /** Id of the section it was recorded in; null at the top. */
  readonly section: string | null;
  readonly title: string;
  readonly symbol: string | null;
}

/** How a stated number may differ: lowest and highest, in the unit as typed. */
export interface Spread {
  readonly low: number;
  readonly high: number;
  readonly says: string;
}
export interface Verification {
  /** How it can be verified, and by whom (a role). */
  readonly how: string;
  readonly by: string;
  /** Whether approval has to wait for it. */
  readonly required: boolean;
}
interface Statement extends Common {
  readonly op: "given" | "assumed";
  /** A given's source; an assumption's reason. */
  readonly because: string;
  /** Set on every assumption, never on a given. */
  readonly verify: Verification | null;
  readonly type: TypeJson;
  readonly result: { readonly value: PlainJson };
}
/** A number with its unit, as typed. */
export interface StatedNumber extends Statement {
  readonly form: "number";
  readonly type: Kind;
  readonly typed: number | string;
  readonly unit: string;
  readonly spread: Spread | null;
}
/** One of several: a choice of method or of nose. */
export interface StatedChoice extends Statement {
  readonly form: "choice";
}
/** A whole object, with the file it came from. */
export interface StatedObject extends Statement {
  readonly form: "object";
  readonly use: string;
  readonly revision: number;
  readonly args: { readonly [name: string]: Node };
  readonly file: { readonly name: string; readonly sha256: string } | null;
}

/** Everything that is computed from named arguments. */
interface Applied extends Common {
  readonly args: { readonly [name: string]: Node };
  readonly type: TypeJson;
  readonly result: Result;
  readonly findings: readonly Finding[];
}
export interface AppliedUse extends Applied {
  readonly op: "entity" | "step" | "run";
  readonly use: string;
  readonly revision: number;
  /** Methods that a model evaluated: which of those it lists took part. */
  readonly looked: readonly string[];
  readonly diagnostics: { readonly [name: string]: number | string };
}
export interface FormulaItem extends Applied {
  readonly op: "formula";
  readonly text: string;
  readonly kinds: { readonly [name: string]: Kind };
}
export interface Comparison extends Applied {
  readonly op: "compare";
  readonly of: Kind;
  readonly because: string;
}
export type Sense = "at least" | "at most" | "is";
export interface CheckItem extends Applied {
  readonly op: "check";
  readonly sense: Sense;
  readonly of: TypeJson;
  /** How far on the good side, in SI; null where there is no number, or no verdict. */
  readonly margin: number | null;
  readonly because: string;
}

/** A sentence with values in it; numbers are formatted by the document. */
export interface Conclusion extends Common {
  readonly op: "conclude";
  readonly parts: readonly (string | { readonly node: Node; readonly unit: string | null })[];
  readonly checks: readonly string[];
}
export interface Caution extends Common {
  readonly op: "caution";
  readonly text: string;
}
export interface Figure extends Common {
  readonly op: "figure";
  readonly chart: string;
  readonly revision: number;
  readonly args: { readonly [name: string]: Node };
  readonly caption: string;
}
export interface TableColumn {
  readonly head: string;
  readonly unit: string | null;
  /** One node that is a profile or a list, or a node per row. */
  readonly of: Node | readonly Node[];
}
export interface TableItem extends Common {
  readonly op: "table";
  readonly columns: readonly TableColumn[];
  readonly caption: string;
}

export type Stated = StatedNumber | StatedChoice | StatedObject;
export type Computed = AppliedUse | FormulaItem | Comparison | CheckItem;
export type Item = Stated | Computed | Conclusion | Caution | Figure | TableItem;
export type WithResult = Stated | Computed;

export const hasResult = (item: Item): item is WithResult => "result" in item;
export const isStated = (item: Item): item is Stated =>
  item.op === "given" || item.op === "assumed";
export const isComputed = (item: Item): item is Computed => hasResult(item) && !isStated(item);

/** Every node of an item, named as in messages. */
export function nodesOf(item: Item): [where: string, node: Node][] {
  switch (item.op) {
    case "caution":
      return [];
    case "conclude":
      return item.parts.flatMap((p, i): [string, Node][] =>
        typeof p === "string" ? [] : [[`part ${i + 1}`, p.node]],
      );
    case "table":
      return item.columns.flatMap((c) =>
        (Array.isArray(c.of) ? (c.of as Node[]) : [c.of as Node]).map((n): [string, Node] => [
          c.head,
          n,
        ]),
      );
    default:
      return "args" in item ? Object.entries(item.args) : [];
  }
}
