import type { Value } from "../../method/index.js";
import { Grade, Liquid } from "../../materials/index.js";
import { InputError } from "../../errors/index.js";
import { dixonSpheres, packLaws, packWeightGradient, type PackLaw } from "../../physics/index.js";
import { Well } from "../../well/index.js";

/** Longest piece over which properties are taken as even [m]. */
const PIECE = 25;

/** A piece of a pack: one bore, one voidage, even fluid properties. SI. */
export interface Piece {
  readonly name: string;
  readonly top: number;
  readonly base: number;
  readonly area: number;
  readonly bore: number;
  readonly theta: number;
  readonly eps: number;
  readonly rho: number;
  readonly mu: number;
}
export interface PackColumn {
  readonly pieces: readonly Piece[];
  readonly d: number;
  readonly rhoS: number;
}
export interface PackPlace {
  readonly well: Value<typeof Well>;
  readonly liquid: Value<typeof Liquid>;
  readonly grade: Value<typeof Grade>;
  readonly voidage: number | null;
  readonly base: number;
}

/** The pieces of a pack from its top down to its base. */
export function packColumn(place: PackPlace, top: number): PackColumn {
  const { well, liquid, grade, base } = place;
  const d = grade.diameter;
  const pieces = well.sections.flatMap((s): Piece[] => {
    const from = Math.max(s.top, top);
    const to = Math.min(s.base, base);
    if (to <= from) return [];
    if (d >= s.bore)
      throw new InputError({
        code: "out-of-bounds",
        where: "grade.diameter",
        problem: `is ${d} m, and the bore of "${s.name}" is ${s.bore} m`,
        expected: "grains narrower than the bore they lie in",
      });
    const eps = place.voidage ?? dixonSpheres.si({ d, D: s.bore });
    const n = Math.ceil((to - from) / PIECE);
    return Array.from({ length: n }, (_, i): Piece => {
      const a = from + ((to - from) * i) / n;
      const b = from + ((to - from) * (i + 1)) / n;
      return {
        name: s.name,
        top: a,
        base: b,
        area: s.area,
        bore: s.bore,
        theta: s.inclination,
        eps,
        rho: liquid.densityAt((a + b) / 2),
        mu: liquid.viscosityAt((a + b) / 2),
      };
    });
  });
  return { pieces, d, rhoS: grade.material.density };
}

/** Dynamic pressure gradient in a piece at a flow rate [Pa/m]. */
export const pieceGradient = (law: PackLaw, p: Piece, d: number, q: number): number =>
  packLaws[law].si({ u: q / p.area, d, eps: p.eps, rho: p.rho, mu: p.mu, D: p.bore });

/** Gradient that the buoyant weight of a piece can hold [Pa/m]. */
export const pieceWeight = (p: Piece, rhoS: number): number =>
  packWeightGradient.si({ eps: p.eps, rho: p.rho, rhoS, theta: p.theta });

/** Pressure a pack takes from the flow at a rate [Pa]. */
export const packDrop = (law: PackLaw, { pieces, d }: PackColumn, q: number): number =>
  pieces.reduce((sum, p) => sum + pieceGradient(law, p, d, q) * (p.base - p.top), 0);

/** The most a pack can bring: its buoyant weight along the hole over the bore [Pa]. */
export const packWeight = ({ pieces, rhoS }: PackColumn): number =>
  pieces.reduce((sum, p) => sum + pieceWeight(p, rhoS) * (p.base - p.top), 0);

export const packMass = ({ pieces, rhoS }: PackColumn): number =>
  pieces.reduce((sum, p) => sum + p.area * (p.base - p.top) * (1 - p.eps) * rhoS, 0);

/**
 * How far the pack is from lifting at a rate: the least, over all depths, of the grain stress
 * Σ(w−G)L from the free top down, as a share of the weight above. Wall friction gets no credit:
 * without a cap a cohesionless pack unravels from its top. Negative where it lifts.
 */
export function holdMargin(
  law: PackLaw,
  column: PackColumn,
  q: number,
): { margin: number; depth: number } {
  let stress = 0;
  let weight = 0;
  let least = { margin: Infinity, depth: column.pieces[0]?.top ?? 0 };
  for (const p of column.pieces) {
    const w = pieceWeight(p, column.rhoS);
    const length = p.base - p.top;
    stress += (w - pieceGradient(law, p, column.d, q)) * length;
    weight += w * length;
    const margin = weight > 0 ? stress / weight : -Infinity;
    if (margin < least.margin) least = { margin, depth: p.base };
  }
  return least;
}
