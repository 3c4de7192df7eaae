import { findRoot } from "../../numerics/index.js";
import { axialCylinder } from "../drag/axial-cylinder-table.js";
import { linearTable } from "../drag/linear-table.js";
import { gravity } from "../gravity.js";
import { refuseBuoyant, refuseTooWide } from "../refuse.js";
import type { Nose, Rod } from "./rod-inputs.js";

/** Entrance correction of a thick orifice against length over hydraulic diameter (Idelchik). */
const thickness = linearTable([
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
]);

/**
 * Loss coefficient of the two ends on the gap velocity, k² the blocked part of the bore. A thick
 * orifice in a narrow bore; in a wide one the rod's own drag is the limit, since the orifice loss per
 * blocked area grows without limit as k → 0. The factor 1 + k² takes that cap out above k of about
 * 0.4, where the orifice is the measured case. A rounded nose leaves the loss behind the blunt base, at least the
 * drag 0.2 of such a body alone.
 */
function endLoss(nose: Nose, k: number, lengthToGap: number, Cd0: number): number {
  const blocked = k ** 2;
  if (nose === "rounded") return Math.max(blocked ** 2, 0.2 * blocked);
  const orifice = 0.5 * blocked ** 0.75 + thickness(lengthToGap) * blocked ** 1.375 + blocked ** 2;
  return Math.min(orifice, Cd0 * blocked * (1 + blocked));
}

export interface RodBalance {
  /** Force of the fluid on the rod, up [N]: of the rod's velocity down and the flow up. */
  readonly drag: (v: number, J: number) => number;
  /** Buoyant weight [N]. */
  readonly weight: number;
}

/** A rod that leans: the mid-section it blocks, and the side it shows to the flow. */
export interface Lean {
  /** Area blocked at mid-length [m²]. */
  readonly blockedArea: number;
  /** Drag of the side over ½ρw|w| [m²]. */
  readonly sideDrag: number;
}

/**
 * The forces on a rod in a bore, from continuity and a momentum balance over the whole section.
 *
 * Shear on rod and bore: the larger of laminar (Fanning 16/Re) and Blasius (0.0791 Re^−0.25) on the
 * hydraulic diameter D−d, which is continuous and rises with speed, so that there is one solution.
 * They cross at Re 1187; up to 2100 the stress may be half as large again as the laminar one.
 */
export function rodBalance(where: string, rod: Rod, lean: Lean | null): RodBalance {
  const { d, D, L, rho, rhoS, mu, nose } = rod;
  refuseTooWide(where, d, D);
  refuseBuoyant(where, rhoS, rho);
  const A = (Math.PI * D ** 2) / 4;
  const Ar = (Math.PI * d ** 2) / 4;
  const k = d / D;
  const blocked = lean ? lean.blockedArea / A : k ** 2;
  const s = lean ? 1 - blocked : (1 - k) * (1 + k);
  const gap = D - d;
  const zeta = endLoss(nose, k, L / gap, axialCylinder.si({ L, d }));
  const side = lean ? lean.sideDrag : 0;
  const laminar = (8 * mu) / gap;
  const turbulent = 0.5 * rho * 0.0791 * ((rho * gap) / mu) ** -0.25;
  const stress = (u: number): number => {
    const size = Math.abs(u);
    return Math.sign(u) * Math.max(laminar * size, turbulent * size ** 1.75);
  };
  const drag = (v: number, J: number): number => {
    const relative = (J + v) / s;
    const absolute = (J + v * blocked) / s;
    const rodShear = stress(relative) * Math.PI * d * L;
    const wallShear = stress(absolute) * Math.PI * D * L;
    const loss = 0.5 * rho * relative * Math.abs(relative);
    return loss * (zeta * A + side) + ((rodShear + wallShear) * Ar) / (A * s) + rodShear;
  };
  return { drag, weight: (rhoS - rho) * gravity * L * Ar };
}

/** The rod's velocity down at a flow up: the drag rises with it, so there is one root. */
export function velocityAt(where: string, { drag, weight }: RodBalance, J: number): number {
  const excess = (v: number): number => drag(v, J) - weight;
  return rootOfRising(where, excess, Math.abs(J));
}

/** The flow up at which the rod hangs. */
export const stallFlow = (where: string, { drag, weight }: RodBalance): number =>
  weight === 0 ? 0 : rootOfRising(where, (J) => drag(0, J) - weight, 0);

function rootOfRising(where: string, f: (x: number) => number, scale: number): number {
  let high = Math.max(scale, 1e-9);
  for (let i = 0; i < 400 && f(high) < 0; i++) high *= 2;
  let low = -Math.max(scale, 1e-9);
  for (let i = 0; i < 400 && f(low) > 0; i++) low *= 2;
  return findRoot(f, low, high, { relative: 1e-13, absolute: 1e-15, where });
}
