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
 * Exponent of hindered settling, one smooth equation.
 *
 * n = 2.35 (2 + 0.175 Re^0.75)/(1 + 0.175 Re^0.75), Re = ρv_td/µ of one grain. Wide bore: d and D enter
 * the advised range only, Ar takes no part. 1e-3 < Re < 3e4; solids 4 to 55 %. Rowe (1987), a curve
 * through Richardson and Zaki's limits, within 4 % of them. Throws InputError for d ≥ D.
 */
export const rowe = method({
  id: "rowe-1987",
  revision: 1,
  family: exponentFamily,
  title: "Exponent of hindered settling (Rowe)",
  tex: String.raw`2.35\,\frac{2+0.175\,\mathrm{Re}^{0.75}}{1+0.175\,\mathrm{Re}^{0.75}}`,
  source: { cite: "rowe1987", where: "as quoted by sediment-transport codes" },
  inputs: { ...exponentInputs, Re: { ...exponentInputs.Re, range: [1e-3, 3e4] } },
  within: { "d/D": grainToBore },
  output: exponentOutput,
  compute: ({ Re, d, D }) => {
    refuseTooWide("rowe-1987", d, D);
    return (2.35 * (2 + 0.175 * Re ** 0.75)) / (1 + 0.175 * Re ** 0.75);
  },
  checks: [
    {
      from: { cite: "rowe1987", where: "limits 4.7 and 2.35" },
      basis: "exact limit or identity",
      rows: [
        { given: { Re: 0, Ar: 0, d: m(1e-9), D: m(1) }, printed: "4.70" },
        {
          given: { Re: 1e12, Ar: 4e23, d: m(1e-9), D: m(1) },
          printed: "2.35",
        },
      ],
    },
    {
      from: { cite: "rowe1987", where: "the form (4.7 + 0.41 Re^0.75)/(1 + 0.175 Re^0.75)" },
      basis: "from memory",
      rows: [
        {
          given: { Re: 10, Ar: 400, d: m(1e-9), D: m(1) },
          printed: "3.5309",
          within: 1e-3,
          because: "0.41 is 2.35 · 0.175 rounded",
        },
      ],
    },
    {
      from: { cite: "richardson1954", where: "4.45 Re^−0.1 at 100" },
      basis: "from memory",
      rows: [
        {
          given: { Re: 100, Ar: 8000, d: m(1e-9), D: m(1) },
          printed: "2.8078",
          within: 0.04,
          because: "a smooth curve through the same data",
        },
      ],
    },
  ],
});
