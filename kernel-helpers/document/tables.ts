import {
  isStated,
  type Node,
  type PlainJson,
  type TableItem,
  type TypeJson,
} from "../study/index.js";
import { formatTyped, isKind } from "../units/index.js";
import { paddings } from "./align.js";
import { sayStop, words, type Context } from "./context.js";
import type { Resolved } from "./resolve.js";
import { joined, showColumn } from "./show.js";
import type { TableView } from "./view.js";

export interface Column {
  readonly head: string;
  readonly unit: string;
  readonly numeric: boolean;
  readonly cells: readonly string[];
  /** Where each value comes from. */
  readonly links?: readonly (string | null)[];
  readonly notes?: readonly string[];
}

/** A column of values of one type, formatted together. */
export function column(
  ctx: Context,
  head: string,
  type: TypeJson,
  values: readonly (PlainJson | undefined)[],
  unit?: string | null,
): Column {
  const inner = !isKind(type) && type.type === "optional" ? type.of : type;
  if (isKind(inner)) {
    const { unit: u, cells } = showColumn(
      inner,
      values.map((v) => (typeof v === "number" ? v : null)),
      ctx.system,
      unit,
    );
    return { head, unit: u, numeric: true, cells };
  }
  return {
    head,
    unit: "",
    numeric: false,
    cells: values.map((v) =>
      v === undefined || v === null ? "–" : joined(ctx.show({ type: inner, value: v })),
    ),
  };
}

export function tableOf(
  columns: readonly Column[],
  parts: Pick<TableView, "number" | "anchor" | "caption">,
): TableView {
  const length = Math.max(0, ...columns.map((c) => c.cells.length));
  const unseen = columns.map((c) => (c.numeric ? paddings(c.cells) : []));
  return {
    kind: "table",
    ...parts,
    columns: columns.map(({ head, unit, numeric }) => ({ head, unit, numeric })),
    rows: Array.from({ length }, (_, i) =>
      columns.map((c, k) => ({
        text: c.cells[i] ?? "–",
        to: c.links?.[i] ?? null,
        padding: unseen[k]?.[i] ?? "",
      })),
    ),
    notes: [...new Set(columns.flatMap((c) => c.notes ?? []))],
  };
}

/** A list of objects as a table: a column per field. */
export function tableOfList(
  ctx: Context,
  struct: string,
  values: readonly PlainJson[],
  parts: Pick<TableView, "number" | "anchor" | "caption">,
): TableView {
  const columns = Object.entries(ctx.resolver.fieldsOf(struct))
    .filter(([, f]) => isKind(f.type) || f.type.type !== "struct")
    .map(([name, f]) =>
      column(
        ctx,
        f.note || words(name),
        f.type,
        values.map((v) => (v as { readonly [n: string]: PlainJson })[name]),
      ),
    );
  return tableOf(columns, parts);
}

export type ObjectNode = Extract<Node, { fields: unknown }>;

/** Objects stated in an argument as a table, each value linked to where it comes from. */
export function tableOfNodes(
  ctx: Context,
  nodes: readonly ObjectNode[],
  parts: Pick<TableView, "number" | "anchor" | "caption">,
): TableView {
  const struct = nodes[0]?.of ?? "";
  const columns = Object.entries(ctx.resolver.fieldsOf(struct)).flatMap(([name, f]): Column[] => {
    const here = nodes.map((n): Node => n.fields[name] ?? { absent: true });
    if (here.every((n) => "absent" in n)) return [];
    const values = here.map((n) => {
      const r = ctx.resolver.resolve(n, f.type);
      return "stop" in r ? undefined : r.value;
    });
    return [
      {
        ...(typedColumn(ctx, words(name), here) ?? column(ctx, words(name), f.type, values)),
        links: here.map((n) => ctx.from(n)?.to ?? null),
      },
    ];
  });
  return tableOf(columns, parts);
}

/** Stated numbers of one unit as they were typed, so that the reader finds them again among the inputs. */
function typedColumn(ctx: Context, head: string, nodes: readonly Node[]): Column | null {
  const typed = nodes.map((n) => {
    if ("absent" in n) return null;
    const item = "ref" in n && n.path.length === 0 ? ctx.resolver.item(n.ref) : undefined;
    return item && isStated(item) && item.form === "number" ? item : undefined;
  });
  const units = new Set(typed.flatMap((t) => (t === null ? [] : [t?.unit])));
  const [unit] = units;
  if (units.size !== 1 || unit === undefined) return null;
  return {
    head,
    unit: unit === "1" ? "" : unit,
    numeric: true,
    cells: typed.map((t) => (t ? formatTyped(t.typed) : "–")),
  };
}

