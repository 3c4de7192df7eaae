import { method, positive } from "../../method/index.js";
import { m } from "../../units/index.js";
import { bore } from "../fields.js";
import { bedVoidage, fittingRatio } from "./voidage-inputs.js";

/**
 * Mean voidage of equal full cylinders, about as long as wide, poured into a bore.
 *
 * λ = d_v/D with d_v the diameter of the sphere of equal volume: ε = 0.36 + 0.10λ + 0.7λ² to λ = 0.6;
 * 0.677 − 9(λ−0.625)² to 0.7; 1 − 0.763λ² above. d, D [m]; ±0.02. Throws InputError for d > D.
 * Dixon (1988).
 */
export const dixonCylinders = method({
  id: "dixon-cylinders-1988",
  revision: 1,
  family: "voidage of a bed of cylinders in a bore",
  title: "Voidage of a bed of full cylinders (Dixon)",
  tex: String.raw`\begin{cases}0.36+0.10\lambda+0.7\lambda^2&\lambda\le0.6\\0.677-9(\lambda-0.625)^2&\lambda\le0.7\\1-0.763\lambda^2&\lambda>0.7\end{cases}\quad\lambda=\frac{d_v}{D}`,
  source: { cite: "dixon1988", where: "correlations for full cylinders" },
  inputs: {
    d: {
      kind: "length",
      symbol: "d_v",
      note: "diameter of the sphere of equal volume",
      possible: positive,
    },
    D: bore,
  },
  output: bedVoidage,
  compute: (a) => {
    const k = fittingRatio("dixon-cylinders-1988", a);
    if (k <= 0.6) return 0.36 + 0.1 * k + 0.7 * k ** 2;
    if (k <= 0.7) return 0.677 - 9 * (k - 0.625) ** 2;
    return 1 - 0.763 * k ** 2;
  },
  checks: [
    {
      from: { cite: "derivation", where: "one stack of cylinders as long as wide: 1 − d²/D²" },
      basis: "exact limit or identity",
      rows: [
        {
          given: { d: m(0.9), D: m(1) },
          printed: "0.38186",
          within: 5e-4,
          because: "d = d_v/1.5^(1/3); the source rounds 1.5^(−2/3) to 0.763",
        },
      ],
    },
    {
      from: { cite: "fluids", where: "packed_bed.voidage_Benyahia_Oneil_cylindrical" },
      basis: "general reference library",
      rows: [
        {
          given: { d: m(0.01), D: m(0.1) },
          printed: "0.388125",
          within: 0.035,
          because: "two fits to different beds",
        },
      ],
    },
    {
      from: { cite: "dixon1988", where: "equation evaluated apart from this program" },
      basis: "from memory",
      rows: [
        { given: { d: m(0.1), D: m(1) }, printed: "0.37700" },
        { given: { d: m(0.3), D: m(1) }, printed: "0.45300" },
        { given: { d: m(0.5), D: m(1) }, printed: "0.58500" },
        { given: { d: m(0.65), D: m(1) }, printed: "0.671375" },
        {
          given: { d: m(0.7), D: m(1) },
          printed: "0.62638",
          within: 0.01,
          because: "join of two branches",
        },
      ],
    },
    {
      from: {
        cite: "dixon1988",
        where: "just above each limit, evaluated apart from this program",
      },
      basis: "from memory",
      rows: [
        { given: { d: m(0.603), D: m(1) }, printed: "0.67264" },
        { given: { d: m(0.703), D: m(1) }, printed: "0.62292" },
      ],
    },
  ],
});
