import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  leaningRodCrossFlow,
  leaningRodProjectedArea,
  rodLaminarStall,
  rodLaminarVelocity,
  rodLeanLimit,
  rodTurbulentStall,
  rodTurbulentVelocity,
} from "../../../kernel-helpers/physics/counterflow/index.js";
import { freeRodNewton } from "../../../kernel-helpers/physics/settling/index.js";
import { SEED } from "../arguments.js";

const g = 9.80665;
const flat = (x: { min: number; max: number }) => fc.double({ ...x, noNaN: true });
const rods = fc.record({
  d: flat({ min: 0.005, max: 0.09 }),
  k: flat({ min: 0.05, max: 0.95 }),
  L: flat({ min: 0.1, max: 10 }),
  rho: flat({ min: 50, max: 2000 }),
  rhoS: flat({ min: 2500, max: 19_000 }),
  mu: flat({ min: 1e-5, max: 0.5 }),
  nose: fc.constantFrom("flat" as const, "rounded" as const),
  J: flat({ min: -2, max: 5 }),
});

describe("a long rod in laminar flow", () => {
  const oil = { L: 5, rho: 900, rhoS: 7850, mu: 0.5, nose: "flat" as const };
  const still = (d: number, D: number) => {
    const { L, rho, rhoS, mu, nose } = oil;
    return rodLaminarVelocity.si({ d, D, L, rho, rhoS, mu, nose, J: 0 });
  };
  it("falls as (1−k)³/3 in a narrow gap, and without loss of digits", () => {
    for (const gap of [1e-2, 1e-3, 1e-5, 1e-8]) {
      const D = 0.1;
      const d = D * (1 - gap);
      const narrow = ((oil.rhoS - oil.rho) * g * (d / 2) ** 2 * (gap ** 3 / 3)) / (2 * oil.mu);
      expect(Math.abs(still(d, D) / narrow - 1)).toBeLessThan(1.6 * gap + 1e-7);
    }
  });
  it("falls as ln(1/k) − 1 in a wide bore", () => {
    const [d, D] = [0.01, 1e6];
    const wide = ((oil.rhoS - oil.rho) * g * (d / 2) ** 2 * (Math.log(D / d) - 1)) / (2 * oil.mu);
    expect(still(d, D) / wide).toBeCloseTo(1, 9);
  });
  it("has no step where its series takes over", () => {
    // t = (1−k)/(1+k) = 0.02
    const k = 0.98 / 1.02;
    const below = still(0.1 * k * (1 - 1e-13), 0.1);
    const above = still(0.1 * k * (1 + 1e-13), 0.1);
    expect(Math.abs(above / below - 1)).toBeLessThan(1e-9);
  });
  it("drifts with 2J when thin and with J when it fills the bore", () => {
    const drift = (d: number) => {
      const { L, rho, rhoS, mu, nose } = oil;
      return (
        rodLaminarVelocity.si({ d, D: 0.1, L, rho, rhoS, mu, nose, J: 0 }) -
        rodLaminarVelocity.si({ d, D: 0.1, L, rho, rhoS, mu, nose, J: 0.05 })
      );
    };
    expect(drift(1e-7) / 0.05).toBeCloseTo(2, 9);
    expect(drift(0.1 * (1 - 1e-9)) / 0.05).toBeCloseTo(1, 7);
  });
  it("obeys the flow of the gap, solved apart on a grid", () => {
    const [d, D, J] = [0.05, 0.1, 0.03];
    const { L, rho, rhoS, mu, nose } = oil;
    const v = rodLaminarVelocity.si({ d, D, L, rho, rhoS, mu, nose, J });
    expect(gapFlow({ a: d / 2, R: D / 2, weight: (rhoS - rho) * g, mu, v })).toBeCloseTo(
      Math.PI * ((D / 2) ** 2 * J + (d / 2) ** 2 * v),
      7,
    );
  });
});

/**
 * Upward flow in the gap by finite volumes on rings, with the rod going down at v and the pressure
 * gradient that, with the shear on its side, carries its weight. No formula of the method is used.
 */
