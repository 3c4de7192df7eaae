import type { AppliedUse, Node, PlainJson } from "../study/index.js";
import { formatNumber, isKind } from "../units/index.js";
import { words, type Context } from "./context.js";
import { saysOf, stopText } from "./item-texts.js";
import { tableOfList, tableOfNodes, type ObjectNode } from "./tables.js";
import type { ObjectView, Row, TableView } from "./view.js";

/** An entity or a model run: arguments, single results as rows, lists as tables. */
export function objectView(
  ctx: Context,
  item: AppliedUse,
  methodNumber: string | null,
): ObjectView {
  const d = ctx.resolver.declaration(item.use);
  const lists = Object.entries(item.args).filter(([, node]) => isObjectList(node));
  const single = Object.entries(item.args).filter(([, node]) => !isObjectList(node));
  const results: Row[] = [];
  const tables: TableView[] = lists.map(([name, node]) =>
    tableOfNodes(ctx, (node as { list: readonly ObjectNode[] }).list, {
      number: null,
      anchor: `${ctx.numbering.anchor(item.id)}-${name}`,
      caption: d.inputs[name]?.note ?? words(name),
    }),
  );
  if (d.role === "model" && !("stop" in item.result)) {
    const values = item.result.value as { readonly [name: string]: PlainJson };
    for (const [name, field] of Object.entries(d.results)) {
      const value = values[name] ?? null;
      const inner =
        !isKind(field.type) && field.type.type === "optional" ? field.type.of : field.type;
      const each = !isKind(inner) && inner.type === "list" ? inner.each : null;
      if (each && !isKind(each) && each.type === "struct" && value !== null)
        tables.push(
          tableOfList(ctx, each.id, value as readonly PlainJson[], {
            number: null,
            anchor: `${ctx.numbering.anchor(item.id)}-${name}`,
            caption: field.note,
          }),
        );
      else
        results.push(ctx.row(field.symbol, field.note || words(name), { type: field.type, value }));
    }
  }
  return {
    kind: d.role === "model" ? "run" : "object",
    number: ctx.numbering.of(item.id),
    anchor: ctx.numbering.anchor(item.id),
    title: item.title,
    method:
      d.role === "model"
        ? { text: `${methodNumber ?? ""} ${d.title}`.trim(), to: `method-${d.id}` }
        : null,
    about: d.role === "model" ? [] : [d.title],
    rows: ctx.rows(Object.fromEntries(single), d.inputs),
    results,
    tables,
    stop: stopText(item.result),
    findings: saysOf(item),
    diagnostics: Object.entries(item.diagnostics).map(([name, x]) => ({
      name: words(name),
      value: typeof x === "number" ? formatNumber(x) : x,
    })),
    usedBy: ctx.usedBy(item.id),
  };
}

const isObjectList = (node: Node): boolean =>
  "list" in node && node.list.length > 0 && node.list.every((n) => "fields" in n);
