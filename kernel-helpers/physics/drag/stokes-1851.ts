import { method } from "../../method/index.js";
import { dragFamily, sphereDrag, sphereReynolds } from "./sphere-drag.js";

/**
 * Drag coefficient of a sphere in creeping flow.
 *
 * Cd = 24/Re, Re = ρvd/µ on the slip velocity, Cd on πd²/4. Exact as Re → 0; 5 % low at Re = 0.3.
 * Stokes (1851).
 */
export const stokes = method({
  id: "stokes-1851",
  revision: 1,
  family: dragFamily,
  title: "Drag coefficient of a sphere (Stokes)",
  tex: String.raw`\frac{24}{\mathrm{Re}}`,
  source: { cite: "stokes1851", where: "creeping flow past a sphere" },
  inputs: { Re: { ...sphereReynolds, range: [0, 0.3] } },
  output: sphereDrag,
  compute: ({ Re }) => 24 / Re,
  checks: [
    {
      from: { cite: "fluids", where: "drag.Stokes" },
      basis: "general reference library",
      rows: [{ given: { Re: 0.1 }, printed: "240" }],
    },
    {
      from: { cite: "lapple1940", where: "standard drag curve" },
      basis: "from memory",
      rows: [{ given: { Re: 0.1 }, printed: "240", within: 0.02, because: "read from the curve" }],
    },
  ],
});
