import { method } from "../../method/index.js";
import { dragFamily, sphereDrag, sphereReynolds } from "./sphere-drag.js";

/**
 * Drag coefficient of a sphere below the drag crisis.
 *
 * Cd = (24/Re)(1 + 0.1806 Re^0.6459) + 0.4251/(1 + 6880.95/Re) for Re < 2.6e5; Re = ρvd/µ on the slip
 * velocity, Cd on πd²/4. Haider and Levenspiel (1989), their fit to spheres alone: their general
 * equation at sphericity 1 has other constants.
 */
export const haiderLevenspielSphere = method({
  id: "haider-levenspiel-sphere-1989",
  revision: 1,
  family: dragFamily,
  title: "Drag coefficient of a sphere (Haider and Levenspiel)",
  tex: String.raw`\frac{24}{\mathrm{Re}}\left(1+0.1806\,\mathrm{Re}^{0.6459}\right)+\frac{0.4251}{1+6880.95/\mathrm{Re}}`,
  source: { cite: "haider1989", where: "equation for spheres" },
  inputs: { Re: { ...sphereReynolds, range: [0, 2.6e5] } },
  output: sphereDrag,
  compute: ({ Re }) => (24 / Re) * (1 + 0.1806 * Re ** 0.6459) + 0.4251 / (1 + 6880.95 / Re),
  checks: [
    {
      from: { cite: "fluids", where: "drag.Haider_Levenspiel" },
      basis: "general reference library",
      rows: [
        { given: { Re: 100 }, printed: "1.09474015627" },
        { given: { Re: 1e4 }, printed: "0.420383278515" },
      ],
    },
    {
      from: { cite: "lapple1940", where: "standard drag curve" },
      basis: "from memory",
      rows: [
        { given: { Re: 10 }, printed: "4.1", within: 0.07, because: "read from the curve" },
        { given: { Re: 100 }, printed: "1.07", within: 0.07, because: "read from the curve" },
        { given: { Re: 1000 }, printed: "0.46", within: 0.07, because: "read from the curve" },
        { given: { Re: 1e4 }, printed: "0.405", within: 0.07, because: "read from the curve" },
        { given: { Re: 1e5 }, printed: "0.48", within: 0.07, because: "read from the curve" },
      ],
    },
  ],
});
