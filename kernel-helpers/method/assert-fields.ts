import { InputError } from "../errors/index.js";
import { isKind } from "../units/index.js";
import { assertPossible } from "./bound.js";
import { typeName, type Field, type Fields, type Shape, type Type } from "./descriptors.js";
import type { RangeRule } from "./range-check.js";

/** Throws unless every declared field is there and possible, to any depth of list; structs check themselves. */
export function assertFields(
  fields: Fields<Shape>,
  args: { readonly [name: string]: unknown },
  where: string,
): void {
  for (const [name, field] of Object.entries(fields))
    assertField(field, args[name], `${where}.${name}`);
  for (const name of Object.keys(args)) {
    if (Object.hasOwn(fields, name)) continue;
    throw new InputError({
      code: "unknown-field",
      where: `${where}.${name}`,
      problem: "is not an input",
      expected: Object.keys(fields).join(", "),
    });
  }
}

function assertField(field: Field, x: unknown, where: string): void {
  assertType(field.kind, field, x, where);
}

function assertType(type: Type, field: Field, x: unknown, where: string): void {
  if (isKind(type)) return void assertPossible(x, type, field.possible, where);
  switch (type.type) {
    case "optional":
      if (x !== null && x !== undefined) assertType(type.of, field, x, where);
      return;
    case "list":
      if (!Array.isArray(x)) throw wrong(type, x, where);
      x.forEach((e, i) => assertType(type.each, field, e, `${where}[${i}]`));
      return;
    case "oneOf":
      if (!type.among.includes(x as string)) throw wrong(type, x, where);
      return;
    case "text":
      if (typeof x !== "string") throw wrong(type, x, where);
      return;
    case "profile": {
      const { depth, value } = (x ?? {}) as { depth?: unknown; value?: unknown };
      if (
        !Array.isArray(depth) ||
        !Array.isArray(value) ||
        depth.length !== value.length ||
        depth.length < 2
      )
        throw wrong(type, x, where);
      depth.forEach((d, i) => {
        assertPossible(
          d,
          "measuredDepth",
          i > 0 ? { from: depth[i - 1] as number } : undefined,
          `${where}.depth[${i}]`,
        );
      });
      value.forEach((v, i) => assertPossible(v, type.of, field.possible, `${where}.value[${i}]`));
      return;
    }
    case "struct":
    case "anyOf":
      if (typeof x !== "object" || x === null) throw wrong(type, x, where);
  }
}

const wrong = (type: Type, x: unknown, where: string): InputError =>
  new InputError({
    code: "wrong-kind",
    where,
    problem: `cannot be ${typeof x === "string" ? JSON.stringify(x) : String(x)}`,
    expected: typeName(type),
  });

/** The ranges stated on single inputs. */
export const fieldRules = (fields: Fields<Shape>): RangeRule[] =>
  Object.entries(fields).flatMap(([name, f]) =>
    f.range && isKind(f.kind)
      ? [
          {
            group: name,
            kind: f.kind,
            range: f.range,
            stated: f.stated ?? true,
            note: f.note,
            of: (args: { readonly [n: string]: number }) => args[name] as number,
          },
        ]
      : [],
  );
