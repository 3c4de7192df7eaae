import type { DeclaredMethod, DeclaredModel } from "../study/index.js";
import { displayUnit, formatNumber, inUnit, isKind, kinds, type Kind } from "../units/index.js";
import { equationOf } from "./equation-of.js";
import { words, type Context } from "./context.js";
import type { Link, MethodView, ModelView } from "./view.js";

const range = (kind: Kind, [low, high]: readonly [number | null, number | null]): string => {
  const unit = displayUnit(kind, "SI", high ?? low ?? 0);
  const say = (x: number): string => formatNumber(inUnit(x as never, unit));
  const end = unit.symbol === "1" ? "" : ` ${unit.symbol}`;
  if (low === null && high === null) return "any";
  if (high === null) return `${say(low ?? 0)}${end} and above`;
  if (low === null || low === 0) return `up to ${say(high)}${end}`;
  return `${say(low)} to ${say(high)}${end}`;
};

export function methodView(
  m: DeclaredMethod,
  number: string,
  citations: ReadonlyMap<string, string>,
  usedIn: readonly Link[],
): MethodView {
  const cite = (id: string): string =>
    id === "derivation" ? "derivation" : `[${citations.get(id) ?? "?"}]`;
  return {
    number,
    anchor: `method-${m.id}`,
    id: m.id,
    revision: m.revision,
    title: m.title,
    equation: equationOf(m.result.symbol, m.tex),
    symbols: [
      { symbol: m.result.symbol, meaning: m.result.note, unit: siOf(m.result.kind) },
      ...Object.entries(m.inputs).map(([name, f]) => ({
        symbol: f.symbol ?? String.raw`\text{${words(name)}}`,
        meaning: f.note,
        unit: isKind(f.type) ? siOf(f.type) : "choice",
      })),
    ],
    source: {
      number: citations.get(m.source.cite) ?? null,
      to: m.source.cite === "derivation" ? null : `ref-${m.source.cite}`,
      where: m.source.where,
    },
    ranges: m.ranges.map(
      (r) =>
        `${r.group}: ${range(r.kind, r.range)}${r.stated ? "" : " (advised here, not stated by the source)"}${r.note && r.note !== r.group ? `: ${r.note}` : ""}`,
    ),
    checks: m.checks.map(
      (c) =>
        `${c.basis}: ${cite(c.from.cite)} ${c.from.where} (${c.rows} value${c.rows === 1 ? "" : "s"})`,
    ),
    direction:
      m.direction &&
      `Safe side for ${m.direction.safeFor}; unsafe side for ${m.direction.unsafeFor}.`,
    usedIn,
  };
}
const siOf = (kind: Kind): string => (kinds[kind].si === "1" ? "–" : kinds[kind].si);

export function modelView(
  ctx: Context,
  m: DeclaredModel,
  number: string,
  applied: ReadonlySet<string>,
  methodNumber: (id: string) => string,
  usedIn: readonly Link[],
): ModelView {
  return {
    number,
    anchor: `method-${m.id}`,
    id: m.id,
    revision: m.revision,
    title: m.title,
    about: m.about,
    methods: m.uses
      .filter((u) => applied.has(u.id))
      .map((u) => ({
        text: `${methodNumber(u.id)} ${ctx.resolver.declaration(u.id).title}`,
        to: `method-${u.id}`,
      })),
    tolerances: Object.entries(m.tolerances).map(([name, x]) => ({
      name: words(name),
      value: formatNumber(x),
    })),
    usedIn,
  };
}
