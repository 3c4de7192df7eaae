import { assertFields } from "./assert-fields.js";
import type { Fields, Shape, Struct } from "./descriptors.js";
import type { Entered, Values } from "./readings.js";
import type { Outcome, Use } from "./use.js";

export interface EntityParts<I extends string, F extends Shape, V> {
  readonly id: I;
  readonly revision: number;
  readonly title: string;
  readonly fields: Fields<F>;
  /** Adds behaviour and refuses what does not fit together; keeps the fields as own properties. */
  readonly build: (values: Values<F>) => V;
}
/** A typed object: a constructor from its fields, and the descriptor of its type. */
export interface Entity<I extends string, F extends Shape, V> extends Struct<I, F, V> {
  (values: Entered<F>): V;
}

export function entity<I extends string, F extends Shape, V extends Values<F>>(
  parts: EntityParts<I, F, V>,
): Entity<I, F, V> {
  const { fields } = parts;
  const build = (values: Values<F>): V => {
    const whole = complete(fields, values);
    assertFields(fields, whole, parts.id);
    const built = parts.build(whole as Values<F>);
    return Object.defineProperty(built, TAG, { value: parts.id });
  };
  return Object.assign((values: Entered<F>) => build(values as Values<F>), {
    ...parts,
    type: "struct" as const,
    build,
  });
}

// A symbol of the realm's registry, so that two loaded copies of the package know each other's objects.
const TAG = Symbol.for("stillwell.entity");
/** The id of the entity that made an object; null when none did. */
export const entityTag = (x: unknown): string | null =>
  typeof x === "object" && x !== null && TAG in x ? String(x[TAG]) : null;

/** An absent optional field is `null`, so that its own property exists. */
const complete = (
  fields: Fields<Shape>,
  values: { readonly [name: string]: unknown },
): { readonly [name: string]: unknown } => {
  const whole: { [name: string]: unknown } = { ...values };
  for (const [name, { kind }] of Object.entries(fields))
    if (typeof kind !== "string" && kind.type === "optional") whole[name] ??= null;
  return whole;
};

/** An entity is used by building it from its fields. */
export const entityUse = (struct: Struct): Use => ({
  role: "entity",
  id: struct.id,
  revision: struct.revision,
  title: struct.title,
  inputs: struct.fields,
  output: struct,
  uses: [],
  apply: (args): Outcome => ({
    live: struct.build(args),
    findings: [],
    looked: [],
    diagnostics: {},
  }),
});
