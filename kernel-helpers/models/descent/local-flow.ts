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
 * Velocity on the axis of a pipe over the mean: 2 in laminar flow (exact, Poiseuille), about 1.2 in
 * turbulent flow (common practice), and between 2300 and 4000 on a straight line from one to the other.
 */
export function axisFactor(Re: number): number {
  if (Re <= 2300) return 2;
  if (Re >= 4000) return 1.2;
  return 2 - (0.8 * (Re - 2300)) / 1700;
}
