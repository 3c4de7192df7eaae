import { notNegative } from "../../method/index.js";
import { reynolds } from "../fields.js";

/** What every friction law takes, so that one can stand for another. */
export const frictionInputs = {
  Re: { ...reynolds, note: "Reynolds number on the bore" },
  eD: {
    kind: "dimensionless",
    symbol: String.raw`\varepsilon/D`,
    note: "wall roughness over bore",
    possible: notNegative,
  },
} as const;

export const frictionFamily = "pipe friction factor (Darcy)";

export const frictionFactor = {
  kind: "dimensionless",
  symbol: "f",
  note: "Darcy friction factor, four times Fanning's",
} as const;
