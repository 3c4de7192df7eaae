import { method, oneOf, positive } from "../../method/index.js";
import { cP, kgpm3, mm, mmps, mps, micrometre } from "../../units/index.js";
import { fluidDensity, fluidViscosity, solidDensity } from "../fields.js";
import { gravity, holdsGravity } from "../gravity.js";
import { refuseBuoyant } from "../refuse.js";
import { fallReynolds } from "./fall-reynolds.js";
import { crisisOnset, sphereLaws, type SphereLaw } from "./sphere-laws.js";

const names = Object.keys(sphereLaws) as SphereLaw[];

interface Sphere {
  readonly d: number;
  readonly rho: number;
  readonly rhoS: number;
  readonly mu: number;
  readonly law: SphereLaw;
}

function fall({ d, rho, rhoS, mu, law }: Sphere): number {
  refuseBuoyant("terminal-velocity-sphere", rhoS, rho);
  const { si } = sphereLaws[law];
  const Re = fallReynolds({
    drag: (Re) => si({ Re }),
    Ar: (d * d * d * rho * (rhoS - rho) * gravity) / (mu * mu),
    onset: crisisOnset[law],
    where: "terminal-velocity-sphere",
  });
  return (Re * mu) / (rho * d);
}

/** The range of the chosen law at the velocity found; a law that was not chosen gives NaN, which is in range. */
const rangesOfLaws = Object.fromEntries(
  names.map((name) => [
    `Re of ${name}`,
    {
      of: ({ d, rho, rhoS, mu, law }: Sphere): number =>
        law === name ? (rho * fall({ d, rho, rhoS, mu, law }) * d) / mu : NaN,
      range: sphereLaws[name].inputs.Re.range ?? ([0, Infinity] as const),
      stated: true,
      note: "Reynolds number ρvd/µ at the terminal velocity",
    },
  ]),
);

/**
 * Terminal velocity of a single smooth sphere in a wide, still fluid.
 *
 * v [m/s]: (π/6) d³ (ρ_s−ρ) g = ½ ρ v² Cd(Re) πd²/4, Re = ρvd/µ, with the chosen drag law; d [m],
 * densities ρ_s, ρ [kg/m³], µ [Pa·s]. Where the law has a drag crisis, three velocities can carry one
 * weight: the lowest is given. Error: about half the law's, 2-3 % below the crisis. The velocity is
 * a slip velocity, without wall, neighbours or flow. Throws InputError for a solid lighter than the
 * fluid; 0 for one as heavy.
 */
export const terminalVelocitySphere = method({
  id: "terminal-velocity-sphere",
  revision: 1,
  family: "terminal velocity of a sphere",
  title: "Terminal velocity of a sphere",
  tex: String.raw`v:\ v=\sqrt{\frac{4\,g\,d\,(\rho_s-\rho)}{3\,C_d(\mathrm{Re})\,\rho}},\quad\mathrm{Re}=\frac{\rho vd}{\mu}`,
  source: { cite: "derivation", where: "buoyant weight equal to drag" },
  inputs: {
    d: { kind: "length", symbol: "d", note: "diameter of the sphere", possible: positive },
    rho: fluidDensity,
    rhoS: solidDensity,
    mu: fluidViscosity,
    law: { kind: oneOf(...names), note: "drag law of a sphere" },
  },
  within: rangesOfLaws,
  output: { kind: "velocity", symbol: "v_t", note: "terminal velocity (slip)" },
  compute: fall,
  uses: names.map((n) => sphereLaws[n]),
  dimensional: holdsGravity,
  checks: [
    {
      from: { cite: "coulson2002", where: "ex. 3.1, steel ball in oil" },
      basis: "published worked example",
      rows: [
        {
          given: {
            d: mm(0.4),
            rho: kgpm3(820),
            rhoS: kgpm3(7870),
            mu: cP(10),
            law: "brown-lawler-2003",
          },
          in: mmps,
          printed: "51",
          within: 0.02,
          because: "the book interpolates a table of (R'/ρu²)Re² and takes g = 9.81",
        },
      ],
    },
    {
      from: { cite: "coulson2002", where: "ex. 3.2, galena lifted at 5 mm/s" },
      basis: "published worked example",
      rows: [
        {
          given: {
            d: micrometre(37.6),
            rho: kgpm3(1000),
            rhoS: kgpm3(7500),
            mu: cP(1),
            law: "stokes-1851",
          },
          in: mmps,
          printed: "5",
          within: 3e-3,
          because: "the diameter is printed to three digits; g = 9.81",
        },
      ],
    },
    {
      from: { cite: "geankoplis1993", where: "ex. 14.3-1, oil drop in air" },
      basis: "published worked example",
      rows: [
        {
          given: {
            d: micrometre(20),
            rho: kgpm3(1.137),
            rhoS: kgpm3(900),
            mu: cP(0.019),
            law: "stokes-1851",
          },
          in: mps,
          printed: "0.0103",
        },
      ],
    },
    {
      from: { cite: "brodkey1988", where: "problem 12.12, lead shot in air" },
      basis: "published worked example",
      rows: [
        {
          given: {
            d: mm(2),
            rho: kgpm3(1.22),
            rhoS: kgpm3(11300),
            mu: cP(0.0181),
            law: "clift-grace-weber-1978",
          },
          in: mps,
          printed: "24.60",
          within: 0.02,
          because: "the answer rounds Cd to 0.40",
        },
      ],
    },
    {
      from: { cite: "fluids", where: "drag.v_terminal, Method='Haider_Levenspiel'" },
      basis: "general reference library",
      rows: [
        {
          given: {
            d: mm(25.4),
            rho: kgpm3(1000),
            rhoS: kgpm3(7850),
            mu: cP(1),
            law: "haider-levenspiel-sphere-1989",
          },
          in: mps,
          printed: "2.20179097161",
        },
      ],
    },
  ],
});
