import type { DisplaySystem } from "../units/index.js";

// Kept on the global object: a package can be loaded twice in one kernel.
const SYSTEM = Symbol.for("stillwell.display-system");

/** The units that bare quantities are shown in; "SI" until `showIn` says otherwise. */
export const displaySystem = (): DisplaySystem =>
  Reflect.get(globalThis, SYSTEM) === "field" ? "field" : "SI";

/** Shows the quantities of this notebook in SI or field units; no number changes. */
export function showIn(system: DisplaySystem): void {
  Reflect.set(globalThis, SYSTEM, system);
}
