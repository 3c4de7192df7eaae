import { z } from "zod";
import { StudyError } from "../errors/index.js";
import { kinds, type Kind } from "../units/index.js";
import type { PlainJson } from "./plain.js";
import { bodyHash, type StudyRecord } from "./record.js";
import type { Node } from "./node.js";
import type { TypeJson } from "./type-json.js";

/** The newest schema that this version reads; older ones are migrated step by step. */
export const SCHEMA = 1;

const kind = z.enum(Object.keys(kinds) as [Kind, ...Kind[]]);
const finite = z.number();
const id = z.string().regex(/^[A-Za-z][A-Za-z0-9_.-]*$/);
const named = <T extends z.ZodType>(of: T) => z.record(z.string(), of);

const node: z.ZodType<Node> = z.lazy(() =>
  z.union([
    z.strictObject({
      ref: id,
      path: z.array(
        z.union([z.string(), z.number().int().nonnegative(), z.strictObject({ depth: node })]),
      ),
    }),
    z.strictObject({ si: finite, kind }),
    z.strictObject({ choice: z.string() }),
    z.strictObject({ text: z.string() }),
    z.strictObject({ list: z.array(node) }),
    z.strictObject({ of: z.string(), revision: z.number().int(), fields: named(node) }),
    z.strictObject({ along: kind, depth: z.array(finite), value: z.array(finite) }),
    z.strictObject({ absent: z.literal(true) }),
  ]),
);
const typeOf: z.ZodType<TypeJson> = z.lazy(() =>
  z.union([
    kind,
    z.strictObject({ type: z.literal("struct"), id: z.string() }),
    z.strictObject({ type: z.literal("anyOf"), among: z.array(z.string()) }),
    z.strictObject({ type: z.literal("list"), each: typeOf }),
    z.strictObject({ type: z.literal("oneOf"), among: z.array(z.string()) }),
    z.strictObject({ type: z.literal("profile"), of: kind }),
    z.strictObject({ type: z.literal("optional"), of: typeOf }),
    z.strictObject({ type: z.literal("text") }),
  ]),
);
const plain: z.ZodType<PlainJson> = z.lazy(() =>
  z.union([finite, z.string(), z.null(), z.array(plain), named(plain)]),
);
const value = z.strictObject({ value: plain });
const result = z.union([value, z.strictObject({ stop: z.string(), because: z.string() })]);
const findings = z.array(
  z.strictObject({
    code: z.enum(["out-of-range", "pass-the-reference", "advice"]),
    by: z.string(),
    says: z.string(),
    group: z.string().optional(),
    worst: finite.optional(),
    range: z.tuple([finite.nullable(), finite.nullable()]).optional(),
    count: z.tuple([z.number().int(), z.number().int()]).optional(),
  }),
);
const common = {
  id,
  section: z.string().nullable(),
  title: z.string(),
  symbol: z.string().nullable(),
};
const stated = {
  ...common,
  op: z.enum(["given", "assumed"]),
  because: z.string(),
  verify: z.strictObject({ how: z.string(), by: z.string(), required: z.boolean() }).nullable(),
  result: value,
};
const applied = { ...common, args: named(node), result, findings };
const item = z.union([
  z.strictObject({
    ...stated,
    form: z.literal("number"),
    type: kind,
    typed: z.union([finite, z.string()]),
    unit: z.string(),
    spread: z.strictObject({ low: finite, high: finite, says: z.string() }).nullable(),
  }),
  z.strictObject({ ...stated, form: z.literal("choice"), type: typeOf }),
  z.strictObject({
    ...stated,
    form: z.literal("object"),
    type: typeOf,
    use: z.string(),
    revision: z.number().int(),
    args: named(node),
    file: z.strictObject({ name: z.string(), sha256: z.string() }).nullable(),
  }),
  z.strictObject({
    ...applied,
    op: z.enum(["entity", "step", "run"]),
    use: z.string(),
    revision: z.number().int(),
    type: typeOf,
    looked: z.array(z.string()),
    diagnostics: named(z.union([finite, z.string()])),
  }),
  z.strictObject({
    ...applied,
    op: z.literal("formula"),
    text: z.string(),
    kinds: named(kind),
    type: kind,
  }),
  z.strictObject({
    ...applied,
    op: z.literal("compare"),
    of: kind,
    because: z.string(),
    type: z.literal("dimensionless"),
  }),
  z.strictObject({
    ...applied,
    op: z.literal("check"),
    sense: z.enum(["at least", "at most", "is"]),
    of: typeOf,
    margin: finite.nullable(),
    because: z.string(),
    type: typeOf,
  }),
  z.strictObject({
    ...common,
    op: z.literal("conclude"),
    parts: z.array(z.union([z.string(), z.strictObject({ node, unit: z.string().nullable() })])),
    checks: z.array(id),
  }),
  z.strictObject({ ...common, op: z.literal("caution"), text: z.string() }),
  z.strictObject({
    ...common,
    op: z.literal("figure"),
    chart: z.string(),
    revision: z.number().int(),
    args: named(node),
    caption: z.string(),
  }),
  z.strictObject({
    ...common,
    op: z.literal("table"),
    columns: z.array(
      z.strictObject({
        head: z.string(),
        unit: z.string().nullable(),
        of: z.union([node, z.array(node)]),
      }),
    ),
    caption: z.string(),
  }),
]);

