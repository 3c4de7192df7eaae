import type { DeclaredMethod, DeclaredModel } from "../study/index.js";
import { formatNumber, isKind, kinds, type Kind } from "../units/index.js";
import { equationOf } from "./equation-of.js";
import { words, type Context } from "./context.js";
import { groupText, limitsText } from "./range-text.js";
import { siUnit } from "./si-unit.js";
import type { Link, MethodView, ModelView } from "./view.js";

const BASIS: { readonly [basis: string]: string } = {
  "from memory": "quoted from memory, not confirmed in print",
};
const checkText = (
  { from, basis, rows }: DeclaredMethod["checks"][number],
  citations: ReadonlyMap<string, string>,
): string => {
  const cite = from.cite === "derivation" ? "" : `[${citations.get(from.cite) ?? "?"}] `;
  return `${cite}${from.where}: ${BASIS[basis] ?? basis}, ${rows} value${rows === 1 ? "" : "s"}`;
};

/** Typed words with their letters and powers of ten as print has them: `Re_m 2e5` → Reₘ 2 × 10⁵. */
const settled = (text: string): string =>
  text
    .replace(/\bRe_m\b/g, "Reₘ")
    .replace(
      /\b(\d+(?:\.\d+)?)e(\d)\b/g,
      (_, mantissa: string, power: string) =>
        `${mantissa}\u00a0×\u00a010${"⁰¹²³⁴⁵⁶⁷⁸⁹".charAt(Number(power))}`,
    );

/** The ranges of a method, those of one meaning together; of laws it chooses among, those in use. */
function rangesOf(ctx: Context, m: DeclaredMethod): string[] {
  const out = new Map<string, string[]>();
  for (const r of m.ranges) {
    const law = r.group.startsWith("Re of ") ? r.group.slice(6) : null;
    if (law !== null && ctx.numbering.method(law) === null) continue;
    const meaning = law === null || r.note === null ? groupText(r) : r.note;
    const which = law === null ? "" : ` with ${ctx.numbering.methodNumber(law)}`;
    const advised = r.stated ? "" : " (advised here, not stated by the source)";
    out.set(meaning, [...(out.get(meaning) ?? []), limitsText(r) + which + advised]);
  }
  return [...out].map(([meaning, limits]) => `${meaning}: ${limits.join(", ")}`);
}

export function methodView(
  ctx: Context,
  m: DeclaredMethod,
  citations: ReadonlyMap<string, string>,
  usedIn: readonly Link[],
): MethodView {
  return {
    number: ctx.numbering.methodNumber(m.id),
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
    ranges: rangesOf(ctx, m),
    checks: m.checks.map((c) => checkText(c, citations)),
    direction:
      m.direction &&
      settled(`Safe side for ${m.direction.safeFor}; unsafe side for ${m.direction.unsafeFor}.`),
    usedIn,
  };
}
const siOf = (kind: Kind): string => (kinds[kind].si === "1" ? "–" : siUnit(kinds[kind].si));

export function modelView(
  ctx: Context,
  m: DeclaredModel,
  applied: ReadonlySet<string>,
  usedIn: readonly Link[],
): ModelView {
  return {
    number: ctx.numbering.methodNumber(m.id),
    anchor: `method-${m.id}`,
    id: m.id,
    revision: m.revision,
    title: m.title,
    about: m.about,
    methods: [...applied].sort().flatMap((id) => ctx.numbering.method(id) ?? []),
    tolerances: Object.entries(m.tolerances).map(([name, x]) => ({
      name: words(name),
      value: formatNumber(x, 1),
    })),
    usedIn,
  };
}