/** Rows that tell something: the ends, and those that differ from a neighbour. */
export const telling = (columns: readonly Column[]): number[] => {
  const length = columns[0]?.cells.length ?? 0;
  const same = (i: number, k: number): boolean =>
    columns.slice(1).every((c) => c.cells[i] === c.cells[k]);
  return Array.from({ length }, (_, i) => i).filter(
    (i) => i === 0 || i === length - 1 || !same(i, i - 1) || !same(i, i + 1),
  );
};

/** At most `most` rows, the first and the last among them, spread evenly. */
export function thin(length: number, most: number): number[] {
  if (length <= most) return Array.from({ length }, (_, i) => i);
  return Array.from({ length: most }, (_, i) => Math.round((i * (length - 1)) / (most - 1)));
}

/** A recorded table: profiles and lists side by side, or rows of single values. */
export function recordedTable(ctx: Context, item: TableItem): TableView {
  const profiles = item.columns.map((c) =>
    isNode(c.of) ? ctx.resolver.resolve(c.of, "dimensionless") : null,
  );
  const depths = profiles
    .map((r) => (r && !("stop" in r) ? profileOf(r.value) : null))
    .find((p) => p !== null)?.depth;
  const kept = depths ? thin(depths.length, 60) : null;
  const columns = item.columns.map((c, i): Column => {
    if (!isNode(c.of)) return rowsColumn(ctx, c.head, c.of, c.unit);
    const r = profiles[i];
    if (!r || "stop" in r)
      return {
        head: c.head,
        unit: "",
        numeric: false,
        cells: [ctx.showResolved(r as Resolved).text],
      };
    const along = profileOf(r.value);
    if (!isKind(r.type) && r.type.type === "profile" && along)
      return column(ctx, c.head, r.type.of, pick(along.value, kept), c.unit);
    if (!isKind(r.type) && r.type.type === "list")
      return column(ctx, c.head, r.type.each, r.value as readonly PlainJson[], c.unit);
    return column(ctx, c.head, r.type, [r.value], c.unit);
  });
  const all = depths
    ? [column(ctx, "measured depth", "measuredDepth", pick(depths, kept)), ...columns]
    : columns;
  return tableOf(all, {
    number: ctx.numbering.of(item.id),
    anchor: ctx.numbering.anchor(item.id),
    caption: item.caption,
  });
}

function rowsColumn(
  ctx: Context,
  head: string,
  nodes: readonly Node[],
  unit: string | null,
): Column {
  const all = nodes.map((n) => ctx.resolver.resolve(n, "dimensionless"));
  const known = all.flatMap((r) => ("stop" in r ? [] : [r]));
  const [first] = known;
  if (first && new Set(known.map((r) => JSON.stringify(r.type))).size === 1) {
    const shown = column(
      ctx,
      head,
      first.type,
      all.map((r) => ("stop" in r ? undefined : r.value)),
      unit,
    );
    return {
      ...shown,
      cells: all.map((r, i) => ("stop" in r ? "no value" : (shown.cells[i] ?? "–"))),
      notes: nodes.flatMap((n, i) => {
        const r = all[i];
        return r && "stop" in r
          ? [
              `No value (${ctx.from(n)?.text.split(",")[0] ?? "stated in place"}): ${sayStop(r.stop)}, ${r.because}.`,
            ]
          : [];
      }),
    };
  }
  return {
    head,
    unit: "",
    numeric: false,
    cells: all.map((r) => joined(ctx.showResolved(r, null))),
  };
}

const isNode = (of: Node | readonly Node[]): of is Node => !Array.isArray(of);
const pick = (values: readonly number[], kept: readonly number[] | null): readonly number[] =>
  kept ? kept.map((i) => values[i] ?? NaN) : values;
const profileOf = (v: PlainJson): { depth: readonly number[]; value: readonly number[] } | null =>
  typeof v === "object" && v !== null && "depth" in v && "value" in v
    ? (v as { depth: readonly number[]; value: readonly number[] })
    : null;
