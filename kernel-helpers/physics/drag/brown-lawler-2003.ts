import { method } from "../../method/index.js";
import { dragFamily, sphereDrag, sphereReynolds } from "./sphere-drag.js";

/**
 * Drag coefficient of a sphere below the drag crisis.
 *
 * Cd = (24/Re)(1 + 0.150 Re^0.681) + 0.407/(1 + 8710/Re) for Re < 2e5; Re = ρvd/µ on the slip
 * velocity, Cd on πd²/4. Fitted to 480 data corrected for the wall. It knows no drag crisis: above
 * Re 2e5 it says about 0.47 where a smooth sphere may have 0.1. Brown and Lawler (2003).
 */
export const brownLawler = method({
  id: "brown-lawler-2003",
  revision: 1,
  family: dragFamily,
  title: "Drag coefficient of a sphere (Brown and Lawler)",
  tex: String.raw`\frac{24}{\mathrm{Re}}\left(1+0.150\,\mathrm{Re}^{0.681}\right)+\frac{0.407}{1+8710/\mathrm{Re}}`,
  source: { cite: "brown2003", where: "equation 19, wall-corrected data" },
  inputs: { Re: { ...sphereReynolds, range: [0, 2e5] } },
  output: sphereDrag,
  compute: ({ Re }) => (24 / Re) * (1 + 0.15 * Re ** 0.681) + 0.407 / (1 + 8710 / Re),
  direction: {
    safeFor: "whether a sphere falls, above Re 2e5: its drag is not below the true one",
    unsafeFor: "how hard a sphere strikes, above Re 2e5: it may fall twice as fast",
  },
  checks: [
    {
      from: { cite: "lapple1940", where: "standard drag curve" },
      basis: "from memory",
      rows: [
        { given: { Re: 10 }, printed: "4.1", within: 0.045, because: "read from the curve" },
        { given: { Re: 100 }, printed: "1.07", within: 0.045, because: "read from the curve" },
        { given: { Re: 1000 }, printed: "0.46", within: 0.045, because: "read from the curve" },
        { given: { Re: 1e4 }, printed: "0.405", within: 0.045, because: "read from the curve" },
        { given: { Re: 1e5 }, printed: "0.48", within: 0.045, because: "read from the curve" },
      ],
    },
    {
      from: { cite: "fluids", where: "drag.Clift_Gauvin, a fit to much the same data" },
      basis: "general reference library",
      rows: [
        {
          given: { Re: 0.1 },
          printed: "247.67",
          within: 0.002,
          because: "two fits to the same data",
        },
        {
          given: { Re: 1000 },
          printed: "0.46387",
          within: 0.003,
          because: "two fits to the same data",
        },
        {
          given: { Re: 1e4 },
          printed: "0.41032",
          within: 0.002,
          because: "two fits to the same data",
        },
        {
          given: { Re: 1e5 },
          printed: "0.46745",
          within: 0.004,
          because: "two fits to the same data",
        },
      ],
    },
    {
      from: { cite: "brown2003", where: "evaluated apart from this program" },
      basis: "from memory",
      rows: [
        { given: { Re: 0.1 }, printed: "247.50" },
        { given: { Re: 10 }, printed: "4.1275" },
        { given: { Re: 100 }, printed: "1.0731" },
        { given: { Re: 1000 }, printed: "0.46338" },
        { given: { Re: 1e4 }, printed: "0.41061" },
        { given: { Re: 1e5 }, printed: "0.46611" },
      ],
    },
  ],
});
