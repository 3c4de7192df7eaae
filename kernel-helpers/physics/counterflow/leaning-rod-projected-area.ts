import { method } from "../../method/index.js";
import { cP, deg, kgpm3, m, mps } from "../../units/index.js";
import { axialCylinder } from "../drag/axial-cylinder-table.js";
import { broadsideCylinder } from "../drag/broadside-cylinder-table.js";
import { holdsGravity } from "../gravity.js";
import { leanFamily, leanInput, leanOf } from "./lean.js";
import { rodBalance, velocityAt } from "./rod-balance.js";
import { rodInputs, rodVelocity, upwardFlow } from "./rod-inputs.js";
import { rodLeanLimit } from "./rod-lean-limit.js";

const ID = "leaning-rod-projected-area";

/**
 * Lower bound on the velocity of a rod that leans in a vertical bore, from its projected area.
 *
 * The balance of `rod-turbulent-velocity` with two changes: the bore is blocked by the section at the
 * rod's middle, A_m = A_r/cos t while the ends do not cut it, so w = (J+v)/(1−A_m/A) and
 * u = (J+vA_m/A)/(1−A_m/A); and the side adds ½ρ w|w| Cd L d sin t, Cd of the finite cylinder
 * broadside: the whole approach velocity acts on the whole projected side, which is more than a slender
 * body feels.
 *
 * v [m/s], down positive; J [m/s] up; d rod, D bore, L [m], ρ, ρ_s [kg/m³], µ [Pa·s]; lean t [rad] from
 * the axis, at most the largest lean of the rod in the bore. At t = 0 it is the upright rod. Advised
 * for t < 30°. Throws InputError for d ≥ D, a rod lighter than the fluid, a lean that does not fit.
 */
export const leaningRodProjectedArea = method({
  id: ID,
  revision: 1,
  family: leanFamily,
  title: "Velocity of a leaning rod in a bore (lower bound, projected area)",
  tex: String.raw`v:\ (\rho_s-\rho)gLA_r=\tfrac12\rho w|w|\left(\zeta A+C_dLd\,\sin t\right)+\Delta p_fA_r+\tau_r\pi dL,\quad w=\frac{J+v}{1-A_m/A}`,
  source: {
    cite: "derivation",
    where: "projected area of the side with its broadside drag coefficient",
  },
  inputs: { ...rodInputs, J: upwardFlow, lean: leanInput },
  within: {
    "L/d": {
      of: ({ L, d }) => L / d,
      range: [2, Infinity],
      stated: false,
      note: "length to diameter",
    },
  },
  output: rodVelocity,
  compute: (a) => velocityAt(ID, rodBalance(ID, a, leanOf(ID, a, a.lean, 1)), a.J),
  uses: [axialCylinder, broadsideCylinder, rodLeanLimit],
  dimensional: holdsGravity,
  direction: {
    safeFor: "whether a rod falls: its drag is not below the true one",
    unsafeFor: "how fast a rod falls at most",
  },
  checks: [
    {
      from: { cite: "white2011", where: "wide bore, upright: axial cylinder L/d 4, Cd 0.87" },
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
            J: mps(0),
            lean: deg(0),
          },
          printed: "5.5575",
          within: 2e-3,
          because: "√(2 · 6.85 · 9.80665 · 0.2/0.87); friction vanishes with 1/D",
        },
        {
          given: {
            d: m(0.05),
            D: m(1e7),
            L: m(0.5),
            rho: kgpm3(1000),
            rhoS: kgpm3(7850),
            mu: cP(1),
            nose: "flat",
            J: mps(0),
            lean: deg(30),
          },
          printed: "3.2889",
          within: 2e-3,
          because: "weight over ½ρ(0.99 πd²/4 + 0.82 L d sin t): tables of cylinders at L/d 10",
        },
      ],
    },
  ],
});
