import type { Look } from "../../method/index.js";
import { diFelice, terminalVelocitySphere, type SphereLaw } from "../../physics/index.js";
import type { LocalFlow } from "./local-flow.js";
import type { Slip } from "./slip.js";

export interface SphereBody {
  readonly d: number;
  readonly rhoS: number;
  readonly law: SphereLaw;
}

/** A ball: terminal velocity with its wall factor; on the unfavourable side it meets the flow on the axis. */
export function sphereSlip({ d, rhoS, law }: SphereBody, at: LocalFlow, look: Look): Slip {
  const { D, rho, mu, U, axis, depth } = at;
  const free = look(terminalVelocitySphere, { d, rho, rhoS, mu, law }, depth);
  const wall = look(diFelice, { d, D, Re: (rho * free * d) / mu }, depth);
  const slip = free * wall;
  return { favourable: slip, unfavourable: slip - (axis - 1) * U };
}
