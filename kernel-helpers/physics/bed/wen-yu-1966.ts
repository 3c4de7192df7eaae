import { method } from "../../method/index.js";
import { cP, kgpm3, m, micrometre, mps, rad } from "../../units/index.js";
import { gravity, holdsGravity } from "../gravity.js";
import { refuseBuoyant } from "../refuse.js";
import { liftInputs } from "./lift-inputs.js";

/**
 * Superficial velocity of minimum fluidisation, without the voidage.
 *
 * ρud/µ = √(33.7² + 0.0408 Ar) − 33.7, Ar = d³ρ(ρ_s−ρ) g cos θ/µ²; u in m/s, d the volume-equivalent
 * grain diameter [m], densities ρ, ρ_s [kg/m³], µ [Pa·s]. The constants stand for (1−ε)/ε³ ≈ 11 (spheres
 * at ε 0.38, which counts for fine grains) and 1/ε³ ≈ 14 (ε 0.41, coarse grains); ε and D take no
 * part. cos θ is the weight along an
 * inclined hole (ours; the source is for vertical). Data 0.001 < Re < 4000, scatter about ±34 %.
 * Throws InputError for a solid lighter than the fluid. Wen and Yu (1966).
 */
export const wenYu = method({
  id: "wen-yu-1966",
  revision: 1,
  family: "lift velocity of a pack",
  title: "Velocity of minimum fluidisation (Wen and Yu)",
  tex: String.raw`\frac{\mu}{\rho d}\left(\sqrt{33.7^2+0.0408\,\mathrm{Ar}}-33.7\right),\quad\mathrm{Ar}=\frac{d^3\rho(\rho_s-\rho)g\cos\theta}{\mu^2}`,
  source: { cite: "wen1966", where: "as quoted by Kunii and Levenspiel (1991), ch. 3" },
  inputs: { ...liftInputs, eps: { ...liftInputs.eps, range: [0.36, 0.46], stated: false } },
  within: {
    Re: {
      of: (a) => reynoldsAtLift(a),
      range: [0.001, 4000],
      stated: true,
      note: "grain Reynolds number ρud/µ",
    },
  },
  output: {
    kind: "velocity",
    symbol: "u_{mf}",
    note: "superficial velocity of minimum fluidisation",
  },
  compute: ({ d, eps, rho, rhoS, mu, D, theta }) =>
    (reynoldsAtLift({ d, eps, rho, rhoS, mu, D, theta }) * mu) / (rho * d),
  dimensional: holdsGravity,
  checks: [
    {
      from: { cite: "geankoplis1993", where: "ex. 3.1-6, approximate equation" },
      basis: "published worked example",
      rows: [
        {
          given: {
            d: micrometre(120),
            eps: 0.42,
            rho: kgpm3(2.374),
            rhoS: kgpm3(1000),
            mu: cP(0.0185),
            D: m(0.6),
            theta: rad(0),
          },
          in: mps,
          printed: "0.004605",
          within: 2e-3,
          because: "the book rounds Ar and the root",
        },
      ],
    },
    {
      from: { cite: "derivation", where: "inertial limit √(0.0408 g d (ρs−ρ)/ρ)" },
      basis: "exact limit or identity",
      rows: [
        {
          given: {
            d: m(1),
            eps: 0.42,
            rho: kgpm3(1000),
            rhoS: kgpm3(2000),
            mu: cP(1),
            D: m(100),
            theta: rad(0),
          },
          in: mps,
          printed: "0.632543",
          within: 1e-4,
          because: "33.7 is small beside the root at an Archimedes number of 1e13",
        },
      ],
    },
  ],
});

interface Grains {
  readonly d: number;
  readonly eps: number;
  readonly rho: number;
  readonly rhoS: number;
  readonly mu: number;
  readonly D: number;
  readonly theta: number;
}
function reynoldsAtLift({ d, rho, rhoS, mu, theta }: Grains): number {
  refuseBuoyant("wen-yu-1966", rhoS, rho);
  const Ar = (d ** 3 * rho * (rhoS - rho) * gravity * Math.cos(theta)) / mu ** 2;
  // √(a²+b) − a as b/(√(a²+b) + a), which keeps its digits for fine grains
  return (0.0408 * Ar) / (Math.sqrt(33.7 ** 2 + 0.0408 * Ar) + 33.7);
}
