import { oneOf, positive } from "../../method/index.js";
import { fluidDensity, fluidViscosity, solidDensity } from "../fields.js";

/** What both relations for a rod that falls in a wide, still fluid take. */
export const freeRodInputs = {
  d: { kind: "length", symbol: "d", note: "diameter of the rod", possible: positive },
  L: { kind: "length", symbol: "L", note: "length of the rod", possible: positive },
  rho: fluidDensity,
  rhoS: solidDensity,
  mu: fluidViscosity,
  attitude: {
    kind: oneOf("axial", "broadside"),
    note: "axis along the fall (guided) or across it (free: the stable one)",
  },
} as const;

export const freeRodFamily = "terminal velocity of a free rod";

export const freeRodOutput = {
  kind: "velocity",
  symbol: "v_t",
  note: "terminal velocity (slip)",
} as const;
