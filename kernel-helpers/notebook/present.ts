import { inspect } from "node:util";
import type { MimeBundle } from "./cell-outputs.js";
import type { KnownType } from "./known-type.js";
import { presentDeclared } from "./present-declared.js";
import { presentFrame } from "./present-frame.js";
import { presentQuantities } from "./present-quantities.js";
import { presentReference } from "./present-reference.js";
import { presentStudy } from "./present-study.js";
import { presentSelfShown } from "./present-self-shown.js";
import type { Presenter } from "./presenter.js";

/** The first that claims a value shows it. */
const presenters: readonly Presenter[] = [
  presentSelfShown,
  presentReference,
  presentStudy,
  presentQuantities,
  presentDeclared,
  presentFrame,
  { claims: () => true, bundle: (value) => ({ "text/plain": inspect(value) }) },
];

/** A value as a mime bundle; always has `text/plain`. */
export async function present(value: unknown, known: KnownType | null = null): Promise<MimeBundle> {
  const presenter = presenters.find((p) => p.claims(value, known));
  const bundle = (await presenter?.bundle(value, known)) ?? {};
  // A reader without rich display is told at least what there is to see.
  const formats = Object.keys(bundle).join(", ");
  return "text/plain" in bundle ? bundle : { "text/plain": `(shown as ${formats})`, ...bundle };
}
