/** The flow at one depth that a body meets. SI. */
export interface LocalFlow {
  readonly depth: number;
  /** Bore [m]. */
  readonly D: number;
  readonly rho: number;
  readonly mu: number;
  /** Mean upward velocity [m/s]. */
  readonly U: number;
  /** Velocity on the axis over the mean. */
  readonly axis: number;
  /** Inclination from the vertical [rad]. */
  readonly theta: number;
}

/**
 * The density of a solid [kg/m3] whose buoyant weight is what a body of density ρ_s has along a hole at θ
 * from the vertical: ρ + (ρ_s−ρ) cos θ. Weight enters the laws of falling by ρ_s−ρ alone.
 */
export const densityAlong = (rhoS: number, { rho, theta }: LocalFlow): number =>
  theta === 0 ? rhoS : rho + (rhoS - rho) * Math.cos(theta);

/**
 * Velocity on the axis of a pipe over the mean: 2 in laminar flow (exact, Poiseuille), about 1.2 in
 * turbulent flow (common practice, no source). Between Re 2300 and 4000 the velocity on the axis itself
 * goes on a straight line, so that it never falls as the flow rises.
 */
export function axisFactor(Re: number): number {
  if (Re <= LAMINAR) return 2;
  if (Re >= TURBULENT) return 1.2;
  const share = (Re - LAMINAR) / (TURBULENT - LAMINAR);
  return (2 * LAMINAR * (1 - share) + 1.2 * TURBULENT * share) / Re;
}
const LAMINAR = 2300;
const TURBULENT = 4000;
