import {
  reference,
  sayBound,
  sayRange,
  typeName,
  type Field,
  type Method,
  type Model,
  type Source,
} from "../method/index.js";
import { isKind, kinds } from "../units/index.js";
import type { MimeBundle } from "./cell-outputs.js";
import type { Presenter } from "./presenter.js";

/** Declared methods and models, as a card: what they compute, from what, in what range, by whom. */
export const presentDeclared: Presenter = {
  claims: (value) => isMethod(value) || isModel(value),
  bundle: (value) => (isMethod(value) ? methodCard(value) : isModel(value) ? modelCard(value) : {}),
};

const roleOf = (x: unknown): unknown =>
  typeof x === "function" && "role" in x ? x.role : undefined;
const isMethod = (x: unknown): x is Method => roleOf(x) === "method";
const isModel = (x: unknown): x is Model => roleOf(x) === "model";

function methodCard(method: Method): MimeBundle {
  const { result } = method;
  const equation = `${result.symbol} = ${method.tex}`;
  const inputs = Object.entries(method.inputs).map(([name, field]) => inputRow(name, field));
  const groups = Object.entries(method.within ?? {}).map(([name, group]) => [
    `\`${name}\``,
    "",
    group.note ?? "",
    "a dimensionless group",
    "1",
    sayRange({ range: group.range, kind: "dimensionless" }) + (group.stated ? "" : " (advised)"),
  ]);
  const gives = `Gives ${result.note}: ${kinds[result.kind].words}, ${kinds[result.kind].si}.`;
  const source = `Source: ${saySource(method.source)}.`;
  return {
    "text/plain": [
      `${method.id} (revision ${method.revision}): ${method.title}`,
      equation,
      ...inputs.map((row) => plainRow(row)),
      ...groups.map((row) => plainRow(row)),
      gives,
      source,
    ].join("\n"),
    "text/latex": `$$${equation}$$`,
    "text/markdown": [
      `**${method.title}** · \`${method.id}\`, revision ${method.revision}`,
      `$$${equation}$$`,
      table(["Input", "Symbol", "Meaning", "Kind", "SI unit", "Range"], [...inputs, ...groups]),
      gives,
      source,
      ...(method.cautions ?? []).map((caution) => `Caution: ${caution}`),
    ].join("\n\n"),
  };
}

function modelCard(model: Model): MimeBundle {
  const rows = (fields: { readonly [name: string]: Field }): string[][] =>
    Object.entries(fields).map(([name, field]) => inputRow(name, field));
  const [inputs, results] = [rows(model.inputs), rows(model.output.fields)];
  const uses = model.uses.map(({ id, revision }) => `${id} (revision ${revision})`).join(", ");
  const tolerances = Object.entries(model.tolerances)
    .map(([name, x]) => `${name} ${x}`)
    .join(", ");
  const tail = [
    ...(uses ? [`Uses ${uses}.`] : []),
    ...(tolerances ? [`Tolerances: ${tolerances}.`] : []),
    ...(model.cautions ?? []).map((caution) => `Caution: ${caution}`),
  ];
  const head = ["Name", "Symbol", "Meaning", "Kind", "SI unit", "Range"];
  return {
    "text/plain": [
      `${model.id} (revision ${model.revision}): ${model.title}`,
      ...model.about,
      "From",
      ...inputs.map((row) => plainRow(row)),
      "Gives",
      ...results.map((row) => plainRow(row)),
      ...tail,
    ].join("\n"),
    "text/markdown": [
      `**${model.title}** · \`${model.id}\`, revision ${model.revision}`,
      ...model.about,
      "From",
      table(head, inputs),
      "Gives",
      table(head, results),
      ...tail,
    ].join("\n\n"),
  };
}

function inputRow(name: string, field: Field): string[] {
  const { kind, symbol, note, range, possible, stated } = field;
  const bare = isKind(kind) ? kind : null;
  const said = [
    ...(possible ? [sayBound(possible)] : []),
    ...(range && bare
      ? [sayRange({ range, kind: bare }) + (stated === false ? " (advised)" : "")]
      : []),
  ];
  return [
    `\`${name}\``,
    symbol ? `$${symbol}$` : "",
    note,
    bare ? kinds[bare].words : typeName(kind),
    bare ? kinds[bare].si : "",
    said.join("; "),
  ];
}

const plainRow = ([
  name = "",
  ,
  note = "",
  kind = "",
  unit = "",
  range = "",
]: readonly string[]): string =>
  `  ${name.replaceAll("`", "")}: ${note}${kind ? `, ${kind}` : ""}${unit ? ` [${unit}]` : ""}${range ? `; ${range}` : ""}`;

function table(head: readonly string[], rows: readonly (readonly string[])[]): string {
  const line = (cells: readonly string[]): string =>
    `| ${cells.map((cell) => cell.replaceAll("|", "\\|")).join(" | ")} |`;
  return [line(head), line(head.map(() => "---")), ...rows.map(line)].join("\n");
}

/** "Ergun (1952), eq. 11". */
function saySource({ cite, where }: Source): string {
  if (cite === "derivation") return `derived, ${where}`;
  const work = reference(cite);
  const authors = (work.author ?? []).map((a) => ("family" in a ? a.family : a.literal));
  const names = authors.length > 2 ? `${authors[0] ?? ""} and others` : authors.join(" and ");
  const year = work.issued?.["date-parts"][0]?.[0];
  return `${names || work.title}${year === undefined ? "" : ` (${year})`}${where ? `, ${where}` : ""}`;
}
