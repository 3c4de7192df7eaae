import {
  isStated,
  lineage,
  type Body,
  type Lineage,
  type Node,
  type TypeJson,
} from "../study/index.js";
import { formatTyped, isKind, type DisplaySystem } from "../units/index.js";
import { Numbering } from "./numbering.js";
import { Resolver, type Known, type Resolved } from "./resolve.js";
import { joined, showValue, type ShownValue } from "./show.js";
import type { Link, Row } from "./view.js";

/** What every part of a document needs: values, numbers, links and the display system. */
export class Context {
  readonly resolver: Resolver;
  readonly numbering: Numbering;
  readonly lineage: Lineage;
  readonly system: DisplaySystem;
  constructor(readonly body: Body) {
    this.resolver = new Resolver(body);
    this.numbering = new Numbering(body);
    this.lineage = lineage(body);
    this.system = body.study.display;
  }

  show({ type, value }: Known, unit?: string | null): ShownValue {
    return showValue(type, value, this.system, unit);
  }
  showResolved(r: Resolved, unit?: string | null): ShownValue {
    return "stop" in r ? { text: `no value (${sayStop(r.stop)})`, unit: "" } : this.show(r, unit);
  }
  /** A node as the reader sees it: a stated number it points at directly is shown as it was typed. */
  showNode(node: Node, type: TypeJson, unit?: string | null): ShownValue {
    const item = "ref" in node && node.path.length === 0 ? this.resolver.item(node.ref) : null;
    if (item && isStated(item) && item.form === "number" && !unit)
      return { text: formatTyped(item.typed), unit: item.unit === "1" ? "" : item.unit };
    return this.showResolved(this.resolver.resolve(node, type), unit);
  }
  /** The item a node points at, named with the part that is read. */
  from(node: Node): Link | null {
    if (!("ref" in node)) return null;
    const parts = node.path.map((p) => {
      if (typeof p === "number") return `no. ${p + 1}`;
      if (typeof p === "string") return words(p);
      return `at ${joined(this.showResolved(this.resolver.resolve(p.depth, "measuredDepth")))}`;
    });
    return {
      text: [this.numbering.of(node.ref), ...parts].join(", "),
      to: this.numbering.anchor(node.ref),
    };
  }
  usedBy(id: string): Link[] {
    return this.lineage.above(id).map((up) => this.numbering.link(up));
  }

  /** Arguments as rows of symbol, meaning, value, unit and origin; objects stated in place are opened up. */
  rows(
    args: { readonly [name: string]: Node },
    fields: {
      readonly [name: string]: {
        readonly type: TypeJson;
        readonly symbol: string | null;
        readonly note: string;
      };
    },
    prefix = "",
  ): Row[] {
    return Object.entries(args).flatMap(([name, node]): Row[] => {
      const field = fields[name];
      if (!field || "absent" in node) return [];
      const meaning = prefix + (field.note || words(name));
      if ("fields" in node)
        return this.rows(node.fields, this.resolver.fieldsOf(node.of), `${prefix}${words(name)}: `);
      if ("list" in node)
        return node.list.flatMap((n, i): Row[] => {
          const title = `${prefix}${words(name)} ${i + 1}`;
          if ("fields" in n) return this.rows(n.fields, this.resolver.fieldsOf(n.of), `${title}: `);
          const each =
            !isKind(field.type) && field.type.type === "list" ? field.type.each : field.type;
          return [
            { symbol: null, meaning: title, ...split(this.showNode(n, each)), from: this.from(n) },
          ];
        });
      return [
        {
          symbol: field.symbol,
          meaning,
          ...split(this.showNode(node, field.type)),
          from: this.from(node),
        },
      ];
    });
  }
  row(symbol: string | null, meaning: string, r: Resolved): Row {
    return { symbol, meaning, ...split(this.showResolved(r)), from: null };
  }
}

export const split = ({ text, unit }: ShownValue): { value: string; unit: string } => ({
  value: text,
  unit,
});

/** `densityAlong` → "density along", `no-flow` → "no flow". */
export const words = (name: string): string =>
  name
    .replace(/([a-z])([A-Z])/g, "$1 $2")
    .replace(/[-_]/g, " ")
    .toLowerCase();
export const sayStop = (stop: string): string => words(stop);
