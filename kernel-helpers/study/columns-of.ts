import { InputError } from "../errors/index.js";
import { typeName, type Along, type Type } from "../method/index.js";
import type { Column } from "../tables/index.js";
import { displayUnit, inUnit, isKind, type DisplaySystem, type Kind } from "../units/index.js";

/**
 * A profile, a list, or a result that holds profiles on one depth grid, as columns with units in their
 * heads: for a frame, a CSV file, or to compute with.
 *
 * Throws InputError `no-table` for a value that is none of these.
 */
export function columnsOf(
  type: Type,
  value: unknown,
  system: DisplaySystem,
  head = "value",
): Column[] {
  if (!isKind(type)) {
    if (type.type === "optional" && value !== null) return columnsOf(type.of, value, system, head);
    if (type.type === "profile") {
      const { depth, value: along } = value as Along<Kind>;
      return [
        numbers("measured depth", "measuredDepth", depth, system),
        numbers(head, type.of, along, system),
      ];
    }
    if (type.type === "list") return ofList(type.each, value as readonly unknown[], system, head);
    if (type.type === "struct") {
      const found = profilesOf(type.fields, value as { readonly [name: string]: unknown }, system);
      if (found.length > 0) return found;
    }
  }
  throw new InputError({
    code: "no-table",
    where: head,
    problem: `a ${typeName(type)} is no table`,
    expected: "a profile, a list, or a result that holds profiles",
  });
}

type Fields = { readonly [name: string]: { readonly kind: Type } };

/** The profiles of a result that share the depths of the first. */
function profilesOf(
  fields: Fields,
  value: { readonly [name: string]: unknown },
  system: DisplaySystem,
): Column[] {
  const along = Object.entries(fields).flatMap(([name, { kind }]) =>
    !isKind(kind) && kind.type === "profile"
      ? [{ name, of: kind.of, at: value[name] as Along<Kind> }]
      : [],
  );
  const grid = along[0]?.at.depth;
  if (!grid) return [];
  const shared = along.filter(
    ({ at }) => at.depth.length === grid.length && at.depth.every((d, i) => d === grid[i]),
  );
  return [
    numbers("measured depth", "measuredDepth", grid, system),
    ...shared.map(({ name, of, at }) => numbers(name, of, at.value, system)),
  ];
}

function ofList(
  each: Type,
  all: readonly unknown[],
  system: DisplaySystem,
  head: string,
): Column[] {
  if (isKind(each) || each.type !== "struct") return [column(head, each, all, system)];
  return Object.entries(each.fields)
    .filter(([, { kind }]) => isKind(kind) || ["text", "oneOf", "optional"].includes(kind.type))
    .map(([name, { kind }]) =>
      column(
        name,
        kind,
        all.map((x) => (x as { readonly [n: string]: unknown })[name]),
        system,
      ),
    );
}

function column(
  head: string,
  type: Type,
  values: readonly unknown[],
  system: DisplaySystem,
): Column {
  const inner = !isKind(type) && type.type === "optional" ? type.of : type;
  if (isKind(inner)) return numbers(head, inner, values as readonly (number | null)[], system);
  return {
    head,
    values: values.map((x) => (x === null || x === undefined ? null : (x as string))),
  };
}

function numbers(
  head: string,
  kind: Kind,
  values: readonly (number | null)[],
  system: DisplaySystem,
): Column {
  const largest = values.reduce<number>((a, x) => Math.max(a, Math.abs(x ?? 0)), 0);
  const unit = displayUnit(kind, system, largest);
  return {
    head,
    unit: unit.symbol,
    values: values.map((x) => (x === null ? null : inUnit(x as never, unit))),
  };
}
