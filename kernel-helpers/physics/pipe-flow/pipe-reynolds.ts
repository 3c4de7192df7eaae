import { method } from "../../method/index.js";
import { cP, inch, kgpm3, mps } from "../../units/index.js";
import { bore, fluidDensity, fluidViscosity } from "../fields.js";

/**
 * Reynolds number of flow in a round pipe.
 *
 * Re = ρ|v|D/µ; v mean velocity [m/s], D bore [m], ρ, µ of the fluid [kg/m³, Pa·s]. Laminar below about
 * 2100, turbulent above about 4000.
 */
export const pipeReynolds = method({
  id: "pipe-reynolds",
  revision: 1,
  family: "Reynolds number in a pipe",
  title: "Reynolds number in a pipe",
  tex: String.raw`\frac{\rho\left|v\right|D}{\mu}`,
  source: { cite: "derivation", where: "definition" },
  inputs: {
    v: { kind: "velocity", symbol: "v", note: "mean velocity" },
    D: bore,
    rho: fluidDensity,
    mu: fluidViscosity,
  },
  output: {
    kind: "dimensionless",
    symbol: String.raw`\mathrm{Re}`,
    note: "Reynolds number on the bore",
  },
  compute: ({ v, D, rho, mu }) => (rho * Math.abs(v) * D) / mu,
  checks: [
    {
      from: { cite: "geankoplis1993", where: "ex. 2.5-1, water at 10 gal/min in a 2.067 in pipe" },
      basis: "published worked example",
      rows: [
        {
          given: {
            v: mps(0.2917),
            D: inch(2.067),
            rho: kgpm3(996),
            mu: cP(0.8007),
          },
          printed: "1.905e4",
          within: 2e-3,
          because: "the book rounds bore and viscosity",
        },
      ],
    },
  ],
});
