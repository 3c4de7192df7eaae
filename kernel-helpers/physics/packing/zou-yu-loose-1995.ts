import { method } from "../../method/index.js";
import { m } from "../../units/index.js";
import { bedVoidage, fittingRatio, sphereBedFamily, sphereBedInputs } from "./voidage-inputs.js";

/**
 * Mean voidage of equal spheres poured into a bore (loose random packing).
 *
 * λ = d/D: ε = 0.4 + 0.01 (exp(10.686 λ) − 1) to λ = 0.256; 0.846 − 1.898λ + 2.725λ² to 0.538;
 * 1 − 0.667λ³/√(2λ−1) above (zigzag). d sphere, D bore [m]. The branches part by 0.007 and 0.010 where they meet. Throws
 * InputError for d > D. Zou and Yu (1995).
 */
export const zouYuLoose = method({
  id: "zou-yu-loose-1995",
  revision: 1,
  family: sphereBedFamily,
  title: "Voidage of a loose bed of spheres (Zou and Yu)",
  tex: String.raw`\begin{cases}0.4+0.01\left(e^{10.686\lambda}-1\right)&\lambda\le0.256\\0.846-1.898\lambda+2.725\lambda^2&\lambda\le0.538\\1-0.667\,\lambda^3(2\lambda-1)^{-0.5}&\lambda>0.538\end{cases}\quad\lambda=\frac dD`,
  source: { cite: "zou1995", where: "loose packing" },
  inputs: sphereBedInputs,
  output: bedVoidage,
  compute: (a) => {
    const k = fittingRatio("zou-yu-loose-1995", a);
    if (k <= 0.256) return 0.4 + 0.01 * (Math.exp(10.686 * k) - 1);
    if (k <= 0.538) return 0.846 - 1.898 * k + 2.725 * k ** 2;
    return 1 - 0.667 * k ** 3 * (2 * k - 1) ** -0.5;
  },
  checks: [
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
      from: { cite: "scott1960", where: "random loose packing of spheres, wide bore: 0.40" },
      basis: "from memory",
      rows: [
        {
          given: { d: m(1e-9), D: m(1) },
          printed: "0.40",
        },
      ],
    },
    {
      from: { cite: "zou1995", where: "equations evaluated apart from this program" },
      basis: "from memory",
      rows: [
        { given: { d: m(0.1), D: m(1) }, printed: "0.41911" },
        { given: { d: m(0.3), D: m(1) }, printed: "0.52185" },
        { given: { d: m(0.5), D: m(1) }, printed: "0.57825" },
      ],
    },
    {
      from: { cite: "zou1995", where: "just above each limit, evaluated apart from this program" },
      basis: "from memory",
      rows: [
        { given: { d: m(0.257), D: m(1) }, printed: "0.53820" },
        { given: { d: m(0.54), D: m(1) }, printed: "0.62867" },
      ],
    },
  ],
});
