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
import { aligned } from "./align.js";
import { inWords, joined, showValue, type ShownValue } from "./show.js";
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
    const shown = showValue(type, value, this.system, unit);
    // A law chosen by name is told as the method it is.
    const isChoice = !isKind(type) && type.type === "oneOf";
    const method = isChoice ? this.numbering.method(shown.text) : null;
    return method ? inWords(method.text) : shown;
  }
  showResolved(r: Resolved, unit?: string | null): ShownValue {
    return "stop" in r ? inWords(`no value (${sayStop(r.stop)})`) : this.show(r, unit);
  }
  /** A node as the reader sees it: a stated number is shown as it was typed, an object by its name. */
  showNode(node: Node, type: TypeJson, unit?: string | null): ShownValue {
    const item = "ref" in node && node.path.length === 0 ? this.resolver.item(node.ref) : null;
    if (item && isStated(item) && item.form === "number" && !unit)
      return {
        text: formatTyped(item.typed),
        unit: item.unit === "1" ? "" : item.unit,
        form: "number",
      };
    const found = this.resolver.resolve(node, type);
    if (item && !("stop" in found) && isNameless(found)) return inWords(item.title);
    return this.showResolved(found, unit);
  }
  /** The item a node points at, named with the part that is read. */
  from(node: Node): Link | null {
    if (!("ref" in node)) return null;
    return {
      text: [this.numbering.of(node.ref), ...this.partsOf(node)].join(", "),
      to: this.numbering.anchor(node.ref),
    };
  }
  /** The parts that a reference reads, in the words of the table where the reader finds them. */
  partsOf({ ref, path }: Extract<Node, { ref: string }>): string[] {
    return path.map((p, i) => {
      if (typeof p === "number") return `no. ${p + 1}`;
      if (typeof p === "object")
        return `at ${joined(this.showResolved(this.resolver.resolve(p.depth, "measuredDepth")))}`;
      const above = this.resolver.resolve({ ref, path: path.slice(0, i) }, "dimensionless");
      const note =
        !("stop" in above) && !isKind(above.type) && above.type.type === "struct"
          ? this.resolver.fieldsOf(above.type.id)[p]?.note
          : undefined;
      return note?.split(/[:;(]/)[0]?.trim() || words(p);
    });
  }
  usedBy(id: string): Link[] {
    return this.lineage.above(id).map((up) => this.numbering.link(up));
  }

  /** Arguments as rows of symbol, meaning, value, unit and origin; objects stated in place are opened up. */
  rows(
    args: Parameters<Context["openRows"]>[0],
    fields: Parameters<Context["openRows"]>[1],
  ): Row[] {
    return aligned(this.openRows(args, fields, ""));
  }
  private openRows(
    args: { readonly [name: string]: Node },
    fields: {
      readonly [name: string]: {
        readonly type: TypeJson;
        readonly symbol: string | null;
        readonly note: string;
      };
    },
    prefix: string,
  ): Unaligned[] {
    return Object.entries(args).flatMap(([name, node]): Unaligned[] => {
      const field = fields[name];
      if (!field || "absent" in node) return [];
      const meaning = prefix + (field.note || words(name));
      if ("fields" in node)
        return this.openRows(
          node.fields,
          this.resolver.fieldsOf(node.of),
          `${prefix}${words(name)}: `,
        );
      if ("list" in node)
        return node.list.flatMap((n, i): Unaligned[] => {
          const title = `${prefix}${words(name)} ${i + 1}`;
          if ("fields" in n)
            return this.openRows(n.fields, this.resolver.fieldsOf(n.of), `${title}: `);
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
    return { symbol, meaning, ...split(this.showResolved(r)), from: null, padding: "" };
  }
}
type Unaligned = Omit<Row, "padding">;

/** An object whose fields hold no name to call it by. */
const isNameless = ({ type, value }: Known): boolean =>
  !isKind(type) &&
  (type.type === "struct" || type.type === "anyOf") &&
  typeof (value as { readonly name?: unknown } | null)?.name !== "string";

export const split = ({ text, unit, form }: ShownValue): Pick<Row, "value" | "unit" | "form"> => ({
  value: text,
  unit,
  form,
});

/** `densityAlong` → "density along", `no-flow` → "no flow". */
export const words = (name: string): string =>
  name
    .replace(/([a-z])([A-Z])/g, "$1 $2")
    .replace(/[-_]/g, " ")
    .toLowerCase();
export const sayStop = (stop: string): string => words(stop);
