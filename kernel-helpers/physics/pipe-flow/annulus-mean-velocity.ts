import { method, positive } from "../../method/index.js";
import { inch, bblpday, mps } from "../../units/index.js";
import { bore } from "../fields.js";
import { refuseTooWide } from "../refuse.js";

/**
 * Mean velocity of a flow in an annulus.
 *
 * v = 4q/(π(D²−d²)) [m/s]; q volume rate in place [m³/s], D bore, d diameter of the inner pipe or body
 * [m]. Exact, concentric or not. Throws InputError for d ≥ D.
 */
export const annulusMeanVelocity = method({
  id: "annulus-mean-velocity",
  revision: 1,
  family: "mean velocity in an annulus",
  title: "Mean velocity in an annulus",
  tex: String.raw`\frac{4q}{\pi\left(D^2-d^2\right)}`,
  source: { cite: "derivation", where: "definition of the mean velocity" },
  inputs: {
    q: { kind: "flowRate", symbol: "q", note: "volume rate in place" },
    d: { kind: "length", symbol: "d", note: "diameter of the inner body", possible: positive },
    D: bore,
  },
  output: { kind: "velocity", symbol: "v", note: "mean velocity" },
  compute: ({ q, d, D }) => {
    refuseTooWide("annulus-mean-velocity", d, D);
    return (4 * q) / (Math.PI * (D - d) * (D + d));
  },
  checks: [
    {
      from: { cite: "derivation", where: "annular capacity (D²−d²)/1029.4 bbl/ft" },
      basis: "exact limit or identity",
      rows: [
        {
          given: { q: bblpday(10_000), d: inch(5), D: inch(8.5) },
          in: mps,
          printed: "0.76852",
          within: 2e-4,
          because: "10 000/86 400 bbl/s over 47.25/1029.4 bbl/ft; the constant has five digits",
        },
      ],
    },
  ],
});
