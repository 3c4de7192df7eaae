import { oneOf, positive } from "../../method/index.js";
import { bore, fluidDensity, fluidViscosity, solidDensity } from "../fields.js";

/** A rod in a vertical bore of still or upward flowing fluid. */
export const rodInputs = {
  d: { kind: "length", symbol: "d", note: "diameter of the rod", possible: positive },
  D: bore,
  L: { kind: "length", symbol: "L", note: "length of the rod", possible: positive },
  rho: fluidDensity,
  rhoS: solidDensity,
  mu: fluidViscosity,
  nose: { kind: oneOf("flat", "rounded"), note: "form of the lower end" },
} as const;

export const upwardFlow = {
  kind: "velocity",
  symbol: "J",
  note: "net superficial velocity in the bore, upwards positive",
} as const;

export const rodVelocity = {
  kind: "velocity",
  symbol: "v",
  note: "velocity of the rod relative to the pipe, downwards positive",
} as const;

export type Nose = "flat" | "rounded";

export interface Rod {
  readonly d: number;
  readonly D: number;
  readonly L: number;
  readonly rho: number;
  readonly rhoS: number;
  readonly mu: number;
  readonly nose: Nose;
}
