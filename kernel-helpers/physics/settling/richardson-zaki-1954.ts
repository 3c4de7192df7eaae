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
 * Exponent of hindered settling, by ranges of the Reynolds number.
 *
 * Re = ρv_td/µ of one grain: n = 4.65 + 19.5 d/D to 0.2; (4.35 + 17.5 d/D) Re^−0.03 to 1;
 * (4.45 + 18 d/D) Re^−0.1 to 200; 4.45 Re^−0.1 to 500; 2.39 above. d grain, D bore [m]; Ar takes no
 * part. Steps of a few percent at every limit but more between 1 and 200 in narrow bores. Data to
 * d/D about 0.1-0.2. Throws InputError for d ≥ D. Richardson and Zaki (1954).
 */
export const richardsonZaki = method({
  id: "richardson-zaki-1954",
  revision: 1,
  family: exponentFamily,
  title: "Exponent of hindered settling (Richardson and Zaki)",
  tex: String.raw`\begin{cases}4.65+19.5\,d/D&\mathrm{Re}<0.2\\(4.35+17.5\,d/D)\,\mathrm{Re}^{-0.03}&<1\\(4.45+18\,d/D)\,\mathrm{Re}^{-0.1}&<200\\4.45\,\mathrm{Re}^{-0.1}&<500\\2.39&\mathrm{Re}\ge500\end{cases}`,
  source: { cite: "richardson1954", where: "part I, equations for n" },
  inputs: exponentInputs,
  within: { "d/D": grainToBore },
  output: exponentOutput,
  compute: ({ Re, d, D }) => {
    refuseTooWide("richardson-zaki-1954", d, D);
    const k = d / D;
    if (Re < 0.2) return 4.65 + 19.5 * k;
    if (Re < 1) return (4.35 + 17.5 * k) * Re ** -0.03;
    if (Re < 200) return (4.45 + 18 * k) * Re ** -0.1;
    if (Re < 500) return 4.45 * Re ** -0.1;
    return 2.39;
  },
  checks: [
    {
      from: { cite: "coulson2002", where: "ex. 6.3, glass 4 mm in water: n = 2.42" },
      basis: "published worked example",
      rows: [
        {
          given: { Re: 1800, Ar: 9.42e5, d: m(4e-3), D: m(1) },
          printed: "2.42",
          within: 0.02,
          because: "the book takes n from Khan and Richardson's equation",
        },
      ],
    },
    {
      from: { cite: "richardson1954", where: "creeping limit, wide bore 4.65; d/D 0.1: 6.6" },
      basis: "from memory",
      rows: [
        { given: { Re: 0.01, Ar: 0.18, d: m(1e-9), D: m(1) }, printed: "4.65" },
        { given: { Re: 0.01, Ar: 0.18, d: m(0.1), D: m(1) }, printed: "6.60" },
        { given: { Re: 10, Ar: 400, d: m(1e-9), D: m(1) }, printed: "3.5348" },
        { given: { Re: 10, Ar: 400, d: m(0.1), D: m(1) }, printed: "4.9646" },
        { given: { Re: 0.5, Ar: 9.4, d: m(1e-9), D: m(1) }, printed: "4.4414" },
        { given: { Re: 0.5, Ar: 9.4, d: m(0.1), D: m(1) }, printed: "6.2282" },
        { given: { Re: 300, Ar: 4e4, d: m(1e-9), D: m(1) }, printed: "2.5156" },
      ],
    },
    {
      from: {
        cite: "richardson1954",
        where: "just above each limit, evaluated apart from this program",
      },
      basis: "from memory",
      rows: [
        { given: { Re: 0.201, Ar: 100, d: m(1e-9), D: m(1) }, printed: "4.5645" },
        { given: { Re: 1.005, Ar: 100, d: m(1e-9), D: m(1) }, printed: "4.4478" },
        { given: { Re: 201, Ar: 100, d: m(0.1), D: m(1) }, printed: "2.6184" },
        { given: { Re: 502, Ar: 100, d: m(1e-9), D: m(1) }, printed: "2.3900" },
      ],
    },
  ],
});
