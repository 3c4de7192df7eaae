/** The shape numbers of a flat-ended rod that a drag law for any shape asks for. */
export interface RodShape {
  /** Diameter of the sphere of equal volume [m]. */
  readonly dv: number;
  readonly psi: number;
  readonly psiPar: number;
  readonly psiPerp: number;
}

/**
 * Sphericities of a rod falling end-on or broadside. The area projected along the flow is L·d end-on;
 * broadside it is a mean over the directions across the flow, (2/π)(L·d + πd²/4).
 */
export function rodShape(d: number, L: number, attitude: "axial" | "broadside"): RodShape {
  const dv = Math.cbrt(1.5 * d ** 2 * L);
  const disc = (Math.PI * dv ** 2) / 4;
  const end = (Math.PI * d ** 2) / 4;
  const side = L * d;
  const surface = Math.PI * d * L + 2 * end;
  const isAxial = attitude === "axial";
  const along = isAxial ? side : (2 / Math.PI) * (side + end);
  return {
    dv,
    psi: (4 * disc) / surface,
    psiPar: disc / (surface / 2 - along),
    psiPerp: disc / (isAxial ? end : side),
  };
}
