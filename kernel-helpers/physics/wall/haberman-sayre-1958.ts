import { method } from "../../method/index.js";
import { m } from "../../units/index.js";
import { refuseTooWide } from "../refuse.js";
import { lambda, lambdaNote, wallFactor, wallFamily, wallInputs } from "./wall-inputs.js";

/**
 * Wall factor of a sphere creeping along the axis of a bore, fluid at rest.
 *
 * f = (1 − 2.1050λ + 2.0865λ³ − 1.7068λ⁵ + 0.72603λ⁶)/(1 − 0.75857λ⁵), λ = d/D; d sphere, D bore [m]. It
 * is 1/K, K the drag over Stokes drag, which is the factor on velocity in creeping flow only:
 * Re = ρvd/µ below about 0.3 enters the range. Stated to λ = 0.8; against the exact table the drag is
 * 2 % low at 0.5, 5 % at 0.6, a third at 0.8. A sphere held in moving fluid needs another numerator.
 * Throws InputError for d ≥ D. Haberman and Sayre (1958).
 */
export const habermanSayre = method({
  id: "haberman-sayre-1958",
  revision: 1,
  family: wallFamily,
  title: "Wall factor of a creeping sphere (Haberman and Sayre)",
  tex: String.raw`\frac{1-2.1050\lambda+2.0865\lambda^3-1.7068\lambda^5+0.72603\lambda^6}{1-0.75857\lambda^5},\quad\lambda=\frac dD`,
  source: { cite: "haberman1958", where: "approximate solution, moving sphere, as quoted" },
  inputs: { ...wallInputs, Re: { ...wallInputs.Re, range: [0, 0.3], stated: false } },
  within: { lambda: { of: lambda, range: [0, 0.6], stated: false, note: lambdaNote } },
  output: wallFactor,
  compute: ({ d, D }) => {
    refuseTooWide("haberman-sayre-1958", d, D);
    const k = d / D;
    return (
      (1 - 2.105 * k + 2.0865 * k ** 3 - 1.7068 * k ** 5 + 0.72603 * k ** 6) /
      (1 - 0.75857 * k ** 5)
    );
  },
  direction: {
    safeFor: "how fast a sphere falls at most, above λ 0.5: the velocity is too high",
    unsafeFor: "whether a sphere falls, above λ 0.5: the velocity is too high",
  },
  checks: [
    {
      from: { cite: "happel1965", where: "table of exact creeping drag factors 1/f" },
      basis: "published table",
      rows: [
        {
          given: { d: m(0.1), D: m(1), Re: 0 },
          printed: "0.7918",
          within: 1e-3,
          because: "1/1.263; the formula is an approximation",
        },
        {
          given: { d: m(0.2), D: m(1), Re: 0 },
          printed: "0.5952",
          within: 1e-3,
          because: "1/1.680; the formula is an approximation",
        },
        {
          given: { d: m(0.3), D: m(1), Re: 0 },
          printed: "0.4218",
          within: 1e-3,
          because: "1/2.371; the formula is an approximation",
        },
        {
          given: { d: m(0.5), D: m(1), Re: 0 },
          printed: "0.1675",
          within: 0.02,
          because: "1/5.970; the formula is 1.7 % off here",
        },
      ],
    },
    {
      from: { cite: "haberman1958", where: "formula evaluated apart: K at 0.5, 0.8" },
      basis: "from memory",
      rows: [
        {
          given: { d: m(0.5), D: m(1), Re: 0 },
          printed: "0.17036",
          within: 1e-4,
          because: "1/5.8700",
        },
        {
          given: { d: m(0.8), D: m(1), Re: 0 },
          printed: "0.02040",
          within: 2e-4,
          because: "1/49.02",
        },
      ],
    },
  ],
});