function gapFlow({
  a,
  R,
  weight,
  mu,
  v,
}: { [name: string]: number } & Record<string, number>): number {
  const n = 4000;
  const h = ((R ?? 0) - (a ?? 0)) / n;
  // u'' + u'/r = −G/µ is linear: u = u0 + G u1 with u0 for G = 0 and u1 for unit G and walls at rest
  const solve = (source: number, inner: number): { flow: number; shear: number } => {
    const low: number[] = [];
    const rhs: number[] = [];
    for (let i = 0; i < n; i++) {
      const r = (a ?? 0) + (i + 0.5) * h;
      const west = ((r - h / 2) * (mu ?? 0)) / (i === 0 ? h / 2 : h);
      const east = ((r + h / 2) * (mu ?? 0)) / (i === n - 1 ? h / 2 : h);
      const b = source * r * h + (i === 0 ? west * inner : 0);
      const below = i === 0 ? 0 : west;
      const diag = west + east - below * (low[i - 1] ?? 0);
      low.push(east / diag);
      rhs.push((b + below * (rhs[i - 1] ?? 0)) / diag);
    }
    let u = 0;
    let flow = 0;
    for (let i = n - 1; i >= 0; i--) {
      u = (rhs[i] ?? 0) + (i === n - 1 ? 0 : (low[i] ?? 0)) * u;
      flow += 2 * Math.PI * ((a ?? 0) + (i + 0.5) * h) * h * u;
    }
    return { flow, shear: ((mu ?? 0) * (u - inner)) / (h / 2) };
  };
  const moving = solve(0, -(v ?? 0));
  const driven = solve(1, 0);
  // weight per length πa²Δρg = pressure gradient on the section + shear on the side
  const need = Math.PI * (a ?? 0) ** 2 * (weight ?? 0);
  const G =
    (need - 2 * Math.PI * (a ?? 0) * moving.shear) /
    (Math.PI * (a ?? 0) ** 2 + 2 * Math.PI * (a ?? 0) * driven.shear);
  return moving.flow + G * driven.flow;
}

