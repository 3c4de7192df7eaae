import { method } from "../../method/index.js";
import { m } from "../../units/index.js";
import { refuseTooWide } from "../refuse.js";
import { lambda, lambdaNote, wallFactor, wallFamily, wallInputs } from "./wall-inputs.js";

/**
 * Wall factor of a sphere creeping along the axis of a bore.
 *
 * f = [(1−λ)/(1−0.475λ)]⁴, λ = d/D; d sphere, D bore [m]; f on the terminal velocity without wall, in
 * creeping flow (Re = ρvd/µ < 0.2 enters the range). Empirical, stated to λ = 0.97. Throws InputError
 * for d ≥ D. Francis (1933).
 */
export const francis = method({
  id: "francis-1933",
  revision: 1,
  family: wallFamily,
  title: "Wall factor of a creeping sphere (Francis)",
  tex: String.raw`\left(\frac{1-\lambda}{1-0.475\lambda}\right)^4,\quad\lambda=\frac dD`,
  source: { cite: "francis1933", where: "empirical equation" },
  inputs: { ...wallInputs, Re: { ...wallInputs.Re, range: [0, 0.2] } },
  within: { lambda: { of: lambda, range: [0, 0.97], stated: true, note: lambdaNote } },
  output: wallFactor,
  compute: ({ d, D }) => {
    refuseTooWide("francis-1933", d, D);
    return ((1 - d / D) / (1 - (0.475 * d) / D)) ** 4;
  },
  checks: [
    {
      from: { cite: "happel1965", where: "table of exact creeping drag factors 1/f" },
      basis: "published table",
      rows: [
        {
          given: { d: m(0.1), D: m(1), Re: 0 },
          printed: "0.7918",
          within: 0.01,
          because: "1/1.263; an empirical equation",
        },
        {
          given: { d: m(0.3), D: m(1), Re: 0 },
          printed: "0.4218",
          within: 0.06,
          because: "1/2.371; an empirical equation",
        },
        {
          given: { d: m(0.8), D: m(1), Re: 0 },
          printed: "0.013595",
          within: 0.25,
          because: "1/73.555; an empirical equation, a fifth off here",
        },
      ],
    },
    {
      from: { cite: "francis1933", where: "formula evaluated apart: 1/5.4085 at λ 0.5" },
      basis: "from memory",
      rows: [
        {
          given: { d: m(0.5), D: m(1), Re: 0 },
          printed: "0.18490",
          within: 1e-4,
          because: "1/5.4085",
        },
      ],
    },
  ],
});
