import { method } from "../../method/index.js";
import { m } from "../../units/index.js";
import { refuseTooWide } from "../refuse.js";
import {
  exponentFamily,
  exponentInputs,
  exponentOutput,
  grainToBore,
} from "./hindered-exponent.js";

/**
 * Exponent of hindered settling from the Archimedes number, with the wall.
 *
 * (4.8 − n)/(n − 2.4) = 0.043 Ar^0.57 [1 − 1.24 (d/D)^0.27]; d grain, D bore [m]; Re takes no part. The
 * bracket is held at 0 (n = 4.8) above d/D = 0.45, where it would be negative. Some textbooks print
 * 2.4 in place of 1.24, which is negative already at d/D = 0.04. 0.01 < Ar < 1e9, d/D to 0.1-0.2.
 * Throws InputError for d ≥ D. Khan and Richardson (1989).
 */
export const khanRichardson = method({
  id: "khan-richardson-1989",
  revision: 1,
  family: exponentFamily,
  title: "Exponent of hindered settling (Khan and Richardson)",
  tex: String.raw`n:\ \frac{4.8-n}{n-2.4}=0.043\,\mathrm{Ar}^{0.57}\max\left(0,\,1-1.24\left(\frac dD\right)^{0.27}\right)`,
  source: { cite: "khan1989", where: "equation for n in terms of Ga and d/D" },
  inputs: exponentInputs,
  within: { "d/D": grainToBore },
  output: exponentOutput,
  compute: ({ Ar, d, D }) => {
    refuseTooWide("khan-richardson-1989", d, D);
    const x = 0.043 * Ar ** 0.57 * Math.max(0, 1 - 1.24 * (d / D) ** 0.27);
    // (4.8 + 2.4x)/(1 + x) without the quotient of two large numbers
    return 2.4 + 2.4 / (1 + x);
  },
  checks: [
    {
      from: { cite: "coulson2002", where: "ex. 6.3, glass 4 mm in water: Ga 9.42e5, n = 2.42" },
      basis: "published worked example",
      rows: [{ given: { Re: 1798.9, Ar: 9.42e5, d: m(1e-12), D: m(1) }, printed: "2.42" }],
    },
    {
      from: { cite: "khan1989", where: "limits 4.8 and 2.4; hold at 4.8 in a narrow bore" },
      basis: "exact limit or identity",
      rows: [
        { given: { Re: 0, Ar: 0, d: m(0.1), D: m(1) }, printed: "4.80" },
        { given: { Re: 1e6, Ar: 1e30, d: m(0.1), D: m(1) }, printed: "2.40" },
        { given: { Re: 1e3, Ar: 1e6, d: m(0.5), D: m(1) }, printed: "4.80" },
      ],
    },
    {
      from: { cite: "khan1989", where: "equation evaluated apart from this program" },
      basis: "from memory",
      rows: [
        {
          given: { Re: 116, Ar: 1e4, d: m(0.1), D: m(1) },
          printed: "3.0422",
        },
        { given: { Re: 4, Ar: 100, d: m(0.1), D: m(1) }, printed: "4.4028" },
      ],
    },
  ],
});
