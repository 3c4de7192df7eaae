import { method } from "../../method/index.js";
import { cP, kgpm3, m } from "../../units/index.js";
import { axialCylinder } from "../drag/axial-cylinder-table.js";
import { holdsGravity } from "../gravity.js";
import { rodBalance, stallFlow } from "./rod-balance.js";
import { rodInputs, type Rod } from "./rod-inputs.js";
import { stallFamily, stallOutput } from "./rod-laminar-stall.js";
import { gapReynolds } from "./rod-laminar-velocity.js";

const stall = (a: Rod): number =>
  stallFlow("rod-turbulent-stall", rodBalance("rod-turbulent-stall", a, null));

/**
 * Superficial velocity up at which a rod hangs end-on in a vertical bore, with losses at its ends.
 *
 * Root J₀ [m/s] of the balance of `rod-turbulent-velocity` at v = 0: w = u = J₀/(1−k²), k = d/D. d rod,
 * D bore, L [m], ρ, ρ_s [kg/m³], µ [Pa·s]. An assembly of published losses, ±15 % by judgement;
 * upright rod on the axis, mean flow. Throws InputError for d ≥ D or a rod lighter than the fluid.
 */
export const rodTurbulentStall = method({
  id: "rod-turbulent-stall",
  revision: 1,
  family: stallFamily,
  title: "Flow that holds a rod still, with losses at its ends",
  tex: String.raw`J_0:\ (\rho_s-\rho)gLA_r=\tfrac12\rho w^2\,\zeta A+\Delta p_fA_r+\tau_r\pi dL,\quad w=\frac{J_0}{1-k^2}`,
  source: { cite: "idelchik1986", where: "thick orifice; momentum balance over the bore" },
  inputs: rodInputs,
  within: {
    "Re gap": {
      of: (a) => gapReynolds(a, 0, stall(a)),
      range: [2100, Infinity],
      stated: false,
      note: "Reynolds number of the gap ρ|w|(D−d)/µ",
    },
    "L/d": {
      of: ({ L, d }) => L / d,
      range: [2, Infinity],
      stated: false,
      note: "length to diameter",
    },
  },
  output: stallOutput,
  compute: stall,
  uses: [axialCylinder],
  dimensional: holdsGravity,
  direction: {
    safeFor: "whether flow carries a rod out: it is upright, and leaning stands less flow",
    unsafeFor: "whether a rod falls: it is upright, and leaning stands less flow",
  },
  cautions: [
    "The flow is taken at its mean over the bore. Near the axis it is about 1.2 times the mean (turbulent): a near-critical result is to be checked at both.",
  ],
  checks: [
    {
      from: {
        cite: "white2011",
        where: "wide bore: axial cylinder L/d 4, Cd 0.87, without friction",
      },
      basis: "exact limit or identity",
      rows: [
        {
          given: {
            d: m(0.05),
            D: m(1e7),
            L: m(0.2),
            rho: kgpm3(1000),
            rhoS: kgpm3(7850),
            mu: cP(1),
            nose: "flat",
          },
          printed: "5.5575",
          within: 2e-3,
          because: "√(2 · 6.85 · 9.80665 · 0.2/0.87); friction vanishes with 1/D",
        },
      ],
    },
  ],
});
