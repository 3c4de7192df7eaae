import { method } from "../../method/index.js";
import { m } from "../../units/index.js";
import { refuseTooWide } from "../refuse.js";
import { lambda, lambdaNote, wallFactor, wallFamily, wallInputs } from "./wall-inputs.js";

/**
 * Wall factor of a sphere falling in a bore at high Reynolds number.
 *
 * f = 1 − λ^1.5, λ = d/D; d sphere, D bore [m]; f on the terminal velocity without wall. Stated for
 * 1e3 < Re = ρvd/µ < 1e4 and 0.1 < λ < 0.8; spheres ride off the axis there and scatter by some 5 %.
 * With v ∝ √d a falling sphere is fastest at λ = 0.25^(2/3) = 0.40. Throws InputError for d ≥ D.
 * Munroe (1888).
 */
export const munroe = method({
  id: "munroe-1888",
  revision: 1,
  family: wallFamily,
  title: "Wall factor of a sphere at high Reynolds number (Munroe)",
  tex: String.raw`1-\lambda^{1.5},\quad\lambda=\frac dD`,
  source: { cite: "munroe1888", where: "as quoted by reviews of wall effects" },
  inputs: { ...wallInputs, Re: { ...wallInputs.Re, range: [1e3, 1e4] } },
  within: { lambda: { of: lambda, range: [0.1, 0.8], stated: true, note: lambdaNote } },
  output: wallFactor,
  compute: ({ d, D }) => {
    refuseTooWide("munroe-1888", d, D);
    return 1 - (d / D) ** 1.5;
  },
  checks: [
    {
      from: { cite: "newton1687", where: "(1−λ²)√(1−λ²/2) for free fall at high Reynolds number" },
      basis: "from memory",
      rows: [
        {
          given: { d: m(0.5), D: m(1), Re: 5000 },
          printed: "0.70156",
          within: 0.1,
          because: "Newton's estimate against a fit to measurements",
        },
        {
          given: { d: m(0.8), D: m(1), Re: 5000 },
          printed: "0.29686",
          within: 0.1,
          because: "Newton's estimate against a fit to measurements",
        },
      ],
    },
    {
      from: { cite: "munroe1888", where: "λ 1/4: 1 − 1/8" },
      basis: "exact limit or identity",
      rows: [{ given: { d: m(0.25), D: m(1), Re: 5000 }, printed: "0.875000" }],
    },
  ],
});
