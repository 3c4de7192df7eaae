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
  /** Place of its bore section in the well. */
  readonly section: number;
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
  /** Whether the voidage is the analyst's and not Dixon's. */
  readonly isVoidageStated: boolean;
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
  const rhoS = grade.material.density;
  const pieces = well.sections.flatMap((s, section): Piece[] => {
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
      const rho = liquid.densityAt((a + b) / 2);
      if (rhoS <= rho)
        throw new InputError({
          code: "out-of-bounds",
          where: "grade.material.density",
          problem: `is ${rhoS} kg/m3, and the liquid in "${s.name}" has ${rho} kg/m3: the grains do not sink`,
          expected: "grains denser than the liquid they lie in",
        });
      return {
        name: s.name,
        section,
        top: a,
        base: b,
        area: s.area,
        bore: s.bore,
        theta: s.inclination,
        eps,
        rho,
        mu: liquid.viscosityAt((a + b) / 2),
      };
    });
  });
  return { pieces, d, rhoS, isVoidageStated: place.voidage !== null };
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

interface GrainStress {
  readonly depth: number;
  /** Σ(w−G)L from the free top down to this depth [Pa]. */
  readonly stress: number;
  /** ΣwL above this depth [Pa]. */
  readonly weight: number;
}

/**
 * Grain stress at the base of each piece at a rate. Within a piece it goes on a straight line, so its
 * least value is at an end. It carries over a change of bore: a shoulder takes no share of it.
 */
function grainStress(law: PackLaw, { pieces, d, rhoS }: PackColumn, q: number): GrainStress[] {
  let stress = 0;
  let weight = 0;
  return pieces.map((p) => {
    const w = pieceWeight(p, rhoS);
    const length = p.base - p.top;
    stress += (w - pieceGradient(law, p, d, q)) * length;
    weight += w * length;
    return { depth: p.base, stress, weight };
  });
}

/** Margins this close are one: a pack in an even bore is as near to lifting at every depth. */
const SAME_MARGIN = 1e-12;

/**
 * How far the pack is from lifting at a rate: the least, over all depths, of the grain stress
 * Σ(w−G)L from the free top down, as a share of the weight above. Wall friction gets no credit:
 * without a cap a cohesionless pack unravels from its top. Negative where it lifts. Of equal margins
 * the deepest is told.
 */
export const holdMargin = (
  law: PackLaw,
  column: PackColumn,
  q: number,
): { margin: number; depth: number } =>
  grainStress(law, column, q).reduce(
    (least, { depth, stress, weight }) => {
      const margin = stress / weight;
      return margin <= least.margin + SAME_MARGIN
        ? { margin: Math.min(margin, least.margin), depth }
        : least;
    },
    { margin: Infinity, depth: column.pieces[0]?.top ?? 0 },
  );

/** What a flow makes of a pack: what it takes from the flow, and down to where it is lifted. */
export interface PackLoad {
  /** Pressure taken from the flow [Pa]. */
  readonly taken: number;
  /** Base of the lifted part [m]; null while all of it rests. */
  readonly liftedTo: number | null;
}

/**
 * A pack at a rate, each grain in the bore where it lay. All above the depth of the least grain stress,
 * where that is below nothing, is lifted and loads the flow with its whole weight; what lies below rests
 * and takes the drag: ΣwL + ΣGL = Σ GL (all) + the least stress. It never falls as the rate rises.
 */
export function packLoad(law: PackLaw, column: PackColumn, q: number): PackLoad {
  const drop = packDrop(law, column, q);
  const least = grainStress(law, column, q).reduce<GrainStress | null>(
    (low, s) => (s.stress < (low?.stress ?? 0) ? s : low),
    null,
  );
  return least
    ? { taken: drop + least.stress, liftedTo: least.depth }
    : { taken: drop, liftedTo: null };
}
