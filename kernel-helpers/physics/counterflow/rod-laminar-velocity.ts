import { method } from "../../method/index.js";
import { kgpm3, m, mps, Pas } from "../../units/index.js";
import { gravity, holdsGravity } from "../gravity.js";
import { refuseBuoyant, refuseTooWide } from "../refuse.js";
import { rodInputs, rodVelocity, upwardFlow, type Rod } from "./rod-inputs.js";

/** ln(1/k) − (1−k²)/(1+k²), without the cancellation as k → 1. */
export function gapFunction(k: number): number {
  const t = (1 - k) / (1 + k);
  if (t > 0.02) return -Math.log(k) - (1 - k ** 2) / (1 + k ** 2);
  const t2 = t * t;
  return 2 * t ** 3 * (4 / 3 - t2 * (4 / 5 - t2 * (8 / 7 - t2 * (8 / 9))));
}

/** The velocity in a closed bore [m/s]. */
export function stillVelocity(where: string, { d, D, rho, rhoS, mu }: Rod): number {
  refuseTooWide(where, d, D);
  refuseBuoyant(where, rhoS, rho);
  return ((rhoS - rho) * gravity * (d / 2) ** 2 * gapFunction(d / D)) / (2 * mu);
}

/** ρ|w|(D−d)/µ with w the fluid's mean velocity relative to the rod in the gap. */
export const gapReynolds = (
  { d, D, rho, mu }: Pick<Rod, "d" | "D" | "rho" | "mu">,
  v: number,
  J: number,
): number => (rho * Math.abs((J + v) / (1 - (d / D) ** 2)) * (D - d)) / mu;

const velocity = (a: Rod & { readonly J: number }): number =>
  stillVelocity("rod-laminar-velocity", a) - (2 * a.J) / (1 + (a.d / a.D) ** 2);

/**
 * Velocity of a long rod falling coaxially in a vertical bore, laminar, with net flow up.
 *
 * v = (ρ_s−ρ) g (d/2)² [ln(1/k) − (1−k²)/(1+k²)]/(2µ) − 2J/(1+k²), k = d/D; v [m/s] relative to the
 * pipe, down positive; J net superficial velocity up [m/s]; d rod, D bore [m], ρ_s, ρ [kg/m³], µ
 * [Pa·s]. Exact without end effects: L and nose take no part. To be checked: gap Reynolds number
 * ρ|w|(D−d)/µ below about 2100, w = (J+v)/(1−k²). A rod off the axis falls faster, up to 2.5 times in
 * a narrow gap. J = 0: Lohrenz, Swift and Kurata (1960); J by superposition of the same flow.
 * Throws InputError for d ≥ D or a rod lighter than the fluid.
 */
export const rodLaminarVelocity = method({
  id: "rod-laminar-velocity",
  revision: 1,
  family: "velocity of a rod in a bore",
  title: "Velocity of a long rod in a bore, laminar",
  tex: String.raw`\frac{(\rho_s-\rho)g(d/2)^2}{2\mu}\left[\ln\frac1k-\frac{1-k^2}{1+k^2}\right]-\frac{2J}{1+k^2},\quad k=\frac dD`,
  source: { cite: "lohrenz1960", where: "exact laminar solution; J by superposition" },
  inputs: { ...rodInputs, J: upwardFlow },
  within: {
    "Re gap": {
      of: (a) => gapReynolds(a, velocity(a), a.J),
      range: [0, 2100],
      stated: false,
      note: "Reynolds number of the gap ρ|w|(D−d)/µ",
    },
    "L/D": {
      of: ({ L, D }) => L / D,
      range: [5, Infinity],
      stated: false,
      note: "length to bore",
    },
  },
  output: rodVelocity,
  compute: velocity,
  dimensional: holdsGravity,
  direction: {
    safeFor: "whether a rod falls: off the axis it falls faster",
    unsafeFor: "how fast a rod falls at most: off the axis it falls faster",
  },
  cautions: [
    "The flow is taken at its mean over the bore. Near the axis it is up to twice the mean (laminar): a near-critical result is to be checked at both.",
  ],
  checks: [
    {
      from: {
        cite: "derivation",
        where: "narrow gap, flow as between plates: Δρ g (d/2)² (1−k)³/(6µ)",
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
            J: mps(0),
          },
          printed: "5.5868e-7",
          within: 2e-3,
          because: "leading order as k → 1; the next term is 1.5 (1−k)",
        },
      ],
    },
    {
      from: { cite: "derivation", where: "thin rod: the axis of a parabola runs at 2J" },
      basis: "exact limit or identity",
      rows: [
        {
          given: {
            d: m(1e-6),
            D: m(0.1),
            L: m(1),
            rho: kgpm3(1000),
            rhoS: kgpm3(1000),
            mu: Pas(0.05),
            nose: "flat",
            J: mps(0.05),
          },
          printed: "-0.1000000",
        },
      ],
    },
    {
      from: {
        cite: "lohrenz1960",
        where: "equation evaluated apart, by a linear solve of the flow",
      },
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
            J: mps(0),
          },
          printed: "0.528169",
          within: 4e-4,
          because: "worked with g = 9.81",
        },
        {
          given: {
            d: m(0.08),
            D: m(0.1),
            L: m(1),
            rho: kgpm3(1000),
            rhoS: kgpm3(7850),
            mu: Pas(0.05),
            nose: "flat",
            J: mps(0.05),
          },
          printed: "3.84337",
          within: 4e-4,
          because: "worked with g = 9.81",
        },
      ],
    },
  ],
});
