import { method } from "../../method/index.js";
import { kgpm3, m, Pas } from "../../units/index.js";
import { holdsGravity } from "../gravity.js";
import { gapReynolds, stillVelocity } from "./rod-laminar-velocity.js";
import { rodInputs, type Rod } from "./rod-inputs.js";

export const stallFamily = "flow that holds a rod still in a bore";
export const stallOutput = {
  kind: "velocity",
  symbol: "J_0",
  note: "superficial velocity up at which the rod hangs",
} as const;

const stall = (a: Rod): number =>
  (stillVelocity("rod-laminar-stall", a) * (1 + (a.d / a.D) ** 2)) / 2;

/**
 * Superficial velocity up at which a long rod hangs in a vertical bore, laminar.
 *
 * J₀ = v₀ (1+k²)/2, v₀ the velocity in a closed bore, k = d/D; J₀ [m/s]; d rod, D bore [m], ρ_s, ρ
 * [kg/m³], µ [Pa·s]. Exact without end effects, rod on the axis: L and nose take no part. Gap Reynolds
 * number ρJ₀(D−d)/(µ(1−k²)) below about 2100. Throws InputError for d ≥ D or a rod lighter than the
 * fluid. Zero of the laminar velocity of a rod with flow.
 */
export const rodLaminarStall = method({
  id: "rod-laminar-stall",
  revision: 1,
  family: stallFamily,
  title: "Flow that holds a long rod still, laminar",
  tex: String.raw`\frac{(\rho_s-\rho)g(d/2)^2}{4\mu}\left[(1+k^2)\ln\frac1k-(1-k^2)\right],\quad k=\frac dD`,
  source: { cite: "lohrenz1960", where: "exact laminar solution; J by superposition" },
  inputs: rodInputs,
  within: {
    "Re gap": {
      of: (a) => gapReynolds(a, 0, stall(a)),
      range: [0, 2100],
      stated: false,
      note: "Reynolds number of the gap ρ|w|(D−d)/µ",
    },
  },
  output: stallOutput,
  compute: stall,
  dimensional: holdsGravity,
  direction: {
    safeFor: "whether a rod falls: off the axis it stands more flow",
    unsafeFor: "whether flow carries a rod out: off the axis it stands more flow",
  },
  checks: [
    {
      from: {
        cite: "derivation",
        where: "narrow gap, flow as between plates: Δρ g (d/2)² (1−k)³ (1+k²)/(12µ)",
      },
      basis: "exact limit or identity",
      rows: [
        {
          given: {
            d: m(0.0999),
            D: m(0.1),
            L: m(1),
            rho: kgpm3(1000),
            rhoS: kgpm3(7850),
            mu: Pas(0.05),
            nose: "flat",
          },
          printed: "5.5812e-7",
          within: 2e-3,
          because: "leading order as k → 1; the next term is 1.5 (1−k)",
        },
      ],
    },
    {
      from: { cite: "lohrenz1960", where: "equation evaluated apart: 0.528169 (1 + 0.81)/2" },
      basis: "from memory",
      rows: [
        {
          given: {
            d: m(0.09),
            D: m(0.1),
            L: m(1),
            rho: kgpm3(1000),
            rhoS: kgpm3(7850),
            mu: Pas(0.05),
            nose: "flat",
          },
          printed: "0.477993",
          within: 4e-4,
          because: "worked with g = 9.81",
        },
      ],
    },
  ],
});