const source = z.strictObject({ cite: z.string(), where: z.string() });
const field = z.strictObject({ type: typeOf, symbol: z.string().nullable(), note: z.string() });
const declared = {
  id: z.string(),
  revision: z.number().int(),
  title: z.string(),
  inputs: named(field),
};
const declaration = z.discriminatedUnion("role", [
  z.strictObject({
    role: z.literal("method"),
    ...declared,
    tex: z.string(),
    source,
    result: z.strictObject({ kind, symbol: z.string(), note: z.string() }),
    ranges: z.array(
      z.strictObject({
        group: z.string(),
        kind,
        range: z.tuple([finite.nullable(), finite.nullable()]),
        stated: z.boolean(),
        note: z.string().nullable(),
      }),
    ),
    uses: z.array(z.string()),
    checks: z.array(z.strictObject({ from: source, basis: z.string(), rows: z.number().int() })),
    direction: z.strictObject({ safeFor: z.string(), unsafeFor: z.string() }).nullable(),
    cautions: z.array(z.string()),
  }),
  z.strictObject({
    role: z.literal("model"),
    ...declared,
    about: z.array(z.string()),
    results: named(field),
    uses: z.array(z.strictObject({ id: z.string(), revision: z.number().int() })),
    tolerances: named(finite),
    cautions: z.array(z.string()),
  }),
  z.strictObject({ role: z.literal("entity"), ...declared }),
]);

// Not exported: a notebook would have to load the whole type of it.
const recordSchema = z.strictObject({
  schema: z.literal(SCHEMA),
  body: z.strictObject({
    study: z.strictObject({
      id,
      title: z.string(),
      number: z.string(),
      revision: z.string(),
      purpose: z.string(),
      decision: z.string(),
      prepared: z.string(),
      checked: z.string().nullable(),
      approved: z.string().nullable(),
      display: z.enum(["SI", "field"]),
      disclaimer: z.string().nullable(),
    }),
    sections: z.array(
      z.strictObject({
        id: z.string(),
        title: z.string(),
        about: z.string().nullable(),
        within: z.string().nullable(),
      }),
    ),
    items: z.array(item),
    declared: z.array(declaration),
    references: z.array(z.looseObject({ id: z.string(), type: z.string(), title: z.string() })),
  }),
  hash: z.string().regex(/^[0-9a-f]{64}$/),
  run: z.strictObject({
    at: z.string(),
    clean: z.boolean(),
    stale: z.array(z.string()),
    versions: named(z.string()),
    notebook: z.strictObject({ name: z.string(), sha256: z.string() }).nullable(),
  }),
});

/** A foreign value → a record that is safe to use; named errors for a newer schema, a wrong shape, a changed body. */
export function parseRecord(x: unknown, where: string): StudyRecord {
  if (typeof x !== "object" || x === null || !("schema" in x))
    throw new StudyError({
      code: "not-a-record",
      where,
      problem: "is not a study record: it has no schema number",
    });
  const { schema } = x;
  if (typeof schema !== "number" || !Number.isInteger(schema) || schema < 1)
    throw new StudyError({
      code: "not-a-record",
      where,
      problem: `has the schema ${JSON.stringify(schema)}`,
      expected: `a whole number from 1 to ${SCHEMA}`,
    });
  if (schema > SCHEMA)
    throw new StudyError({
      code: "newer-schema",
      where,
      problem: `has schema ${schema}`,
      expected: `at most ${SCHEMA}`,
      remedy: "read it with a newer version of Stillwell",
    });
  const parsed = recordSchema.safeParse(x);
  if (!parsed.success) {
    const [first] = parsed.error.issues;
    throw new StudyError({
      code: "malformed",
      where: `${where}: ${first?.path.join(".") ?? ""}`,
      problem: first?.message ?? "does not have the shape of a record",
    });
  }
  const record = parsed.data as unknown as StudyRecord;
  assertWhole(record, where);
  const hash = bodyHash(record.body);
  if (hash !== record.hash)
    throw new StudyError({
      code: "changed",
      where,
      problem: "was changed after it was written: its body does not match its hash",
      remedy: "run the notebook again",
    });
  return record;
}

/** Ids are unique and every section named exists. */
function assertWhole({ body }: StudyRecord, where: string): void {
  const ids = new Set<string>();
  const sections = new Set(body.sections.map((s) => s.id));
  for (const i of body.items) {
    if (ids.has(i.id))
      throw new StudyError({
        code: "duplicate-id",
        where: `${where}: ${i.id}`,
        problem: "stands twice",
      });
    ids.add(i.id);
    if (i.section !== null && !sections.has(i.section))
      throw new StudyError({
        code: "malformed",
        where: `${where}: ${i.id}`,
        problem: `is in the section "${i.section}", which the record does not have`,
      });
  }
}
