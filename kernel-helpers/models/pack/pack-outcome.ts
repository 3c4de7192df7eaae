import type { Look, Plains } from "../../method/index.js";
import { findRoot } from "../../numerics/index.js";
import { dixonSpheres, packLaws, packWeightGradient, type PackLaw } from "../../physics/index.js";
import {
  holdMargin,
  packDrop,
  packLoad,
  packMass,
  packWeight,
  pieceGradient,
  pieceWeight,
  type PackColumn,
} from "./pack-column.js";
import type { packResults } from "./pack-results.js";
import { restLoss, shareAt, type RestLaw } from "./rest-of-path.js";

type Results = Plains<{
  readonly [N in keyof typeof packResults]: (typeof packResults)[N]["kind"];
}>;
export interface Driven {
  readonly law: PackLaw;
  readonly drive: number;
  readonly clearRate: number;
  readonly rest: RestLaw;
}

export const RATE_TOLERANCE = 1e-10;

/** The flow at which what the pack takes and the loss of the rest of the path share the drive. */
const sharedRate = ({ drive, clearRate, rest }: Driven, taken: (q: number) => number): number =>
  findRoot((q) => taken(q) + restLoss(rest, drive, q / clearRate) - drive, 0, clearRate, {
    relative: RATE_TOLERANCE,
  });

/** Everything told of a pack in place, with its range findings. */
export function packOutcome(
  driven: Driven,
  column: PackColumn,
  grainMass: number,
  look: Look,
): Results {
  const { law, drive, clearRate, rest } = driven;
  const { pieces, d, rhoS, isVoidageStated } = column;
  const resting = sharedRate(driven, (q) => packDrop(law, column, q));
  const lifted = clearRate * shareAt(rest, drive, drive - packWeight(column));
  const { margin, depth: weakest } = holdMargin(law, column, resting);
  const state = margin >= 0 ? "rests" : "lifts";
  const rate =
    state === "rests" ? resting : sharedRate(driven, (q) => packLoad(law, column, q).taken);
  for (const p of pieces) {
    look(
      packLaws[law],
      { u: resting / p.area, d, eps: p.eps, rho: p.rho, mu: p.mu, D: p.bore },
      p.base,
    );
    look(packWeightGradient, { eps: p.eps, rho: p.rho, rhoS, theta: p.theta }, p.base);
    if (!isVoidageStated) look(dixonSpheres, { d, D: p.bore }, p.base);
  }
  const gradients = pieces.map((p) => pieceGradient(law, p, d, resting));
  const weights = pieces.map((p) => pieceWeight(p, rhoS));
  if (state === "rests" && gradients.some((g, i) => g > (weights[i] ?? 0)))
    look.advise(
      "a part of the pack is held down only by what lies on it: its own weight is less than the flow's gradient there",
    );
  const liftedTo = state === "lifts" ? packLoad(law, column, rate).liftedTo : null;
  if (liftedTo !== null && liftedTo < (pieces.at(-1)?.base ?? 0))
    look.advise(
      `only the part above ${Number(liftedTo.toFixed(1))} m lifts at the flow that remains; what lies below it stays`,
    );
  const top = pieces[0]?.top ?? 0;
  const base = pieces.at(-1)?.base ?? 0;
  const mass = packMass(column);
  return {
    top,
    height: base - top,
    rate,
    share: rate / clearRate,
    restingRate: resting,
    liftedRate: lifted,
    drop: packDrop(law, column, resting),
    weight: packWeight(column),
    state,
    margin,
    weakest,
    liftRate: liftRate(law, column, clearRate),
    mass,
    count: mass / grainMass,
    parts: parts(column, gradients, weights, resting),
    gradient: along(column, gradients),
    weightGradient: along(column, weights),
  };
}

/** The least rate at which some part of the pack is no longer held down. */
function liftRate(law: PackLaw, column: PackColumn, scale: number): number {
  const held = (q: number): number => holdMargin(law, column, q).margin;
  let high = scale;
  while (held(high) > 0) high *= 2;
  return findRoot(held, 0, high, { relative: RATE_TOLERANCE });
}

/** The pieces of each bore section as one part, its gradients the means over its length. */
function parts(
  { pieces }: PackColumn,
  gradients: readonly number[],
  weights: readonly number[],
  q: number,
): Results["parts"] {
  return [...new Set(pieces.map((p) => p.section))].flatMap((section) => {
    const own = pieces.flatMap((p, i) =>
      p.section === section ? [{ p, G: gradients[i] ?? 0, w: weights[i] ?? 0 }] : [],
    );
    const [first] = own;
    const last = own.at(-1);
    if (!first || !last) return [];
    const { name, top, eps, area } = first.p;
    const base = last.p.base;
    const mean = (of: (piece: (typeof own)[number]) => number): number =>
      own.reduce((sum, k) => sum + of(k) * (k.p.base - k.p.top), 0) / (base - top);
    return [
      {
        name,
        top,
        base,
        voidage: eps,
        velocity: q / area,
        gradient: mean((k) => k.G),
        weight: mean((k) => k.w),
      },
    ];
  });
}

/** A value per piece as a profile with steps at the joints. */
const along = (
  { pieces }: PackColumn,
  values: readonly number[],
): { depth: number[]; value: number[] } => ({
  depth: pieces.flatMap((p) => [p.top, p.base]),
  value: values.flatMap((v) => [v, v]),
});
