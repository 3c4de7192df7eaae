import { inspect } from "node:util";
import { isKind } from "../units/index.js";
import type { KnownType } from "./known-type.js";
import { presentQuantities } from "./present-quantities.js";
import type { Presenter } from "./presenter.js";

/** A handle to an item of a study, told by its fields: the package may be loaded twice. */
interface Reference {
  readonly __ref: unknown;
  readonly id: string;
  readonly path: readonly unknown[];
  readonly value: unknown;
}

/** References to recorded items: which item, and the value it has now. */
export const presentReference: Presenter = {
  claims: isReference,
  bundle: async (x) => {
    if (!isReference(x)) return {};
    const id = [x.id, ...x.path.map((step) => (isObject(step) ? "at a depth" : String(step)))];
    return { "text/plain": `${id.join(" › ")}: ${await sayValue(x)}` };
  },
};

async function sayValue(reference: Reference): Promise<string> {
  let value: unknown;
  try {
    value = reference.value;
  } catch (error) {
    return error instanceof Error ? error.message : String(error);
  }
  const known = knownOf(reference.__ref);
  if (!presentQuantities.claims(value, known)) return inspect(value);
  const text = String((await presentQuantities.bundle(value, known))["text/plain"]);
  return text.includes("\n") ? `\n${text}` : text;
}

/** What a declared type says of the values that have it. */
function knownOf(type: unknown): KnownType | null {
  if (isKind(type)) return { kind: type };
  if (!isObject(type)) return null;
  if (type["type"] === "optional") return knownOf(type["of"]);
  if (type["type"] === "list") {
    const each = knownOf(type["each"]);
    return each && { each };
  }
  if (type["type"] === "profile" && isKind(type["of"]))
    return {
      fields: { depth: { each: { kind: "measuredDepth" } }, value: { each: { kind: type["of"] } } },
    };
  if (type["type"] !== "struct" || !isObject(type["fields"])) return null;
  const fields = Object.entries(type["fields"]).flatMap(([name, field]) => {
    const known = isObject(field) ? knownOf(field["kind"]) : null;
    return known ? [[name, known] as const] : [];
  });
  return { fields: Object.fromEntries(fields) };
}

function isReference(x: unknown): x is Reference {
  return isObject(x) && "__ref" in x && typeof x["id"] === "string" && Array.isArray(x["path"]);
}

const isObject = (x: unknown): x is { readonly [name: string]: unknown } =>
  (typeof x === "object" || typeof x === "function") && x !== null;
