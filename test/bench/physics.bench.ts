import { bench, describe } from "vitest";
import { kta } from "../../kernel-helpers/physics/bed/kta-1981.js";
import { ergun } from "../../kernel-helpers/physics/bed/ergun-1952.js";
import { liftVelocity } from "../../kernel-helpers/physics/bed/lift-velocity.js";
import { rodTurbulentVelocity } from "../../kernel-helpers/physics/counterflow/rod-turbulent-velocity.js";
import { terminalVelocitySphere } from "../../kernel-helpers/physics/settling/terminal-velocity-sphere.js";
import { kgpm3, m, mm, mps, Pas } from "../../kernel-helpers/units/index.js";

// Each bench runs a thousand calls on inputs that differ, so that nothing is folded away: a mean
// time in ms is a time per call in µs. test/sources/fluids-speed.py times the same in Python.
const CALLS = 1000;
const each = (run: (x: number) => number) => (): void => {
  let sum = 0;
  for (let i = 0; i < CALLS; i++) sum += run(1 + i * 1e-4);
  if (!Number.isFinite(sum)) throw new Error("not finite");
};

describe("1000 pack gradients", () => {
  bench(
    "ergun.si",
    each((x) => ergun.si({ u: 0.2 * x, d: 0.02, eps: 0.4, rho: 1000, mu: 1e-3, D: 0.2 })),
  );
  bench(
    "kta.si",
    each((x) => kta.si({ u: 0.2 * x, d: 0.02, eps: 0.4, rho: 1000, mu: 1e-3, D: 0.2 })),
  );
  bench(
    "ergun, checked",
    each((x) =>
      ergun({ u: mps(0.2 * x), d: mm(20), eps: 0.4, rho: kgpm3(1000), mu: Pas(1e-3), D: m(0.2) }),
    ),
  );
});

describe("1000 terminal velocities of a sphere", () => {
  for (const law of [
    "brown-lawler-2003",
    "haider-levenspiel-sphere-1989",
    "clift-grace-weber-1978",
  ] as const)
    for (const d of [1e-4, 1e-3, 2e-2])
      bench(
        `${law}, d ${d} m`,
        each((x) => terminalVelocitySphere.si({ d: d * x, rho: 1000, rhoS: 7850, mu: 1e-3, law })),
      );
});

describe("1000 roots", () => {
  bench(
    "lift velocity of a pack (KTA)",
    each((x) =>
      liftVelocity.si({
        d: 0.02 * x,
        eps: 0.4,
        rho: 1000,
        rhoS: 7850,
        mu: 1e-3,
        D: 0.2,
        theta: 0,
        law: "kta-1981",
      }),
    ),
  );
  bench(
    "velocity of a rod in a bore",
    each((x) =>
      rodTurbulentVelocity.si({
        d: 0.05 * x,
        D: 0.15,
        L: 3,
        rho: 1000,
        rhoS: 7850,
        mu: 1e-3,
        nose: "flat",
        J: 0.5,
      }),
    ),
  );
});
