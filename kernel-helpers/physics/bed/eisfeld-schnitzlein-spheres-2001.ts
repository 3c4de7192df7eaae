import { method } from "../../method/index.js";
import { cP, kgpm3, m, mps } from "../../units/index.js";
import { bedFamily, bedGradient, bedInputs } from "./bed-inputs.js";
import { eisfeldGradient, eisfeldRanges, eisfeldTex } from "./eisfeld-schnitzlein.js";

const coefficients = { K1: 154, k1: 1.15, k2: 0.87 };

/**
 * Pressure gradient of a fluid through a pack of spheres, with the effect of the wall of the bore.
 *
 * Δp/L = 154 A² (1−ε)²/ε³ · µu/d² + (A/B) (1−ε)/ε³ · ρu|u|/d, A = 1 + 2/(3(D/d)(1−ε)),
 * B = [1.15 (d/D)² + 0.87]²; u superficial [m/s], d grain diameter, D bore [m], ε voidage, ρ, µ of the
 * fluid [kg/m³, Pa·s]; Pa/m. Stated for 0.01 ≤ ρud/µ ≤ 17 635, 1.624 ≤ D/d ≤ 250, 0.33 < ε < 0.882.
 * Eisfeld and Schnitzlein (2001), fit to the data for spheres.
 */
export const eisfeldSpheres = method({
  id: "eisfeld-schnitzlein-spheres-2001",
  revision: 1,
  family: bedFamily,
  title:
    "Pressure gradient through a packed bed with wall effect (Eisfeld and Schnitzlein, spheres)",
  tex: eisfeldTex(154, 1.15, 0.87),
  source: { cite: "eisfeld2001", where: "equation of Reichelt's form, fitted coefficients" },
  inputs: { ...bedInputs, eps: { ...bedInputs.eps, range: [0.33, 0.882] } },
  within: eisfeldRanges,
  output: bedGradient,
  compute: (a) => eisfeldGradient(a, coefficients),
  checks: [
    {
      from: { cite: "eisfeld2001", where: "wide bore, creeping: 154 µu(1−ε)²/(ε³d²)" },
      basis: "exact limit or identity",
      rows: [
        {
          given: { u: mps(1e-6), d: m(1e-3), eps: 0.5, rho: kgpm3(1), mu: cP(1000), D: m(1e6) },
          printed: "308.0",
          within: 1e-6,
          because: "no wall term at D/d = 1e9, no inertia at Re = 1e-9",
        },
      ],
    },
    {
      from: { cite: "eisfeld2001", where: "wide bore, fast: (1/0.87²) ρu²(1−ε)/(ε³d)" },
      basis: "exact limit or identity",
      rows: [
        {
          given: { u: mps(1), d: m(1e-3), eps: 0.5, rho: kgpm3(1000), mu: cP(1e-6), D: m(1e6) },
          printed: "5284714",
          within: 1e-6,
          because: "no wall term at D/d = 1e9; the viscous part is below 1e-6 of the inertial",
        },
      ],
    },
    {
      from: { cite: "eisfeld2001", where: "creeping in a narrow bore: D/d = 2, ε = 2/3, so A = 2" },
      basis: "exact limit or identity",
      rows: [
        {
          given: { u: mps(1e-6), d: m(1e-3), eps: 2 / 3, rho: kgpm3(1), mu: cP(1000), D: m(2e-3) },
          printed: "231.00000000000003",
          within: 1e-6,
          because: "four times the gradient without a wall",
        },
      ],
    },
    {
      from: { cite: "eisfeld2001", where: "equation evaluated apart from this program" },
      basis: "from memory",
      rows: [
        {
          given: { u: mps(0.05), d: m(5e-3), eps: 0.4, rho: kgpm3(1000), mu: cP(1), D: m(0.1) },
          printed: "8424.44",
        },
      ],
    },
  ],
});
