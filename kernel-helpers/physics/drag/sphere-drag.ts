import { reynolds } from "../fields.js";

export const dragFamily = "sphere drag coefficient";

export const sphereReynolds = {
  ...reynolds,
  note: "Reynolds number ρvd/µ on the slip velocity",
} as const;

export const sphereDrag = {
  kind: "dimensionless",
  symbol: "C_d",
  note: "drag coefficient on the frontal area πd²/4",
} as const;
