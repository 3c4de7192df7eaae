import { method } from "../../method/index.js";
import { m } from "../../units/index.js";
import { bedVoidage, fittingRatio, sphereBedFamily, sphereBedInputs } from "./voidage-inputs.js";

/**
 * Mean voidage of equal spheres poured into a bore.
 *
 * λ = d/D: ε = 0.4 + 0.05λ + 0.412λ² to λ = 0.5; 0.528 + 2.464(λ−0.5) to 0.536;
 * 1 − 0.667λ³/√(2λ−1) above (a zigzag of single spheres, exact but for the rounded 2/3). d, D [m].
 * Loose random packing, ±0.02; shaking lowers it by about 0.02-0.04. The maximum, 0.68, is near
 * λ = 0.6. Throws InputError for d > D. Dixon (1988).
 */
export const dixonSpheres = method({
  id: "dixon-spheres-1988",
  revision: 1,
  family: sphereBedFamily,
  title: "Voidage of a bed of spheres (Dixon)",
  tex: String.raw`\begin{cases}0.4+0.05\lambda+0.412\lambda^2&\lambda\le0.5\\0.528+2.464(\lambda-0.5)&\lambda\le0.536\\1-0.667\,\lambda^3(2\lambda-1)^{-0.5}&\lambda>0.536\end{cases}\quad\lambda=\frac dD`,
  source: { cite: "dixon1988", where: "correlations for spheres" },
  inputs: sphereBedInputs,
  output: bedVoidage,
  compute: (a) => {
    const k = fittingRatio("dixon-spheres-1988", a);
    if (k <= 0.5) return 0.4 + 0.05 * k + 0.412 * k ** 2;
    if (k <= 0.536) return 0.528 + 2.464 * (k - 0.5);
    return 1 - 0.667 * k ** 3 * (2 * k - 1) ** -0.5;
  },
  checks: [
    {
      from: { cite: "fluids", where: "packed_bed.voidage_Benyahia_Oneil_spherical" },
      basis: "general reference library",
      rows: [
        {
          given: { d: m(0.02), D: m(0.1) },
          printed: "0.43615",
          within: 0.03,
          because: "two fits to different beds",
        },
        {
          given: { d: m(0.02), D: m(0.05) },
          printed: "0.52127",
          within: 0.07,
          because: "two fits to different beds",
        },
      ],
    },
    {
      from: { cite: "derivation", where: "one sphere of the bore's diameter upon another: 1/3" },
      basis: "exact limit or identity",
      rows: [
        {
          given: { d: m(1), D: m(1) },
          printed: "0.3333",
          within: 1.2e-3,
          because: "the source rounds 2/3 to 0.667",
        },
        {
          given: { d: m(0.8), D: m(1) },
          printed: "0.55934",
          within: 5e-4,
          because: "exact zigzag 1 − (2/3)λ³/√(2λ−1); the source rounds 2/3 to 0.667",
        },
      ],
    },
    {
      from: { cite: "dixon1988", where: "equation evaluated apart from this program" },
      basis: "from memory",
      rows: [
        { given: { d: m(0.1), D: m(1) }, printed: "0.40912" },
        { given: { d: m(0.52), D: m(1) }, printed: "0.57728" },
      ],
    },
    {
      from: {
        cite: "dixon1988",
        where: "just above each limit, evaluated apart from this program",
      },
      basis: "from memory",
      rows: [
        { given: { d: m(0.503), D: m(1) }, printed: "0.53539" },
        { given: { d: m(0.538), D: m(1) }, printed: "0.62324" },
      ],
    },
  ],
});
