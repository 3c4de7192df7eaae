import { method, positive } from "../../method/index.js";
import { mps } from "../../units/index.js";
import { voidage } from "../fields.js";

/**
 * Superficial velocity at which a suspension of equal grains hovers, or settles in a closed vessel.
 *
 * U = v_i ε^n; v_i [m/s] the velocity of one grain alone in the same bore (the wall already in it), ε
 * voidage, n the exponent. The slip velocity between solids and fluid is v_i ε^(n−1). Fluid at rest
 * as a whole: with flow, U is relative to the mean of solids and fluid. Solids up to about 55 %.
 * Richardson and Zaki (1954), who found log₁₀ v_i = log₁₀ v_t − d/D for hovering.
 */
export const hinderedVelocity = method({
  id: "hindered-velocity",
  revision: 1,
  family: "hindered settling velocity",
  title: "Hindered settling velocity (Richardson and Zaki)",
  tex: String.raw`v_i\,\varepsilon^{\,n}`,
  source: { cite: "richardson1954", where: "part I" },
  inputs: {
    v: {
      kind: "velocity",
      symbol: "v_i",
      note: "velocity of one grain alone in the bore",
      possible: positive,
    },
    eps: { ...voidage, range: [0.45, 1] },
    n: {
      kind: "dimensionless",
      symbol: "n",
      note: "exponent",
      possible: positive,
      range: [2.3, 6.6],
      stated: false,
    },
  },
  output: { kind: "velocity", symbol: "U", note: "superficial velocity" },
  compute: ({ v, eps, n }) => v * eps ** n,
  checks: [
    {
      from: { cite: "coulson2002", where: "ex. 6.3, glass 4 mm in water at 0.25 m/s" },
      basis: "published worked example",
      rows: [
        {
          given: { v: mps(0.45), eps: 0.784, n: 2.42 },
          in: mps,
          printed: "0.25",
        },
      ],
    },
    {
      from: { cite: "coulson2002", where: "ex. 5.3, greatest batch flux at solids 1/5.8" },
      basis: "published worked example",
      rows: [
        {
          given: { v: mps(8.72e-3), eps: 4.8 / 5.8, n: 4.8 },
          in: mps,
          printed: "3.516e-3",
          within: 1e-3,
          because: "the book's flux 6.062e-4 m/s over the solids fraction 0.1724",
        },
      ],
    },
  ],
});
