import { method } from "../../method/index.js";
import { bblpday, ftps, inch } from "../../units/index.js";
import { bore } from "../fields.js";

/**
 * Mean velocity of a flow in a round bore.
 *
 * v = 4q/(πD²) [m/s]; q volume rate in place [m³/s], D bore [m]. Exact. q is the rate at the pressure
 * and temperature of the depth, not at standard conditions; the sign is kept.
 */
export const meanVelocity = method({
  id: "mean-velocity",
  revision: 1,
  family: "mean velocity in a bore",
  title: "Mean velocity in a round bore",
  tex: String.raw`\frac{4q}{\pi D^2}`,
  source: { cite: "derivation", where: "definition of the mean velocity" },
  inputs: {
    q: { kind: "flowRate", symbol: "q", note: "volume rate in place" },
    D: bore,
  },
  output: { kind: "velocity", symbol: "v", note: "mean velocity" },
  compute: ({ q, D }) => (4 * q) / (Math.PI * D ** 2),
  checks: [
    {
      from: { cite: "derivation", where: "oilfield constant: v[ft/s] = q[bbl/d]·0.011914/D²[in]" },
      basis: "exact limit or identity",
      rows: [
        {
          given: { q: bblpday(10_000), D: inch(4) },
          in: ftps,
          printed: "7.4465",
          within: 1e-4,
          because: "5.614583/86400/(π/4/144) = 0.0119144 of the units alone",
        },
      ],
    },
    {
      from: { cite: "derivation", where: "rule of thumb: 15 ft/s in 7 in is 62 000 bbl/d" },
      basis: "common practice, no source",
      rows: [
        {
          given: { q: bblpday(62_000), D: inch(7) },
          in: ftps,
          printed: "15",
        },
      ],
    },
  ],
});
