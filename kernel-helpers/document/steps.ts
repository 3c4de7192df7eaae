import { formulaToTex, parseFormula } from "../method/formula/index.js";
import type {
  AppliedUse,
  Comparison,
  FormulaItem,
  Item,
  PlainJson,
  Result,
  TypeJson,
} from "../study/index.js";
import { isKind, kinds, type Kind } from "../units/index.js";
import { formatNumber } from "../units/index.js";
import { sayStop, split, words, type Context } from "./context.js";

import { tableOfList } from "./tables.js";
import { putIn } from "./tex-put-in.js";
import { texNumber } from "./tex-number.js";
import type { ComparisonView, ObjectView, Row, StepView, TableView } from "./view.js";

const stopText = (result: Result): string | null =>
  "stop" in result ? `No value (${sayStop(result.stop)}): ${result.because}.` : null;
const says = (item: AppliedUse | FormulaItem): string[] => item.findings.map((f) => f.says);

function resultRow(ctx: Context, item: Item, symbol: string | null, meaning: string): Row | null {
  const r = ctx.resolver.ofItem(item);
  return "stop" in r ? null : ctx.row(symbol, meaning, r);
}
/** What equations show: the coherent SI numbers of the arguments that have a symbol. */
function numbersFor(
  ctx: Context,
  item: AppliedUse | FormulaItem,
  symbols: ReadonlyMap<string, string>,
): Map<string, string> {
  const out = new Map<string, string>();
  for (const [name, node] of Object.entries(item.args)) {
    const symbol = symbols.get(name);
    const r = ctx.resolver.resolve(node, "dimensionless");
    if (symbol !== undefined && !("stop" in r) && typeof r.value === "number")
      out.set(symbol, texNumber(r.value));
  }
  return out;
}
const equals = (result: Result, kind: TypeJson): string => {
  if ("stop" in result || typeof result.value !== "number" || !isKind(kind)) return "";
  const { si } = kinds[kind];
  return `=${texNumber(result.value)}${si === "1" ? "" : String.raw`\ \mathrm{${si.replace(/ /g, String.raw`\,`).replace(/(\d)/g, "^$1")}}`}`;
};

export function stepView(ctx: Context, item: AppliedUse, methodNumber: string): StepView {
  const m = ctx.resolver.declaration(item.use);
  if (m.role !== "method") throw new Error(`${item.id} is no step`);
  const symbols = new Map(
    Object.entries(m.inputs).flatMap(([n, f]) => (f.symbol ? [[n, f.symbol] as const] : [])),
  );
  const symbol = item.symbol ?? m.result.symbol;
  const numbers = numbersFor(ctx, item, symbols);
  return {
    kind: "step",
    number: ctx.numbering.of(item.id),
    anchor: ctx.numbering.anchor(item.id),
    title: item.title,
    method: { text: `${methodNumber} ${m.title}`, to: `method-${m.id}` },
    cite: m.source.cite === "derivation" ? null : m.source.cite,
    equation: `${symbol}=${m.tex}`,
    putIn:
      "stop" in item.result
        ? null
        : `${symbol}=${putIn(m.tex, numbers)}${equals(item.result, item.type)}`,
    rows: ctx.rows(item.args, m.inputs),
    result: resultRow(ctx, item, symbol, m.result.note),
    stop: stopText(item.result),
    findings: says(item),
    usedBy: ctx.usedBy(item.id),
  };
}

export function formulaView(ctx: Context, item: FormulaItem): StepView {
  const formula = parseFormula(item.text, Object.keys(item.kinds));
  const fields = Object.fromEntries(
    Object.entries(item.kinds).map(([n, kind]) => {
      const node = item.args[n];
      const from = node && "ref" in node ? ctx.resolver.item(node.ref) : null;
      const symbol =
        (node && "ref" in node && node.path.length === 0 ? from?.symbol : null) ?? nameTex(n);
      return [n, { type: kind as Kind, symbol, note: from?.title ?? words(n) }];
    }),
  );
  const symbolOf = (n: string): string => fields[n]?.symbol ?? nameTex(n);
  const symbol = item.symbol ?? nameTex(item.id);
  const numberOf = (n: string): string => {
    const node = item.args[n];
    const r = node && ctx.resolver.resolve(node, "dimensionless");
    return r && !("stop" in r) && typeof r.value === "number"
      ? `(${texNumber(r.value)})`
      : symbolOf(n);
  };
  return {
    kind: "step",
    number: ctx.numbering.of(item.id),
    anchor: ctx.numbering.anchor(item.id),
    title: item.title,
    method: null,
    cite: null,
    equation: `${symbol}=${formulaToTex(formula, symbolOf)}`,
    putIn:
      "stop" in item.result
        ? null
        : `${symbol}=${formulaToTex(formula, numberOf)}${equals(item.result, item.type)}`,
    rows: ctx.rows(item.args, fields),
    result: resultRow(ctx, item, symbol, item.title),
    stop: stopText(item.result),
    findings: says(item),
    usedBy: ctx.usedBy(item.id),
  };
}
/** `v_t` → v_{t}; a word is set upright. */
const nameTex = (name: string): string => {
  const [head = "", ...rest] = name.split(/[_-]/);
  const base = head.length === 1 ? head : String.raw`\mathrm{${head}}`;
  return rest.length === 0 ? base : String.raw`${base}_{\mathrm{${rest.join(String.raw`\,`)}}}`;
};

/** An entity or a model run: arguments, single results as rows, lists as tables. */
export function objectView(
  ctx: Context,
  item: AppliedUse,
  methodNumber: string | null,
): ObjectView {
  const d = ctx.resolver.declaration(item.use);
  const results: Row[] = [];
  const tables: TableView[] = [];
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
    rows: ctx.rows(item.args, d.inputs),
    results,
    tables,
    stop: stopText(item.result),
    findings: says(item),
    diagnostics: Object.entries(item.diagnostics).map(([name, x]) => ({
      name: words(name),
      value: typeof x === "number" ? formatNumber(x) : x,
    })),
    usedBy: ctx.usedBy(item.id),
  };
}

export function comparisonView(ctx: Context, item: Comparison): ComparisonView {
  const side = (name: "main" | "alternate"): Row => {
    const node = item.args[name] ?? { absent: true as const };
    const title = "ref" in node ? ctx.resolver.item(node.ref).title : name;
    return {
      symbol: null,
      meaning: title,
      ...split(ctx.showNode(node, item.of)),
      from: ctx.from(node),
    };
  };
  const { result } = item;
  return {
    kind: "comparison",
    number: ctx.numbering.of(item.id),
    anchor: ctx.numbering.anchor(item.id),
    title: item.title,
    main: side("main"),
    alternate: side("alternate"),
    difference:
      "stop" in result
        ? `not defined: ${result.because}`
        : `${formatNumber(100 * (result.value as number), 3)}\u00a0%`,
    because: item.because,
  };
}
