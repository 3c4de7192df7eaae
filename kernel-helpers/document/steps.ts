import { formulaToTex, parseFormula } from "../method/index.js";
import type { AppliedUse, FormulaItem, Item, Result, TypeJson } from "../study/index.js";
import { isKind, kinds } from "../units/index.js";
import { words, type Context } from "./context.js";
import { aligned } from "./align.js";
import { equationOf, putInOf } from "./equation-of.js";
import { saysOf, stopText } from "./item-texts.js";
import { sentenceCase } from "./sentence-case.js";
import { putIn } from "./tex-put-in.js";
import { texNumber } from "./tex-number.js";
import type { Row, StepView } from "./view.js";

function resultRow(ctx: Context, item: Item, symbol: string | null, meaning: string): Row | null {
  const r = ctx.resolver.ofItem(item);
  return "stop" in r ? null : ctx.row(symbol, meaning, r);
}
/** Arguments and result of a step, their decimal points in line. */
function linedUp(rows: readonly Row[], result: Row | null): Pick<StepView, "rows" | "result"> {
  const all = aligned(result ? [...rows, result] : rows);
  return { rows: all.slice(0, rows.length), result: result && (all.at(-1) ?? result) };
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

export function stepView(ctx: Context, item: AppliedUse): StepView {
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
    title: sentenceCase(item.title),
    method: ctx.numbering.method(m.id),
    cite: m.source.cite === "derivation" ? null : m.source.cite,
    equation: equationOf(symbol, m.tex),
    putIn:
      "stop" in item.result
        ? null
        : putInOf(symbol, putIn(m.tex, numbers), equals(item.result, item.type)),
    ...linedUp(ctx.rows(item.args, m.inputs), resultRow(ctx, item, symbol, m.result.note)),
    stop: stopText(item.result),
    findings: saysOf(ctx, item),
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
      const parts = node && "ref" in node ? ctx.partsOf(node) : [];
      const note = from ? [from.title, ...parts].join(", ") : words(n);
      return [n, { type: kind, symbol, note }];
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
    title: sentenceCase(item.title),
    method: null,
    cite: null,
    equation: `${symbol}=${formulaToTex(formula, symbolOf)}`,
    putIn:
      "stop" in item.result
        ? null
        : `${symbol}=${formulaToTex(formula, numberOf)}${equals(item.result, item.type)}`,
    ...linedUp(ctx.rows(item.args, fields), resultRow(ctx, item, symbol, item.title)),
    stop: stopText(item.result),
    findings: saysOf(ctx, item),
    usedBy: ctx.usedBy(item.id),
  };
}
const GREEK =
  /^(?:alpha|beta|gamma|delta|epsilon|zeta|eta|theta|kappa|lambda|mu|nu|xi|pi|rho|sigma|tau|phi|chi|psi|omega)$/;
/** `v_t` → v_{t}, `rho_s` → ρ_{s}; a word is set upright. */
const nameTex = (name: string): string => {
  const [head = "", ...rest] = name.split(/[_-]/);
  const isLetter = head.length === 1;
  const base = isLetter ? head : GREEK.test(head) ? `\\${head}` : String.raw`\mathrm{${head}}`;
  return rest.length === 0 ? base : String.raw`${base}_{\mathrm{${rest.join(String.raw`\,`)}}}`;
};
