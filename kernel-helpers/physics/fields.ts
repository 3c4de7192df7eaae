import { positive, properFraction } from "../method/index.js";

/** The inputs that relations of several topics share, under one vocabulary. */
export const fluidDensity = {
  kind: "density",
  symbol: String.raw`\rho`,
  note: "fluid density",
  possible: positive,
} as const;

export const solidDensity = {
  kind: "density",
  symbol: String.raw`\rho_s`,
  note: "solid density",
  possible: positive,
} as const;

export const fluidViscosity = {
  kind: "viscosity",
  symbol: String.raw`\mu`,
  note: "fluid viscosity",
  possible: positive,
} as const;

export const bore = {
  kind: "length",
  symbol: "D",
  note: "diameter of the bore",
  possible: positive,
} as const;

export const voidage = {
  kind: "dimensionless",
  symbol: String.raw`\varepsilon`,
  note: "voidage",
  possible: properFraction,
} as const;

export const reynolds = {
  kind: "dimensionless",
  symbol: String.raw`\mathrm{Re}`,
  note: "Reynolds number",
  possible: positive,
} as const;
