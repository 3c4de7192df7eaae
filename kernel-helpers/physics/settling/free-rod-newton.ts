import { method } from "../../method/index.js";
import { cP, kgpm3, m } from "../../units/index.js";
import { axialCylinder } from "../drag/axial-cylinder-table.js";
import { broadsideCylinder } from "../drag/broadside-cylinder-table.js";
import { gravity, holdsGravity } from "../gravity.js";
import { refuseBuoyant } from "../refuse.js";
import { freeRodFamily, freeRodInputs, freeRodOutput } from "./free-rod.js";

interface Rod {
  readonly d: number;
  readonly L: number;
  readonly rho: number;
  readonly rhoS: number;
  readonly mu: number;
  readonly attitude: "axial" | "broadside";
}

function fall({ d, L, rho, rhoS, attitude }: Rod): number {
  refuseBuoyant("free-rod-newton", rhoS, rho);
  const perArea =
    attitude === "axial"
      ? L / axialCylinder.si({ L, d })
      : (Math.PI * d) / 4 / broadsideCylinder.si({ L, d });
  return Math.sqrt(2 * (rhoS / rho - 1) * gravity * perArea);
}

/**
 * Terminal velocity of a flat-ended rod in a wide, still fluid, at high Reynolds number.
 *
 * (ρ_s−ρ) g L πd²/4 = ½ ρ v² Cd A: axial A = πd²/4, v² = 2(ρ_s/ρ−1) g L/Cd; broadside A = L d,
 * v² = (π/2)(ρ_s/ρ−1) g d/Cd; Cd from the tables of cylinders by L/d. v [m/s], d, L [m], ρ, ρ_s
 * [kg/m³]. µ [Pa·s] enters the range only: 1e4 < ρvd/µ < 2e5. A free rod longer than wide falls
 * broadside, swaying, up to 15 % slower than this; only a guided rod falls end-on. Skin friction of
 * long axial rods is left out. Throws InputError for a solid lighter than the fluid.
 */
export const freeRodNewton = method({
  id: "free-rod-newton",
  revision: 1,
  family: freeRodFamily,
  title: "Terminal velocity of a free rod (tables for high Reynolds number)",
  tex: String.raw`\sqrt{2\left(\frac{\rho_s}{\rho}-1\right)g\,\frac{\pi d^2L/4}{C_d A}}`,
  source: { cite: "derivation", where: "buoyant weight equal to drag, Cd of White (2011)" },
  inputs: freeRodInputs,
  within: {
    Re: {
      of: (a) => (a.rho * fall(a) * a.d) / a.mu,
      range: [1e4, 2e5],
      stated: false,
      note: "Reynolds number ρvd/µ on the rod's diameter",
    },
  },
  output: freeRodOutput,
  compute: fall,
  uses: [axialCylinder, broadsideCylinder],
  dimensional: holdsGravity,
  direction: {
    safeFor: "how hard a rod strikes: swaying and skin friction would slow it",
    unsafeFor: "whether a rod falls: swaying and skin friction would slow it",
  },
  checks: [
    {
      from: { cite: "matthews2002", where: "Cd 0.87 end-on at L/d 4, 0.82 across at L/d 10" },
      basis: "exact limit or identity",
      rows: [
        {
          given: {
            d: m(0.05),
            L: m(0.2),
            rho: kgpm3(1000),
            rhoS: kgpm3(7850),
            mu: cP(1),
            attitude: "axial",
          },
          printed: "5.5575",
          within: 1e-5,
          because: "√(2 · 6.85 · 9.80665 · 0.2/0.87)",
        },
        {
          given: {
            d: m(0.05),
            L: m(0.5),
            rho: kgpm3(1000),
            rhoS: kgpm3(7850),
            mu: cP(1),
            attitude: "broadside",
          },
          printed: "2.53655",
          within: 1e-5,
          because: "√(π/2 · 6.85 · 9.80665 · 0.05/0.82)",
        },
      ],
    },
  ],
});
