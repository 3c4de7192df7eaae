import { method } from "../../method/index.js";
import { m } from "../../units/index.js";
import { bedVoidage, fittingRatio, sphereBedFamily, sphereBedInputs } from "./voidage-inputs.js";

/**
 * Mean voidage of equal spheres poured into a bore.
 *
 * ε = 0.390 + 1.740/(D/d + 1.140)²; d sphere, D bore [m]. Stated for 1.5 < D/d < 50, mean error 1.5 %;
 * below D/d 1.9 it misses the maximum of the zigzag. Throws InputError for d > D. Benyahia and
 * O'Neill (2005).
 */
export const benyahiaOneill = method({
  id: "benyahia-oneill-2005",
  revision: 1,
  family: sphereBedFamily,
  title: "Voidage of a bed of spheres (Benyahia and O'Neill)",
  tex: String.raw`0.390+\frac{1.740}{\left(D/d+1.140\right)^2}`,
  source: { cite: "benyahia2005", where: "spheres, as quoted by python3-fluids 1.0.22" },
  inputs: sphereBedInputs,
  within: {
    "D/d": {
      of: ({ d, D }) => D / d,
      range: [1.5, 50],
      stated: true,
      note: "bore to grain diameter",
    },
  },
  output: bedVoidage,
  compute: (a) => 0.39 + 1.74 / (1 / fittingRatio("benyahia-oneill-2005", a) + 1.14) ** 2,
  checks: [
    {
      from: { cite: "fluids", where: "packed_bed.voidage_Benyahia_Oneil_spherical" },
      basis: "general reference library",
      rows: [
        { given: { d: m(0.02), D: m(0.1) }, printed: "0.436154335855" },
        { given: { d: m(0.001), D: m(0.05) }, printed: "0.390665315744" },
      ],
    },
  ],
});
