import { method } from "../../method/index.js";
import { cP, kgpm3, m, mm, mps } from "../../units/index.js";
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
 * Pressure gradient of a fluid through a pack of smooth grains.
 *
 * Δp/L = 180 (1−ε)²/ε³ · µu/d² + 1.8 (1−ε)/ε³ · ρu|u|/d; u superficial [m/s], d grain diameter [m],
 * ε voidage, ρ, µ of the fluid [kg/m³, Pa·s]; Pa/m. The constant 1.8 is for smooth grains; the source
 * gives up to 4.0 for the roughest. Stated for Re_m = ρ|u|d/(µ(1−ε)) < 1e4, 0.36 < ε < 0.92, within
 * ±50 %. No wall term: D enters the advised D/d > 10 only. Macdonald, El-Sayed, Mow, Dullien (1979).
 */
export const macdonald = method({
  id: "macdonald-1979",
  revision: 1,
  family: bedFamily,
  title: "Pressure gradient through a packed bed of smooth grains (Macdonald et al.)",
  tex: String.raw`180\,\frac{(1-\varepsilon)^2}{\varepsilon^3}\frac{\mu u}{d^2}+1.8\,\frac{1-\varepsilon}{\varepsilon^3}\frac{\rho u\left|u\right|}{d}`,
  source: { cite: "macdonald1979", where: "modified Ergun equation, smooth particles" },
  inputs: { ...bedInputs, eps: { ...bedInputs.eps, range: [0.36, 0.92] } },
  within: {
    Re_m: { of: packReynolds, range: [0, 1e4], stated: true, note: packReynoldsNote },
    "D/d": { of: boreToGrain, range: [10, Infinity], stated: false, note: boreToGrainNote },
  },
  output: bedGradient,
  compute: ({ u, d, eps, rho, mu }) =>
    (180 * (1 - eps) ** 2 * mu * u) / (eps ** 3 * d ** 2) +
    (1.8 * (1 - eps) * rho * u * Math.abs(u)) / (eps ** 3 * d),
  direction: {
    safeFor:
      "the flow that a pack lets through, for rough or angular grains: never more than it says",
    unsafeFor: "holding a pack of rough or angular grains down: their gradient is higher",
  },
  checks: [
    {
      from: { cite: "carman1937", where: "creeping limit 180 µu(1−ε)²/(ε³d²), k = 9.8765e-10 m²" },
      basis: "exact limit or identity",
      rows: [
        {
          given: { u: mps(1e-6), d: mm(1), eps: 0.4, rho: kgpm3(1), mu: cP(1000), D: m(0.1) },
          printed: "1012.5",
          within: 1e-6,
          because: "µu/k with k = d²ε³/(180(1−ε)²); inertia is below 1e-9 of it",
        },
      ],
    },
    {
      from: { cite: "carman1937", where: "inertial limit 1.8 ρu²(1−ε)/(ε³d)" },
      basis: "exact limit or identity",
      rows: [
        {
          given: { u: mps(1), d: mm(1), eps: 0.5, rho: kgpm3(1000), mu: cP(1e-6), D: m(0.1) },
          printed: "7200000",
          within: 1e-6,
          because: "1.8 · 1000 · 0.5/(0.125 · 1e-3); the viscous part is below 1e-6 of it",
        },
      ],
    },
  ],
});