describe("a rod with losses at its ends", () => {
  it("has a velocity at which a balance written apart closes", () => {
    const tau = [
      [0, 1.35],
      [0.2, 1.22],
      [0.4, 1.1],
      [0.6, 0.84],
      [0.8, 0.42],
      [1, 0.24],
      [1.2, 0.16],
      [1.6, 0.07],
      [2, 0.02],
      [2.4, 0],
      [1e9, 0],
    ] as const;
    const axial = [
      [0, 1.15],
      [0.5, 1.15],
      [1, 0.9],
      [2, 0.85],
      [4, 0.87],
      [8, 0.99],
      [1e9, 0.99],
    ] as const;
    const read = (rows: readonly (readonly [number, number])[], x: number): number => {
      const i = rows.findIndex(([at]) => at > x);
      const [x0, y0] = rows[i - 1] ?? [0, 0];
      const [x1, y1] = rows[i] ?? [1, 0];
      return y0 + ((x - x0) / (x1 - x0)) * (y1 - y0);
    };
    fc.assert(
      fc.property(rods, ({ d, k, L, rho, rhoS, mu, nose, J }) => {
        const D = d / k;
        const v = rodTurbulentVelocity.si({ d, D, L, rho, rhoS, mu, nose, J });
        const s = 1 - k * k;
        const w = (J + v) / s;
        const u = (J + v * k * k) / s;
        const fanning = (x: number) => {
          const Re = (rho * Math.abs(x) * (D - d)) / mu;
          return x === 0 ? 0 : Math.max(16 / Re, 0.0791 / Math.sqrt(Math.sqrt(Re)));
        };
        const shear = (x: number) => 0.5 * rho * fanning(x) * Math.abs(x) * x;
        const sharp =
          0.5 * (1 - s) ** 0.75 + read(tau, L / (D - d)) * (1 - s) ** 1.375 + (1 - s) ** 2;
        const zeta =
          nose === "flat"
            ? Math.min(sharp, read(axial, L / d) * k * k * (1 + k * k))
            : Math.max((1 - s) ** 2, 0.2 * k * k);
        const area = (Math.PI * D * D) / 4;
        const friction = (shear(w) * Math.PI * d + shear(u) * Math.PI * D) * (L / (area * s));
        const terms = [
          0.5 * rho * w * Math.abs(w) * zeta * area,
          friction * area * k * k,
          shear(w) * Math.PI * d * L,
          -(rhoS - rho) * g * L * area * k * k,
        ];
        const size = Math.max(...terms.map(Math.abs));
        expect(Math.abs(terms.reduce((a, b) => a + b)) / size).toBeLessThan(1e-9);
      }),
      SEED,
    );
  });
  it("slows as the flow rises and stands still at its stall flow", () => {
    fc.assert(
      fc.property(rods, ({ d, k, L, rho, rhoS, mu, nose, J }) => {
        const D = d / k;
        const at = (J: number) => rodTurbulentVelocity.si({ d, D, L, rho, rhoS, mu, nose, J });
        expect(at(J + 0.1)).toBeLessThan(at(J));
        const stall = rodTurbulentStall.si({ d, D, L, rho, rhoS, mu, nose });
        expect(stall).toBeGreaterThan(0);
        expect(Math.abs(at(stall))).toBeLessThan(1e-10 * Math.max(1, at(0)));
        expect(at(1.1 * stall)).toBeLessThan(0);
        expect(at(0.9 * stall)).toBeGreaterThan(0);
      }),
      SEED,
    );
  });
  it("falls faster with a rounded nose than with a flat one", () => {
    fc.assert(
      fc.property(rods, ({ d, k, L, rho, rhoS, mu, J }) => {
        const at = (nose: "flat" | "rounded") =>
          rodTurbulentVelocity.si({ d, D: d / k, L, rho, rhoS, mu, nose, J });
        // slower than the fluid, the ends push the other way
        if (at("flat") + J > 0) expect(at("rounded")).toBeGreaterThanOrEqual(at("flat"));
      }),
      SEED,
    );
  });
  it("is the free rod end-on in a bore without end", () => {
    for (const L of [0.1, 0.2, 0.4]) {
      const [d, rho, rhoS, mu] = [0.05, 1000, 7850, 1e-3];
      const free = freeRodNewton.si({ d, L, rho, rhoS, mu, attitude: "axial" });
      const bore = rodTurbulentVelocity.si({ d, D: 1e7, L, rho, rhoS, mu, nose: "flat", J: 0 });
      expect(Math.abs(bore / free - 1)).toBeLessThan(3e-3);
    }
  });
  it("slows as it fills more than half of the bore, without a step", () => {
    for (const nose of ["flat", "rounded"] as const) {
      let last = Infinity;
      for (let k = 0.5; k < 0.985; k += 0.002) {
        const v = rodTurbulentVelocity.si({
          d: 0.1 * k,
          D: 0.1,
          L: 3,
          rho: 1000,
          rhoS: 7850,
          mu: 1e-3,
          nose,
          J: 0,
        });
        expect(v).toBeLessThan(last);
        if (last < Infinity) expect(v / last).toBeGreaterThan(0.75);
        last = v;
      }
    }
  });
  it("is near the exact laminar velocity where the gap's Reynolds number is about 1000", () => {
    const [d, D, L, rho, rhoS, nose] = [0.0127, 0.0762, 3, 900, 7850, "flat"] as const;
    const mu = 0.25;
    const exact = rodLaminarVelocity.si({ d, D, L, rho, rhoS, mu, nose, J: 0 });
    const lumped = rodTurbulentVelocity.si({ d, D, L, rho, rhoS, mu, nose, J: 0 });
    expect(lumped / exact).toBeGreaterThan(0.5);
    expect(lumped / exact).toBeLessThan(2);
  });
  it("says so when the other regime's relation is wanted", () => {
    const rod = { d: 0.05, D: 0.1, L: 1, rho: 1000, rhoS: 7850, nose: "flat", J: 0 } as const;
    const groups = (found: readonly { readonly group?: string }[]) => found.map((f) => f.group);
    expect(groups(rodTurbulentVelocity.findings({ ...rod, mu: 1e-3 } as never))).toEqual([]);
    expect(groups(rodTurbulentVelocity.findings({ ...rod, mu: 10 } as never))).toEqual(["Re gap"]);
    expect(groups(rodLaminarVelocity.findings({ ...rod, mu: 10 } as never))).toEqual([]);
    expect(groups(rodLaminarVelocity.findings({ ...rod, mu: 1e-3 } as never))).toEqual(["Re gap"]);
  });
});

