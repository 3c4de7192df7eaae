import { notNegative, positive } from "../../method/index.js";
import { bore } from "../fields.js";

/** What every relation for the exponent n of hindered settling takes. */
export const exponentInputs = {
  Re: {
    kind: "dimensionless",
    symbol: String.raw`\mathrm{Re}_t`,
    note: "Reynolds number ρv_td/µ of one grain alone, without wall",
    possible: notNegative,
  },
  Ar: {
    kind: "dimensionless",
    symbol: String.raw`\mathrm{Ar}`,
    note: "Archimedes (Galileo) number d³ρ(ρ_s−ρ)g/µ²",
    possible: notNegative,
  },
  d: { kind: "length", symbol: "d", note: "grain diameter", possible: positive },
  D: bore,
} as const;

export const exponentFamily = "hindered settling exponent";

export const exponentOutput = {
  kind: "dimensionless",
  symbol: "n",
  note: "exponent of the voidage in U = v ε^n, U superficial",
} as const;

export const grainToBore = {
  of: ({ d, D }: { readonly d: number; readonly D: number }) => d / D,
  range: [0, 0.2],
  stated: false,
  note: "grain to bore diameter",
} as const;
