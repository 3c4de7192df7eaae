import { method } from "../../method/index.js";
import { cP, ftps, inch, kgpm3, m, mm, mps, psipft } from "../../units/index.js";
import {
  bedFamily,
  bedGradient,
  bedInputs,
  boreToGrain,
  boreToGrainNote,
  packReynolds,
  packReynoldsNote,
} from "./bed-inputs.js";

/**
 * Pressure gradient of a fluid through a pack of grains.
 *
 * Δp/L = 150 (1−ε)²/ε³ · µu/d² + 1.75 (1−ε)/ε³ · ρu|u|/d, with u the superficial velocity [m/s],
 * d the surface-volume grain diameter [m], ε the voidage, ρ and µ density and viscosity of the
 * fluid [kg/m³, Pa·s]; Δp/L in Pa/m. Fitted for 1 < Re_m < 2300, Re_m = ρud/(µ(1−ε)), and bores of
 * more than 10 grain diameters; D enters that range only. Far above it about twice too high for
 * smooth spheres, near for rough and angular grains. Ergun (1952).
 */
export const ergun = method({
  id: "ergun-1952",
  revision: 1,
  family: bedFamily,
  title: "Pressure gradient through a packed bed (Ergun)",
  tex: String.raw`150\,\frac{(1-\varepsilon)^2}{\varepsilon^3}\frac{\mu u}{d^2}+1.75\,\frac{1-\varepsilon}{\varepsilon^3}\frac{\rho u\left|u\right|}{d}`,
  source: { cite: "ergun1952", where: "final equation for the pressure drop" },
  inputs: bedInputs,
  within: {
    Re_m: { of: packReynolds, range: [1, 2300], stated: true, note: packReynoldsNote },
    "D/d": { of: boreToGrain, range: [10, Infinity], stated: true, note: boreToGrainNote },
  },
  output: bedGradient,
  compute: ({ u, d, eps, rho, mu }) =>
    (150 * (1 - eps) ** 2 * mu * u) / (eps ** 3 * d ** 2) +
    (1.75 * (1 - eps) * rho * u * Math.abs(u)) / (eps ** 3 * d),
  direction: {
    safeFor: "holding a pack of smooth spheres down above Re_m 700: its gradient is too high",
    unsafeFor: "the flow that a pack of smooth spheres lets through above Re_m 700: too low",
  },
  checks: [
    {
      from: { cite: "fluids", where: "packed_bed.Ergun, docstring example" },
      basis: "general reference library",
      rows: [
        {
          given: { u: mps(1e-3), d: mm(0.8), eps: 0.4, rho: kgpm3(1000), mu: cP(1), D: m(0.1) },
          printed: "1338.8671875",
        },
      ],
    },
    {
      from: { cite: "denevers2005", where: "ex. 11.1, water drained at 1.25 ft of head per foot" },
      basis: "published worked example",
      rows: [
        {
          given: {
            u: ftps(0.012422),
            d: inch(0.03),
            eps: 0.33,
            rho: kgpm3(998.2),
            mu: cP(1.002),
            D: m(0.1),
          },
          printed: "12236",
          within: 0.055,
          because:
            "1.25 ft/ft of head at 998.2 kg/m3; the book keeps the viscous term, 95 % of the whole",
        },
      ],
    },
    {
      from: { cite: "denevers2005", where: "ex. 11.2, water through the same bed at 2 ft/s" },
      basis: "published worked example",
      rows: [
        {
          given: {
            u: ftps(2),
            d: inch(0.03),
            eps: 0.33,
            rho: kgpm3(998.2),
            mu: cP(1.002),
            D: m(0.1),
          },
          in: psipft,
          printed: "701",
          within: 0.13,
          because: "the book keeps the inertial term only, which is 89 % of the whole here",
        },
      ],
    },
  ],
});
