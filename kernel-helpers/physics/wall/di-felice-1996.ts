import { method } from "../../method/index.js";
import { m } from "../../units/index.js";
import { refuseTooWide } from "../refuse.js";
import { lambda, lambdaNote, wallFactor, wallFamily, wallInputs } from "./wall-inputs.js";

/**
 * Wall factor of a sphere falling along the axis of a bore, at any Reynolds number.
 *
 * f = [(1−λ)/(1−0.33λ)]^a, (3.3 − a)/(a − 0.85) = 0.1 Re, λ = d/D, Re = ρvd/µ at the terminal velocity
 * WITHOUT wall; f multiplies that velocity. d sphere, D bore [m]. Within about 10 % of the exact
 * creeping values to λ = 0.8 and of Munroe at high Re. In flow it applies to the slip velocity.
 * Throws InputError for d ≥ D. Di Felice (1996).
 */
export const diFelice = method({
  id: "di-felice-1996",
  revision: 1,
  family: wallFamily,
  title: "Wall factor of a sphere (Di Felice)",
  tex: String.raw`\left(\frac{1-\lambda}{1-0.33\lambda}\right)^{a},\quad\frac{3.3-a}{a-0.85}=0.1\,\mathrm{Re}_\infty,\quad\lambda=\frac dD`,
  source: { cite: "difelice1996", where: "equations for the exponent" },
  inputs: wallInputs,
  within: { lambda: { of: lambda, range: [0, 0.9], stated: false, note: lambdaNote } },
  output: wallFactor,
  compute: ({ d, D, Re }) => {
    refuseTooWide("di-felice-1996", d, D);
    const a = 0.85 + (3.3 - 0.85) / (1 + 0.1 * Re);
    return ((1 - d / D) / (1 - (0.33 * d) / D)) ** a;
  },
  checks: [
    {
      from: { cite: "happel1965", where: "table of exact creeping factors, sphere on the axis" },
      basis: "published table",
      rows: (
        [
          [0.1, "0.7918"],
          [0.2, "0.5952"],
          [0.3, "0.4218"],
          [0.4, "0.2781"],
          [0.5, "0.1675"],
        ] as const
      ).map(([k, printed]) => ({
        given: { d: m(k), D: m(1), Re: 0 },
        printed,
        within: 0.11,
        because: "an empirical fit; 1/1.263, 1/1.680, 1/2.371, 1/3.596, 1/5.970",
      })),
    },
    {
      from: { cite: "munroe1888", where: "1 − λ^1.5 at high Reynolds number" },
      basis: "from memory",
      rows: (
        [
          [0.1, "0.9684"],
          [0.3, "0.8357"],
          [0.5, "0.6464"],
        ] as const
      ).map(([k, printed]) => ({
        given: { d: m(k), D: m(1), Re: 1e6 },
        printed,
        within: 0.04,
        because: "two fits to different measurements",
      })),
    },
    {
      from: { cite: "difelice1996", where: "evaluated apart from this program" },
      basis: "from memory",
      rows: [
        { given: { d: m(0.5), D: m(1), Re: 0 }, printed: "0.18409" },
        { given: { d: m(0.5), D: m(1), Re: 10 }, printed: "0.34504" },
        { given: { d: m(0.5), D: m(1), Re: 100 }, printed: "0.57688" },
        { given: { d: m(0.5), D: m(1), Re: 1e5 }, printed: "0.64660" },
        { given: { d: m(0.8), D: m(1), Re: 0 }, printed: "0.01357" },
        { given: { d: m(0.8), D: m(1), Re: 100 }, printed: "0.24717" },
      ],
    },
  ],
});
