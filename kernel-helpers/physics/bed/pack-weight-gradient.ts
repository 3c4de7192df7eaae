import { method } from "../../method/index.js";
import { kgpm3, rad } from "../../units/index.js";
import { fluidDensity, solidDensity, voidage } from "../fields.js";
import { gravity, holdsGravity } from "../gravity.js";
import { refuseBuoyant } from "../refuse.js";

/**
 * Buoyant weight of a pack of grains along the hole, per volume of pack.
 *
 * w = (1−ε)(ρ_s−ρ) g cos θ [Pa/m]; ε voidage, ρ_s, ρ densities of solid and fluid [kg/m³], θ the angle
 * of the hole from vertical [rad], g = 9.80665 m/s². Exact for a pack in one piece; above about 10°
 * the low side carries weight and a pack loosens first along the high side, so it is a bound. To be
 * compared with a dynamic pressure gradient (hydrostatic removed). Throws InputError for a solid
 * lighter than the fluid. Terzaghi's critical hydraulic gradient is w/(ρg).
 */
export const packWeightGradient = method({
  id: "pack-weight-gradient",
  revision: 1,
  family: "buoyant weight gradient of a pack",
  title: "Buoyant weight gradient of a pack along the hole",
  tex: String.raw`(1-\varepsilon)(\rho_s-\rho)\,g\cos\theta`,
  source: { cite: "derivation", where: "force balance on a slice of the pack" },
  inputs: {
    eps: voidage,
    rho: fluidDensity,
    rhoS: solidDensity,
    theta: {
      kind: "angle",
      symbol: String.raw`\theta`,
      note: "angle of the hole from vertical",
      possible: { from: 0, to: Math.PI / 2 },
      range: [0, Math.PI / 18],
      stated: false,
    },
  },
  output: {
    kind: "pressureGradient",
    symbol: "w",
    note: "buoyant weight per volume of pack, along the hole",
  },
  compute: ({ eps, rho, rhoS, theta }) => {
    refuseBuoyant("pack-weight-gradient", rhoS, rho);
    return (1 - eps) * (rhoS - rho) * gravity * Math.cos(theta);
  },
  dimensional: holdsGravity,
  checks: [
    {
      from: { cite: "terzaghi1943", where: "critical gradient of sand near 1: 0.99 ρg at ε 0.4" },
      basis: "exact limit or identity",
      rows: [
        {
          given: { eps: 0.4, rho: kgpm3(1000), rhoS: kgpm3(2650), theta: rad(0) },
          printed: "9708.58",
          within: 1e-6,
          because: "0.6 · 1.65 · 1000 · 9.80665",
        },
        {
          given: { eps: 0.4, rho: kgpm3(1000), rhoS: kgpm3(2650), theta: rad(Math.PI / 3) },
          printed: "4854.29",
          within: 1e-6,
          because: "half of it at 60° from vertical",
        },
      ],
    },
  ],
});
