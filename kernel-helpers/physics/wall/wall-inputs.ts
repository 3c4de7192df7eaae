import { notNegative, positive } from "../../method/index.js";
import { bore } from "../fields.js";

/** What every wall factor takes, so that one can stand for another. */
export const wallInputs = {
  d: { kind: "length", symbol: "d", note: "diameter of the sphere", possible: positive },
  D: bore,
  Re: {
    kind: "dimensionless",
    symbol: String.raw`\mathrm{Re}_\infty`,
    note: "Reynolds number ρvd/µ at the terminal velocity without wall",
    possible: notNegative,
  },
} as const;

export const wallFamily = "wall factor on the slip velocity of a sphere";

export const wallFactor = {
  kind: "dimensionless",
  symbol: "f",
  note: "terminal velocity in the bore over that without wall",
} as const;

export const lambda = ({ d, D }: { readonly d: number; readonly D: number }): number => d / D;
export const lambdaNote = "sphere to bore diameter";
