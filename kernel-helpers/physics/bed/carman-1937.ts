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
 * Pressure gradient of a fluid through a pack of grains.
 *
 * Δp/L = (180 + 2.871 Re_m^0.9) (1−ε)²/ε³ · µu/d², Re_m = ρ|u|d/(µ(1−ε)); u superficial [m/s], d grain
 * diameter [m], ε voidage, ρ, µ of the fluid [kg/m³, Pa·s]; Pa/m. Quoted for 300 < Re_m < 60 000; no
 * wall term: D enters the advised D/d > 10 only. Carman (1937), as quoted by later reviews.
 */
export const carman = method({
  id: "carman-1937",
  revision: 1,
  family: bedFamily,
  title: "Pressure gradient through a packed bed (Carman)",
  tex: String.raw`\left(180+2.871\,\mathrm{Re}_m^{0.9}\right)\frac{(1-\varepsilon)^2}{\varepsilon^3}\frac{\mu u}{d^2},\quad\mathrm{Re}_m=\frac{\rho\left|u\right|d}{\mu(1-\varepsilon)}`,
  source: { cite: "carman1937", where: "as quoted by python3-fluids 1.0.22" },
  inputs: bedInputs,
  within: {
    Re_m: { of: packReynolds, range: [300, 60_000], stated: true, note: packReynoldsNote },
    "D/d": { of: boreToGrain, range: [10, Infinity], stated: false, note: boreToGrainNote },
  },
  output: bedGradient,
  compute: (a) =>
    ((180 + 2.871 * packReynolds(a) ** 0.9) * a.mu * a.u * (1 - a.eps) ** 2) /
    (a.eps ** 3 * a.d ** 2),
  direction: {
    safeFor:
      "the flow that a pack lets through, for rough or angular grains: never more than it says",
    unsafeFor: "holding a pack of rough or angular grains down: their gradient is higher",
  },
  checks: [
    {
      from: { cite: "fluids", where: "packed_bed.Carman" },
      basis: "general reference library",
      rows: [
        {
          given: { u: mps(1e-3), d: mm(0.8), eps: 0.4, rho: kgpm3(1000), mu: cP(1), D: m(0.1) },
          printed: "1614.72167812",
        },
        {
          given: { u: mps(0.05), d: mm(5), eps: 0.4, rho: kgpm3(1000), mu: cP(1), D: m(0.1) },
          printed: "9386.99634341",
        },
      ],
    },
  ],
});
