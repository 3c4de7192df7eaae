import type { Look, Plains } from "../../method/index.js";
import { findRoot } from "../../numerics/index.js";
import { dixonSpheres, packLaws, packWeightGradient, type PackLaw } from "../../physics/index.js";
import {
  holdMargin,
  packDrop,
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

/** Flow through a resting pack: its loss and that of the rest of the path share the drive. */
export const restingRate = ({ law, drive, clearRate, rest }: Driven, column: PackColumn): number =>
  findRoot(
    (q) => packDrop(law, column, q) + restLoss(rest, drive, q / clearRate) - drive,
    0,
    clearRate,
    { relative: RATE_TOLERANCE },
  );

/** Everything told of a pack in place, with its range findings. */
export function packOutcome(
  driven: Driven,
  column: PackColumn,
  grainMass: number,
  look: Look,
): Results {
  const { law, drive, clearRate, rest } = driven;
  const { pieces, d, rhoS } = column;
  const resting = restingRate(driven, column);
  const lifted = clearRate * shareAt(rest, drive, drive - packWeight(column));
  const { margin, depth: weakest } = holdMargin(law, column, resting);
  const state = margin >= 0 ? "rests" : "lifts";
  const rate = state === "rests" ? resting : lifted;
  for (const p of pieces) {
    look(
      packLaws[law],
      { u: resting / p.area, d, eps: p.eps, rho: p.rho, mu: p.mu, D: p.bore },
      p.base,
    );
    look(packWeightGradient, { eps: p.eps, rho: p.rho, rhoS, theta: p.theta }, p.base);
    look(dixonSpheres, { d, D: p.bore }, p.base);
  }
  const gradients = pieces.map((p) => pieceGradient(law, p, d, resting));
  const weights = pieces.map((p) => pieceWeight(p, rhoS));
  if (state === "rests" && gradients.some((g, i) => g > (weights[i] ?? 0)))
    look.advise(
      "a part of the pack is held down only by what lies on it: its own weight is less than the flow's gradient there",
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

function parts(
  column: PackColumn,
  gradients: readonly number[],
  weights: readonly number[],
  q: number,
): Results["parts"] {
  const out: { -readonly [N in keyof Results["parts"][number]]: Results["parts"][number][N] }[] =
    [];
  column.pieces.forEach((p, i) => {
    const last = out.at(-1);
    if (last?.name === p.name && last.base === p.top) {
      last.base = p.base;
      return;
    }
    out.push({
      name: p.name,
      top: p.top,
      base: p.base,
      voidage: p.eps,
      velocity: q / p.area,
      gradient: gradients[i] ?? 0,
      weight: weights[i] ?? 0,
    });
  });
  return out;
}

/** A value per piece as a profile with steps at the joints. */
const along = (
  { pieces }: PackColumn,
  values: readonly number[],
): { depth: number[]; value: number[] } => ({
  depth: pieces.flatMap((p) => [p.top, p.base]),
  value: values.flatMap((v) => [v, v]),
});
