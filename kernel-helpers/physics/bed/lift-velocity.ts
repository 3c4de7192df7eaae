import { method, oneOf } from "../../method/index.js";
import { cP, kgpm3, m, micrometre, mm, mmps, mps, rad } from "../../units/index.js";
import { holdsGravity } from "../gravity.js";
import { refuseBuoyant } from "../refuse.js";
import { risingRoot } from "../rising-root.js";
import { liftInputs } from "./lift-inputs.js";
import { packLaws, type PackLaw } from "./pack-laws.js";
import { packWeightGradient } from "./pack-weight-gradient.js";

const names = Object.keys(packLaws) as PackLaw[];

interface Lift {
  readonly d: number;
  readonly eps: number;
  readonly rho: number;
  readonly rhoS: number;
  readonly mu: number;
  readonly D: number;
  readonly theta: number;
  readonly law: PackLaw;
}

function lift({ d, eps, rho, rhoS, mu, D, theta, law }: Lift): number {
  refuseBuoyant("lift-velocity", rhoS, rho);
  const weight = packWeightGradient.si({ eps, rho, rhoS, theta });
  if (weight === 0) return 0;
  const gradient = packLaws[law].si;
  const viscous = (150 * (1 - eps) ** 2 * mu) / (eps ** 3 * d ** 2);
  const inertial = (1.75 * (1 - eps) * rho) / (eps ** 3 * d);
  return risingRoot({
    f: (u) => gradient({ u, d, eps, rho, mu, D }),
    target: weight,
    guess: (2 * weight) / (viscous + Math.sqrt(viscous ** 2 + 4 * inertial * weight)),
    rise: 1.5,
    where: "lift-velocity",
  });
}

/** The ranges of the chosen law at the velocity found; a law that was not chosen gives NaN, which is in range. */
const rangesOfLaws = Object.fromEntries(
  names.flatMap((name) =>
    packLaws[name].rules.map((rule) => [
      `${rule.group} of ${name}`,
      {
        of: ({ d, eps, rho, rhoS, mu, D, theta, law }: Lift): number =>
          law === name
            ? rule.of({
                u: lift({ d, eps, rho, rhoS, mu, D, theta, law }),
                d,
                eps,
                rho,
                mu,
                D,
              } as never)
            : NaN,
        range: rule.range,
        stated: rule.stated,
      },
    ]),
  ),
);

/**
 * Superficial velocity at which upward flow carries the buoyant weight of a pack.
 *
 * Root u [m/s] of (Δp/L)(u) = (1−ε)(ρ_s−ρ) g cos θ with the chosen law of the pack's gradient: grain
 * d, bore D [m], voidage ε, densities ρ, ρ_s [kg/m³], viscosity µ [Pa·s], θ the angle of the hole
 * from vertical. Above it a cohesionless pack with a free top unravels from the top; wall friction
 * does not hold it. Error: that of the law and, more, of ε. Throws InputError for a solid lighter
 * than the fluid.
 */
export const liftVelocity = method({
  id: "lift-velocity",
  revision: 1,
  family: "lift velocity of a pack",
  title: "Superficial velocity that lifts a pack",
  tex: String.raw`u:\ \frac{\Delta p}{L}(u)=(1-\varepsilon)(\rho_s-\rho)\,g\cos\theta`,
  source: { cite: "derivation", where: "dynamic gradient equal to buoyant weight gradient" },
  inputs: {
    ...liftInputs,
    law: { kind: oneOf(...names), note: "law of the pack's pressure gradient" },
  },
  within: rangesOfLaws,
  output: { kind: "velocity", symbol: "u_l", note: "superficial velocity that lifts the pack" },
  compute: lift,
  uses: [packWeightGradient, ...names.map((n) => packLaws[n])],
  dimensional: holdsGravity,
  direction: {
    safeFor: "holding a pack down, where the chosen law's gradient is too high",
    unsafeFor: "holding a pack down, where the chosen law's gradient is too low",
  },
  cautions: [
    "A pack is lifted layer by layer: each layer's gradient is to be compared with its own weight, from the top down.",
  ],
  checks: [
    {
      from: { cite: "kunii1991", where: "ex. 3.2, sharp sand in air (full Ergun equation)" },
      basis: "published worked example",
      rows: [
        {
          given: {
            d: micrometre(160 * 0.67),
            eps: 0.55,
            rho: kgpm3(1.2),
            rhoS: kgpm3(2600),
            mu: cP(0.018),
            D: m(1),
            theta: rad(0),
            law: "ergun-1952",
          },
          printed: "0.0401",
          within: 0.01,
          because: "the book drops the inertial term and takes g = 9.80",
        },
      ],
    },
    {
      from: { cite: "geankoplis1993", where: "ex. 3.1-6, fluidised solids in air" },
      basis: "published worked example",
      rows: [
        {
          given: {
            d: micrometre(120 * 0.88),
            eps: 0.42,
            rho: kgpm3(2.374),
            rhoS: kgpm3(1000),
            mu: cP(0.0185),
            D: m(0.6),
            theta: rad(0),
            law: "ergun-1952",
          },
          printed: "0.005015",
          within: 2e-3,
          because: "the book rounds the root's coefficients",
        },
      ],
    },
    {
      from: { cite: "coulson2002", where: "ex. 6.1, 3 mm grains" },
      basis: "published worked example",
      rows: [
        {
          given: {
            d: mm(3),
            eps: 0.4,
            rho: kgpm3(1100),
            rhoS: kgpm3(4200),
            mu: cP(3),
            D: m(0.1),
            theta: rad(0),
            law: "ergun-1952",
          },
          in: mmps,
          printed: "36.4",
          within: 0.01,
          because: "the book uses a rounded form of the same equation and g = 9.81",
        },
      ],
    },
    {
      from: { cite: "derivation", where: "the law's gradient at the root is the weight gradient" },
      basis: "exact limit or identity",
      rows: [
        {
          given: {
            d: mm(1),
            eps: 0.5,
            rho: kgpm3(1),
            rhoS: kgpm3(1001),
            mu: cP(1000),
            D: m(1),
            theta: rad(0),
            law: "macdonald-1979",
          },
          in: mps,
          printed: "1.362035e-5",
          within: 1e-6,
          because: "creeping: u = g (ρs−ρ) ε³ d²/(180 µ(1−ε))",
        },
      ],
    },
  ],
});