describe("the stall flow of a long rod in laminar flow", () => {
  it("is where its velocity vanishes", () => {
    fc.assert(
      fc.property(rods, ({ d, k, L, rho, rhoS, nose }) => {
        const D = d / k;
        const J = rodLaminarStall.si({ d, D, L, rho, rhoS, mu: 2, nose });
        const v0 = rodLaminarVelocity.si({ d, D, L, rho, rhoS, mu: 2, nose, J: 0 });
        const v = rodLaminarVelocity.si({ d, D, L, rho, rhoS, mu: 2, nose, J });
        expect(Math.abs(v)).toBeLessThan(1e-12 * v0);
      }),
      SEED,
    );
  });
});

describe("the largest lean", () => {
  it("touches both sides of the bore", () => {
    fc.assert(
      fc.property(rods, ({ d, k, L }) => {
        const D = d / k;
        const t = rodLeanLimit.si({ d, D, L });
        if (L ** 2 + d ** 2 <= D ** 2) expect(t).toBe(Math.PI / 2);
        else {
          expect((L * Math.sin(t) + d * Math.cos(t)) / D).toBeCloseTo(1, 12);
          expect(t).toBeGreaterThan(0);
          expect(t).toBeLessThan(Math.PI / 2);
        }
      }),
      SEED,
    );
  });
  it("is (D−d)/L for a long rod in a narrow gap, with all its digits", () => {
    expect((rodLeanLimit.si({ d: 0.1 * (1 - 1e-9), D: 0.1, L: 100 }) * 100) / 1e-10).toBeCloseTo(
      1,
      6,
    );
  });
});

describe("a leaning rod", () => {
  it("is upright at no lean, and slower by projected area than by the cross-flow principle", () => {
    fc.assert(
      fc.property(rods, fc.double({ min: 0, max: 1, noNaN: true }), (r, share) => {
        const { d, k, L, rho, rhoS, mu, nose, J } = r;
        if (L < d) return;
        const D = d / k;
        const lean = share * Math.min(rodLeanLimit.si({ d, D, L }), 1.2);
        const upright = rodTurbulentVelocity.si({ d, D, L, rho, rhoS, mu, nose, J });
        const middle = leaningRodCrossFlow.si({ d, D, L, rho, rhoS, mu, nose, J, lean });
        const bound = leaningRodProjectedArea.si({ d, D, L, rho, rhoS, mu, nose, J, lean });
        const size = Math.abs(upright) + Math.abs(J) + 1e-3;
        expect(bound - middle).toBeLessThan(1e-9 * size);
        // the order holds while the rod overtakes the fluid
        if (middle + J > 0) expect(middle - upright).toBeLessThan(1e-9 * size);
        const none = leaningRodCrossFlow.si({ d, D, L, rho, rhoS, mu, nose, J, lean: 0 });
        expect(Math.abs(none - upright)).toBeLessThan(1e-9 * size);
      }),
      SEED,
    );
  });
  it("of 3 m at 3.2° is about half as fast as upright, at the bound", () => {
    const rod = { d: 0.05, D: 0.2174, L: 3, rho: 1000, rhoS: 7850, mu: 1e-3 };
    const { d, D, L, rho, rhoS, mu } = rod;
    const lean = (3.2 * Math.PI) / 180;
    const upright = rodTurbulentVelocity.si({ d, D, L, rho, rhoS, mu, nose: "flat", J: 0 });
    const bound = leaningRodProjectedArea.si({ d, D, L, rho, rhoS, mu, nose: "flat", J: 0, lean });
    expect(upright / bound).toBeGreaterThan(1.7);
    expect(upright / bound).toBeLessThan(2.5);
  });
  it("is refused a lean that the bore does not allow", () => {
    const given = { d: 0.05, D: 0.1, L: 1, rho: 1000, rhoS: 7850, mu: 1e-3, nose: "flat", J: 0 };
    expect(() => leaningRodCrossFlow({ ...given, lean: 0.5 } as never)).toThrow(
      expect.objectContaining({
        code: "out-of-bounds",
        where: "leaning-rod-cross-flow.lean",
      }) as Error,
    );
    const limit = rodLeanLimit.si({ d: 0.05, D: 0.1, L: 1 });
    expect(leaningRodCrossFlow({ ...given, lean: limit } as never)).toBeGreaterThan(0);
  });
});
