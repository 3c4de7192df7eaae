import { risingRoot } from "../rising-root.js";

export interface Fall {
  /** Drag coefficient at a Reynolds number. */
  readonly drag: (Re: number) => number;
  /** Archimedes number d³ρ(ρ_s−ρ)g/µ² of the sphere of equal volume. */
  readonly Ar: number;
  /** Reynolds number where the drag force first stops rising; none when infinite. */
  readonly onset: number;
  readonly where: string;
}

/** The lowest Reynolds number at which drag carries the weight: Cd Re² = (4/3) Ar. */
export function fallReynolds({ drag, Ar, onset, where }: Fall): number {
  if (Ar === 0) return 0;
  const f = (Re: number): number => drag(Re) * Re * Re;
  const target = (4 / 3) * Ar;
  // A start within 2 % from creeping flow to the crisis (a rational fit to a standard sphere): no
  // result depends on its coefficients.
  const y = Math.sqrt(Math.sqrt(Ar));
  const over = 18 + y * (-0.9723 + y * (0.99768 + y * (-0.031084 + y * 0.0019298)));
  const overRise = y * (-0.9723 + y * (2 * 0.99768 + y * (3 * -0.031084 + y * 4 * 0.0019298)));
  const under = 1 + y * (-0.021206 + y * 0.0031459);
  const underRise = y * (-0.021206 + y * 2 * 0.0031459);
  return risingRoot({
    f,
    target,
    guess: (Ar * under) / over,
    rise: 1 / (1 - 0.25 * (overRise / over - underRise / under)),
    limit: onset < Infinity && target <= f(onset) ? onset : Infinity,
    where,
  });
}
