import { positive } from "../../method/index.js";
import { bore, fluidDensity, fluidViscosity, solidDensity, voidage } from "../fields.js";
import { packWeightGradient } from "./pack-weight-gradient.js";

/** What every relation for the lift of a pack takes; a law of the gradient may be chosen besides. */
export const liftInputs = {
  d: { kind: "length", symbol: "d", note: "grain diameter", possible: positive },
  eps: voidage,
  rho: fluidDensity,
  rhoS: solidDensity,
  mu: fluidViscosity,
  D: { ...bore, note: "bore diameter (enters the law's range, and its equation where it says so)" },
  theta: packWeightGradient.inputs.theta,
} as const;
