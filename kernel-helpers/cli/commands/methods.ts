import { InputError } from "../../errors/index.js";
import { sayRange } from "../../method/index.js";
import { reference } from "../../method/index.js";
import { methods, type AnyMethod } from "../../physics/index.js";
import type { CommandContext } from "./command-context.js";

export interface MethodsOptions {
  readonly family?: string;
  readonly json?: boolean;
}

/** `stillwell methods`: what there is, where it comes from, where it holds, what it was checked against. */
export function listMethods(
  id: string | undefined,
  options: MethodsOptions,
  { terminal }: CommandContext,
): number {
  const chosen = methods.filter(
    (m) =>
      (id === undefined || m.id === id) &&
      (options.family === undefined || m.family === options.family),
  );
  if (chosen.length === 0)
    throw new InputError({
      code: "not-found",
      where: id ?? options.family ?? "methods",
      problem: "is not in the catalogue",
      expected:
        id === undefined
          ? `a family: ${[...new Set(methods.map((m) => m.family))].join(", ")}`
          : `a method: ${methods.map((m) => m.id).join(", ")}`,
    });
  if (options.json) terminal.out(JSON.stringify(chosen.map(facts), null, 1));
  else for (const m of chosen) for (const line of say(m)) terminal.out(line);
  return 0;
}

const facts = (m: AnyMethod) => ({
  id: m.id,
  revision: m.revision,
  title: m.title,
  family: m.family,
  source: m.source,
  ranges: m.rules.map((r) => ({
    group: r.group,
    range: r.range.map((x) => (Number.isFinite(x) ? x : null)),
    stated: r.stated,
  })),
  checks: m.checks.map((c) => ({ basis: c.basis, from: c.from, values: c.rows.length })),
});

function say(m: AnyMethod): string[] {
  return [
    `${m.id}  ${m.title}`,
    `    source   ${cited(m.source.cite)}${m.source.where}`,
    `    range    ${m.rules.map((r) => `${r.group} ${sayRange(r)}${r.stated ? "" : " (advised)"}`).join("; ") || "none stated"}`,
    ...m.checks.map(
      (c) => `    checked  ${c.basis}: ${cited(c.from.cite)}${c.from.where} (${c.rows.length})`,
    ),
  ];
}
function cited(id: string): string {
  if (id === "derivation") return "derivation, ";
  const r = reference(id);
  const [first] = r.author ?? [];
  const name = first === undefined ? r.title : "family" in first ? first.family : first.literal;
  const year = r.issued?.["date-parts"][0]?.[0];
  return `${name}${(r.author?.length ?? 0) > 1 ? " et al." : ""}${year === undefined ? "" : ` (${year})`}, `;
}
