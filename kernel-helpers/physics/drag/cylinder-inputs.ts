import { positive } from "../../method/index.js";

export const cylinderInputs = {
  L: { kind: "length", symbol: "L", note: "length of the cylinder", possible: positive },
  d: { kind: "length", symbol: "d", note: "diameter of the cylinder", possible: positive },
} as const;
