import { InputError } from "../errors/index.js";
import { model, properFraction } from "../method/index.js";
import { findRoot } from "../numerics/index.js";
import { dixonSpheres, packLaws, packWeightGradient } from "../physics/index.js";
import { packColumn, packDrop } from "./pack/pack-column.js";
import { packInputs } from "./pack/pack-inputs.js";
import { packOutcome, RATE_TOLERANCE } from "./pack/pack-outcome.js";
import { packResults } from "./pack/pack-results.js";
import { restLoss } from "./pack/rest-of-path.js";

/** Height tolerance, as a share of the depth. */
const DEPTH_TOLERANCE = 1e-9;

/**
 * The pack that cuts the flow to a share of the clear flow: how tall, of what mass, and whether its own
 * weight holds it there.
 *
 * Finds the top where Σ G(sq_0/A)L = Δp_0 − Δp_rest(sq_0) for the share s; the rest as in the resting
 * pack. A typed stop "not enough hole" when a pack up to the top of the well takes less than that, and
 * "less than a grain" when one grain's height already takes more.
 */
export const packToCut = model({
  id: "pack-to-cut",
  revision: 1,
  title: "The pack that cuts the flow to a share",
  about: [
    "Finds the height of a resting pack at which the flow through it is the wanted share of the clear flow; everything else as for a pack at rest.",
    "If that pack would lift, the height is not a design: the flow that remains past a lifted pack is told beside it. A taller pack of the same grains leaves less flow, and may rest.",
  ],
  uses: [...Object.values(packLaws), packWeightGradient, dixonSpheres],
  tolerances: { rate: RATE_TOLERANCE, depth: DEPTH_TOLERANCE },
  inputs: {
    ...packInputs,
    share: {
      kind: "dimensionless",
      symbol: "s",
      note: "share of the clear flow that is to remain",
      possible: properFraction,
    },
  },
  results: packResults,
  cautions: [
    "A pack throttles a well; it does not kill it. While grains lie on a flowing well the flow, the pressure and the pack must be watched, and what follows it must be ready.",
  ],
  solve: ({ well, liquid, grade, base, voidage, law, drive, clearRate, rest, share }, look) => {
    if (!(base > well.top && base <= well.base))
      throw new InputError({
        code: "outside",
        where: "pack-to-cut.base",
        problem: `cannot be ${base} m`,
        expected: `a depth in the well, from ${well.top} m to ${well.base} m`,
      });
    const place = { well, liquid, grade, voidage, base };
    const q = share * clearRate;
    const wanted = drive - restLoss(rest, drive, share);
    const surplus = (top: number): number => packDrop(law, packColumn(place, top), q) - wanted;
    if (surplus(well.top) < 0)
      return {
        stop: "not-enough-hole",
        because: `a pack from ${base} m to the top of the well at ${well.top} m leaves more than the wanted share of the flow`,
      };
    const grain = base - grade.diameter;
    if (surplus(grain) > 0)
      return {
        stop: "less-than-a-grain",
        because: `one layer of ${grade.diameter} m grains already leaves less than the wanted share of the flow`,
      };
    const top = findRoot(surplus, well.top, grain, { relative: DEPTH_TOLERANCE });
    return packOutcome(
      { law, drive, clearRate, rest },
      packColumn(place, top),
      grade.grainMass,
      look,
    );
  },
});
