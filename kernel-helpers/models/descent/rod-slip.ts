import type { Look } from "../../method/index.js";
import {
  diFelice,
  freeRodHoelzerSommerfeld,
  leaningRodProjectedArea,
  rodLaminarVelocity,
  rodLeanLimit,
  rodTurbulentVelocity,
} from "../../physics/index.js";
import type { LocalFlow } from "./local-flow.js";
import type { Slip } from "./slip.js";

export interface RodBody {
  readonly d: number;
  readonly L: number;
  readonly nose: "flat" | "rounded";
  readonly rhoS: number;
}
export const rodMethods = [
  rodLeanLimit,
  rodLaminarVelocity,
  rodTurbulentVelocity,
  leaningRodProjectedArea,
  freeRodHoelzerSommerfeld,
] as const;

/** A rod: guided by the bore when it is too long to turn over, otherwise free to lie across the flow. */
export function rodSlip(body: RodBody, at: LocalFlow, look: Look): Slip {
  const lean = look(rodLeanLimit, { d: body.d, D: at.D, L: body.L }, at.depth);
  return lean < Math.PI / 2 ? guided(body, at, lean, look) : free(body, at, look);
}

/**
 * Favourable: upright on the axis, the slower of the exact laminar solution (no end losses) and the
 * balance with end losses, of which each leaves out what the other has. Unfavourable: at the largest
 * lean, with its whole projected side against the flow on the axis. That is more than cross-flow drag and
 * friction at the touching ends together: sin t > sin³ t + f sin² t cos t for a friction f of up to 0.3
 * and a lean below 73°.
 */
function guided({ d, L, nose, rhoS }: RodBody, at: LocalFlow, lean: number, look: Look): Slip {
  const { D, rho, mu, U, axis, depth } = at;
  const upright = { d, D, L, rho, rhoS, mu, nose, J: U };
  const laminar = rodLaminarVelocity.si(upright);
  const balance = rodTurbulentVelocity.si(upright);
  // Ranges are noted for the one that rules.
  const v = look(laminar < balance ? rodLaminarVelocity : rodTurbulentVelocity, upright, depth);
  const leaning = look(
    leaningRodProjectedArea,
    { d, D, L, rho, rhoS, mu, nose, J: axis * U, lean },
    depth,
  );
  return { favourable: v + U, unfavourable: Math.min(v, leaning) + U };
}

/**
 * A rod short enough to turn falls broadside once inertia matters; end-on is the most it can do. The
 * wall is counted as for a ball of the same projected area.
 */
function free({ d, L, rhoS }: RodBody, at: LocalFlow, look: Look): Slip {
  const { D, rho, mu, U, axis, depth } = at;
  const fall = (attitude: "axial" | "broadside", width: number): number => {
    const v = look(freeRodHoelzerSommerfeld, { d, L, rho, rhoS, mu, attitude }, depth);
    return v * look(diFelice, { d: width, D, Re: (rho * v * width) / mu }, depth);
  };
  look.advise(
    "the rod is short enough to turn over: the wall is counted as for a ball of the same projected area",
  );
  const across = fall("broadside", Math.sqrt((4 * L * d) / Math.PI));
  return {
    favourable: Math.max(fall("axial", d), across),
    unfavourable: across - (axis - 1) * U,
  };
}
