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
 * Pressure gradient of a fluid through a pack of spheres.
 *
 * Δp/L = (160 + 2.81 Re_m^0.904) (1−ε)²/ε³ · µu/d², Re_m = ρ|u|d/(µ(1−ε)); u superficial [m/s], d
 * grain diameter [m], ε voidage, ρ, µ of the fluid [kg/m³, Pa·s]; Pa/m. Fitted to glass spheres in
 * water for 2 < Re_m < 3582, 4 < D/d < 34 and 0.377 < ε < 0.470: not a law for high Re_m. D enters
 * the range only. Erdim, Akgiray and Demir (2015).
 */
export const erdim = method({
  id: "erdim-2015",
  revision: 1,
  family: bedFamily,
  title: "Pressure gradient through a packed bed of spheres (Erdim, Akgiray, Demir)",
  tex: String.raw`\left(160+2.81\,\mathrm{Re}_m^{0.904}\right)\frac{(1-\varepsilon)^2}{\varepsilon^3}\frac{\mu u}{d^2},\quad\mathrm{Re}_m=\frac{\rho\left|u\right|d}{\mu(1-\varepsilon)}`,
  source: { cite: "erdim2015", where: "recommended equation, as quoted by python3-fluids 1.0.22" },
  inputs: { ...bedInputs, eps: { ...bedInputs.eps, range: [0.377, 0.47] } },
  within: {
    Re_m: { of: packReynolds, range: [2, 3582], stated: true, note: packReynoldsNote },
    "D/d": { of: boreToGrain, range: [4, 34.1], stated: true, note: boreToGrainNote },
  },
  output: bedGradient,
  compute: (a) =>
    ((160 + 2.81 * packReynolds(a) ** 0.904) * a.mu * a.u * (1 - a.eps) ** 2) /
    (a.eps ** 3 * a.d ** 2),
  direction: {
    safeFor:
      "the flow that a pack lets through, for rough or angular grains: never more than it says",
    unsafeFor: "holding a pack of rough or angular grains down: their gradient is higher",
  },
  checks: [
    {
      from: { cite: "fluids", where: "packed_bed.Erdim_Akgiray_Demir" },
      basis: "general reference library",
      rows: [
        {
          given: { u: mps(1e-3), d: mm(0.8), eps: 0.4, rho: kgpm3(1000), mu: cP(1), D: m(0.1) },
          printed: "1438.28269588",
        },
        {
          given: { u: mps(0.05), d: mm(5), eps: 0.4, rho: kgpm3(1000), mu: cP(1), D: m(0.1) },
          printed: "9181.55533676",
        },
      ],
    },
  ],
});
