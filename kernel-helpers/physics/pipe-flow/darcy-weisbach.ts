import { method, positive } from "../../method/index.js";
import { inch, kgpm3, m, mps } from "../../units/index.js";
import { bore, fluidDensity } from "../fields.js";

/**
 * Frictional pressure gradient in a pipe.
 *
 * Δp/L = f ρ v|v|/(2D) [Pa/m], f the Darcy friction factor (four times Fanning's), v mean velocity
 * [m/s], D bore [m], ρ [kg/m³]; positive along the flow where v is. Exact by definition of f. In an
 * annulus D is the hydraulic diameter.
 */
export const frictionalGradient = method({
  id: "darcy-weisbach",
  revision: 1,
  family: "frictional pressure gradient in a pipe",
  title: "Frictional pressure gradient (Darcy and Weisbach)",
  tex: String.raw`f\,\frac{\rho v\left|v\right|}{2D}`,
  source: { cite: "derivation", where: "definition of the Darcy friction factor" },
  inputs: {
    f: {
      kind: "dimensionless",
      symbol: "f",
      note: "Darcy friction factor",
      possible: positive,
    },
    v: { kind: "velocity", symbol: "v", note: "mean velocity" },
    D: bore,
    rho: fluidDensity,
  },
  output: {
    kind: "pressureGradient",
    symbol: String.raw`\Delta p/L`,
    note: "loss of pressure per length along the flow",
  },
  compute: ({ f, v, D, rho }) => (f * rho * v * Math.abs(v)) / (2 * D),
  checks: [
    {
      from: { cite: "derivation", where: "Hagen-Poiseuille 32µv/D² at f = 64/Re" },
      basis: "exact limit or identity",
      rows: [
        {
          given: { f: 0.64, v: mps(0.1), D: m(0.1), rho: kgpm3(1000) },
          printed: "32.0",
          within: 1e-12,
          because: "µ = 0.1 Pa·s: Re 100, 32 · 0.1 · 0.1/0.01",
        },
      ],
    },
    {
      from: { cite: "geankoplis1993", where: "ex. 2.10-3, Fanning 0.0060 in 0.0525 m pipe" },
      basis: "published worked example",
      rows: [
        {
          given: { f: 4 * 0.006, v: mps(4.57), D: inch(2.067), rho: kgpm3(801) },
          printed: "3826",
          within: 2e-3,
          because: "174.8 J/kg over 36.6 m at 801 kg/m3, both rounded",
        },
      ],
    },
  ],
});
