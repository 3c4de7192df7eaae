import { StudyError } from "../errors/index.js";
import { entityTag, typeName, type Struct, type Type } from "../method/index.js";
import { isKind } from "../units/index.js";
import type { Node } from "./node.js";
import { isRef } from "./wires.js";

/**
 * A wired argument → a node of the record, walked by its DECLARED type: nothing is guessed from the
 * data, and every error names its place. `owns` refuses a Ref of another study.
 */
export function encode(
  type: Type,
  x: unknown,
  where: string,
  owns: (ref: object) => boolean,
): Node {
  if (isRef(x)) {
    if (owns(x)) return { ref: x.id, path: x.path };
    throw new StudyError({
      code: "foreign-reference",
      where,
      problem: `"${x.id}" belongs to another study, or to this one before its first cell ran again`,
      remedy: "run the cell that records it",
    });
  }
  if (isKind(type)) {
    if (typeof x === "number" && Number.isFinite(x)) return { si: x + 0, kind: type }; // JSON has no minus zero
    throw refused(type, x, where);
  }
  const inner = (t: Type, y: unknown, at: string): Node => encode(t, y, `${where}${at}`, owns);
  switch (type.type) {
    case "optional":
      return x === null || x === undefined ? { absent: true } : inner(type.of, x, "");
    case "list":
      if (!Array.isArray(x)) throw refused(type, x, where);
      return { list: x.map((e, i) => inner(type.each, e, `[${i}]`)) };
    case "oneOf":
      if (typeof x !== "string" || !type.among.includes(x)) throw refused(type, x, where);
      return { choice: x };
    case "text":
      if (typeof x !== "string") throw refused(type, x, where);
      return { text: x };
    case "profile": {
      const { depth, value } = (x ?? {}) as { depth?: unknown; value?: unknown };
      if (!isNumbers(depth) || !isNumbers(value) || depth.length !== value.length)
        throw refused(type, x, where);
      return { along: type.of, depth: [...depth], value: [...value] };
    }
    case "anyOf": {
      const struct = type.among.find((s) => s.id === entityTag(x)) ?? onlyFit(type.among, x);
      if (!struct) throw refused(type, x, where);
      return inner(struct, x, "");
    }
    case "struct": {
      if (typeof x !== "object" || x === null) throw refused(type, x, where);
      const tag = entityTag(x);
      if (tag !== null && tag !== type.id) throw refused(type, x, where);
      const given = x as { readonly [name: string]: unknown };
      const unknown =
        tag === null ? Object.keys(given).find((n) => !Object.hasOwn(type.fields, n)) : undefined;
      if (unknown !== undefined)
        throw new StudyError({
          code: "unknown-field",
          where: `${where}.${unknown}`,
          problem: `is not a field of ${type.id}`,
          expected: Object.keys(type.fields).join(", "),
        });
      return {
        of: type.id,
        revision: type.revision,
        fields: Object.fromEntries(
          Object.entries(type.fields).map(([n, f]) => [n, inner(f.kind, given[n], `.${n}`)]),
        ),
      };
    }
  }
}

/** The one struct whose fields an untagged object has, all required and none unknown. */
function onlyFit(among: readonly Struct[], x: unknown): Struct | null {
  if (typeof x !== "object" || x === null || entityTag(x) !== null) return null;
  const fits = among.filter(
    ({ fields }) =>
      Object.keys(x).every((n) => Object.hasOwn(fields, n)) &&
      Object.entries(fields).every(
        ([n, f]) =>
          Object.hasOwn(x, n) || (typeof f.kind !== "string" && f.kind.type === "optional"),
      ),
  );
  return fits.length === 1 ? (fits[0] ?? null) : null;
}

const isNumbers = (x: unknown): x is number[] =>
  Array.isArray(x) && x.every((n) => typeof n === "number" && Number.isFinite(n));

const refused = (type: Type, x: unknown, where: string): StudyError =>
  new StudyError({
    code: x === undefined ? "missing" : "wrong-kind",
    where,
    problem: x === undefined ? "is missing" : `cannot be ${sayValue(x)}`,
    expected: typeName(type),
  });
const sayValue = (x: unknown): string => {
  if (typeof x === "string") return JSON.stringify(x);
  if (typeof x === "object" && x !== null)
    return entityTag(x) ?? (Array.isArray(x) ? "a list" : "an object");
  return String(x);
};
