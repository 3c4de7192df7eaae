import { positive } from "../../method/index.js";
import { bore, fluidDensity, fluidViscosity, voidage } from "../fields.js";

/** What every law of the pressure gradient in a pack takes, so that one can stand for another. */
export const bedInputs = {
  u: { kind: "velocity", symbol: "u", note: "superficial velocity; its sign is the gradient's" },
  d: { kind: "length", symbol: "d", note: "grain diameter (surface-volume)", possible: positive },
  eps: voidage,
  rho: fluidDensity,
  mu: fluidViscosity,
  D: { ...bore, note: "bore diameter (enters the range; the equation only where it says so)" },
} as const;

export const bedGradient = {
  kind: "pressureGradient",
  symbol: String.raw`\Delta p/L`,
  note: "dynamic pressure gradient (hydrostatic removed)",
} as const;

export const bedFamily = "packed-bed pressure gradient";

export interface BedFlow {
  readonly u: number;
  readonly d: number;
  readonly eps: number;
  readonly rho: number;
  readonly mu: number;
}
/** ρ|u|d/µ, on the superficial velocity. */
export const grainReynolds = ({ u, d, rho, mu }: BedFlow): number => (rho * Math.abs(u) * d) / mu;

/** ρ|u|d/(µ(1−ε)): the Reynolds number of Ergun and his followers. */
export const packReynolds = ({ u, d, eps, rho, mu }: BedFlow): number =>
  (rho * Math.abs(u) * d) / (mu * (1 - eps));

export const boreToGrain = ({ d, D }: { readonly d: number; readonly D: number }): number => D / d;

export const packReynoldsNote = "pack Reynolds number ρud/(µ(1−ε))";
export const boreToGrainNote = "bore to grain diameter";
