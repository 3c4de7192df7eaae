import { method } from "../../method/index.js";
import { dragFamily, sphereDrag, sphereReynolds } from "./sphere-drag.js";

/**
 * Drag coefficient of a smooth sphere through the drag crisis.
 *
 * Cd = 24/Re + 2.6(Re/5)/(1+(Re/5)^1.52) + 0.411 x^−7.94/(1+x^−8) + Re^0.80/461 000, x = Re/263 000, for
 * Re < 1e6; Re = ρvd/µ on the slip velocity, Cd on πd²/4. 9 % low at Re = 1, so advised from 10 up.
 * Turbulence, roughness or a wall bring the crisis to lower Re. Morrison (2013).
 */
export const morrison = method({
  id: "morrison-2013",
  revision: 1,
  family: dragFamily,
  title: "Drag coefficient of a sphere (Morrison)",
  tex: String.raw`\frac{24}{\mathrm{Re}}+\frac{2.6\,\mathrm{Re}/5}{1+(\mathrm{Re}/5)^{1.52}}+\frac{0.411\,(\mathrm{Re}/263000)^{-7.94}}{1+(\mathrm{Re}/263000)^{-8}}+\frac{\mathrm{Re}^{0.80}}{461000}`,
  source: { cite: "morrison2013", where: "as quoted by python3-fluids 1.0.22" },
  inputs: { Re: { ...sphereReynolds, range: [10, 1e6] } },
  output: sphereDrag,
  compute: ({ Re }) => {
    const x = Re / 263_000;
    // x^−7.94/(1 + x^−8) with both sides times x^8, which does not overflow as Re → 0
    return (
      24 / Re +
      (2.6 * (Re / 5)) / (1 + (Re / 5) ** 1.52) +
      (0.411 * x ** (8 - 7.94)) / (x ** 8 + 1) +
      Re ** 0.8 / 461_000
    );
  },
  direction: {
    safeFor: "how hard a sphere strikes: it counts on the drag crisis",
    unsafeFor: "whether a sphere falls, above Re 2e5: it counts on the drag crisis",
  },
  checks: [
    {
      from: { cite: "fluids", where: "drag.Morrison" },
      basis: "general reference library",
      rows: [
        { given: { Re: 100 }, printed: "1.03818663879" },
        { given: { Re: 3e5 }, printed: "0.167982708291" },
        { given: { Re: 200 }, printed: "0.767731559965325" },
      ],
    },
    {
      from: { cite: "lapple1940", where: "standard drag curve" },
      basis: "from memory",
      rows: [
        { given: { Re: 10 }, printed: "4.1", within: 0.12, because: "read from the curve" },
        { given: { Re: 100 }, printed: "1.07", within: 0.12, because: "read from the curve" },
        { given: { Re: 1000 }, printed: "0.46", within: 0.12, because: "read from the curve" },
        { given: { Re: 1e4 }, printed: "0.405", within: 0.12, because: "read from the curve" },
        { given: { Re: 1e5 }, printed: "0.48", within: 0.12, because: "read from the curve" },
      ],
    },
  ],
});
