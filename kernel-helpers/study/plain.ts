import { SolveError } from "../errors/index.js";
import { entityTag, list, type Type } from "../method/index.js";
import { isKind } from "../units/index.js";

/** A result as the record keeps it. */
export type PlainJson =
  number | string | null | readonly PlainJson[] | { readonly [name: string]: PlainJson };

/** A live result → what the record keeps: declared fields only, every number finite. */
export function plain(type: Type, x: unknown, where: string): PlainJson {
  if (isKind(type)) {
    if (typeof x === "number" && Number.isFinite(x)) return x + 0;
    throw new SolveError({
      code: "not-finite",
      where,
      problem: `computed ${String(x)}`,
      expected: `a finite ${type}`,
    });
  }
  const each = (t: Type, y: unknown, at: string): PlainJson => plain(t, y, `${where}${at}`);
  const field = (n: string): unknown => (x as { readonly [name: string]: unknown })[n];
  switch (type.type) {
    case "optional":
      return x === null || x === undefined ? null : each(type.of, x, "");
    case "text":
    case "oneOf":
      return x as string;
    case "list":
      return (x as readonly unknown[]).map((e, i) => each(type.each, e, `[${i}]`));
    case "profile":
      return {
        depth: each(list("measuredDepth"), field("depth"), ".depth"),
        value: each(list(type.of), field("value"), ".value"),
      };
    case "struct":
      return Object.fromEntries(
        Object.entries(type.fields).map(([n, f]) => [n, each(f.kind, field(n), `.${n}`)]),
      );
    case "anyOf": {
      const struct = type.among.find((s) => s.id === entityTag(x));
      if (!struct)
        throw new SolveError({ code: "wrong-kind", where, problem: "computed an untagged object" });
      return { of: struct.id, ...(each(struct, x, "") as { readonly [name: string]: PlainJson }) };
    }
  }
}
