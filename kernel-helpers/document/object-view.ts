import type { AppliedUse, Node, PlainJson } from "../study/index.js";
import { formatNumber, isKind } from "../units/index.js";
import { aligned } from "./align.js";
import { words, type Context } from "./context.js";
import { saysOf, stopText } from "./item-texts.js";
import { sentenceCase } from "./sentence-case.js";
import { tableOfList, tableOfNodes, type ObjectNode } from "./tables.js";
import type { ObjectView, Row, TableView } from "./view.js";

/** An entity or a model run: arguments, single results as rows, lists as tables. */
export function objectView(ctx: Context, item: AppliedUse): ObjectView {
  const d = ctx.resolver.declaration(item.use);
  const name = d.role === "entity" ? nameOf(item.args["name"]) : null;
  const args = Object.entries(item.args).filter(([n]) => name === null || n !== "name");
  const lists = args.filter(([, node]) => isObjectList(node));
  const single = args.filter(([, node]) => !isObjectList(node));
  const results: Row[] = [];
  const tables: TableView[] = lists.map(([field, node]) =>
    tableOfNodes(ctx, (node as { list: readonly ObjectNode[] }).list, {
      number: null,
      anchor: `${ctx.numbering.anchor(item.id)}-${field}`,
      caption: sentenceCase([words(field), d.inputs[field]?.note ?? ""].filter(Boolean).join(", ")),
    }),
  );
  if (d.role === "model" && !("stop" in item.result)) {
    const values = item.result.value as { readonly [name: string]: PlainJson };
    for (const [key, field] of Object.entries(d.results)) {
      const value = values[key] ?? null;
      const inner =
        !isKind(field.type) && field.type.type === "optional" ? field.type.of : field.type;
      const each = !isKind(inner) && inner.type === "list" ? inner.each : null;
      if (each && !isKind(each) && each.type === "struct" && value !== null)
        tables.push(
          tableOfList(ctx, each.id, value as readonly PlainJson[], {
            number: null,
            anchor: `${ctx.numbering.anchor(item.id)}-${key}`,
            caption: sentenceCase(field.note),
          }),
        );
      else
        results.push(ctx.row(field.symbol, field.note || words(key), { type: field.type, value }));
    }
  }
  return {
    kind: d.role === "model" ? "run" : "object",
    number: ctx.numbering.of(item.id),
    anchor: ctx.numbering.anchor(item.id),
    title: sentenceCase(item.title),
    method: d.role === "model" ? ctx.numbering.method(d.id) : null,
    about: d.role === "model" ? [] : [name === null ? d.title : `${d.title}: ${name}`],
    rows: ctx.rows(Object.fromEntries(single), d.inputs),
    results: aligned(results),
    tables,
    stop: stopText(item.result),
    findings: saysOf(ctx, item),
    diagnostics: Object.entries(item.diagnostics).map(([name, x]) => ({
      name: words(name),
      value: typeof x === "number" ? formatNumber(x) : x,
    })),
    usedBy: ctx.usedBy(item.id),
  };
}

/** A name that is stated in place says what the object is: it stands in its heading, not among the values. */
const nameOf = (node: Node | undefined): string | null =>
  node && "text" in node ? node.text : null;

const isObjectList = (node: Node): boolean =>
  "list" in node && node.list.length > 0 && node.list.every((n) => "fields" in n);
