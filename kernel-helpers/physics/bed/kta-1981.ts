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
 * Pressure gradient of a fluid through a bed of smooth spheres (safety standard for pebble beds).
 *
 * Δp/L = (160 + 3 Re_m^0.9) (1−ε)²/ε³ · µu/d², Re_m = ρ|u|d/(µ(1−ε)); u superficial [m/s], d grain
 * diameter [m], ε voidage, ρ, µ of the fluid [kg/m³, Pa·s]; Pa/m. Stated for 1 < Re_m < 1e5 and
 * 0.36 < ε < 0.42; D enters the advised D/d > 5 only (the standard's own limit depends on Re_m).
 * KTA 3102.3 (1981). No law of the family reaches higher Re_m.
 */
export const kta = method({
  id: "kta-1981",
  revision: 1,
  family: bedFamily,
  title: "Pressure gradient through a pebble bed (KTA 3102.3)",
  tex: String.raw`\left(160+3\,\mathrm{Re}_m^{0.9}\right)\frac{(1-\varepsilon)^2}{\varepsilon^3}\frac{\mu u}{d^2},\quad\mathrm{Re}_m=\frac{\rho\left|u\right|d}{\mu(1-\varepsilon)}`,
  source: { cite: "kta1981", where: "as quoted by python3-fluids 1.0.22" },
  inputs: { ...bedInputs, eps: { ...bedInputs.eps, range: [0.36, 0.42] } },
  within: {
    Re_m: { of: packReynolds, range: [1, 1e5], stated: true, note: packReynoldsNote },
    "D/d": { of: boreToGrain, range: [5, Infinity], stated: false, note: boreToGrainNote },
  },
  output: bedGradient,
  compute: (a) =>
    ((160 + 3 * packReynolds(a) ** 0.9) * a.mu * a.u * (1 - a.eps) ** 2) / (a.eps ** 3 * a.d ** 2),
  direction: {
    safeFor:
      "the flow that a pack lets through, for rough or angular grains: never more than it says",
    unsafeFor: "holding a pack of rough or angular grains down: their gradient is higher",
  },
  checks: [
    {
      from: { cite: "fluids", where: "packed_bed.KTA" },
      basis: "general reference library",
      rows: [
        {
          given: { u: mps(1e-3), d: mm(0.8), eps: 0.4, rho: kgpm3(1000), mu: cP(1), D: m(0.1) },
          printed: "1440.40927703",
        },
        {
          given: { u: mps(0.05), d: mm(5), eps: 0.4, rho: kgpm3(1000), mu: cP(1), D: m(0.1) },
          printed: "9492.78614777",
        },
        {
          given: { u: mps(3), d: mm(20), eps: 0.45, rho: kgpm3(100), mu: cP(0.015), D: m(0.2) },
          printed: "211354.736679",
        },
      ],
    },
  ],
});
