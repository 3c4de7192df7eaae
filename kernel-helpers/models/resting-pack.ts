import { InputError } from "../errors/index.js";
import { model } from "../method/index.js";
import { dixonSpheres, packLaws, packWeightGradient } from "../physics/index.js";
import { packColumn } from "./pack/pack-column.js";
import { packInputs } from "./pack/pack-inputs.js";
import { packOutcome, RATE_TOLERANCE } from "./pack/pack-outcome.js";
import { packResults } from "./pack/pack-results.js";

/**
 * A pack of round grains at rest between two depths: what it takes from the flow, what flow remains for
 * a driving pressure, whether its own weight holds it, and what it weighs.
 *
 * Σ G(q/A)L + Δp_rest(q) = Δp_0 for the flow q [m3/s], with G the chosen law of the pack [Pa/m] and
 * Δp_rest = Δp_0 (q/q_0)^n, n = 1 or 2. It holds where Σ(w−G)L ≥ 0 from the free top down to every
 * depth, w = (1−ε)(ρ_s−ρ)g cos θ. Where it lifts, the part above the depth of the least stress takes ΣwL
 * instead. Refuses a base or top outside the well, grains wider than a bore or no denser than the liquid.
 */
export const restingPack = model({
  id: "resting-pack",
  revision: 1,
  title: "A pack at rest against the flow",
  about: [
    "The loss of the pack and that of the rest of the path share the driving pressure; the rest takes the whole of it at the clear rate, and goes with the rate as stated (linear or quadratic).",
    "The pack holds where the grains still press on each other at every depth, counted from its free top down: buoyant weight along the hole less the drag of the flow. Wall friction gets no credit, since a pack with a free top unravels from there.",
    "At a change of bore the stress between the grains carries over; a shoulder that takes a share of it would leave less to hold the narrower part.",
    "Where it lifts, all above the depth of the least stress is carried by the flow and loads it with its whole buoyant weight, and what lies below stays. The flow told for that state holds only while every grain stays in the bore where it lay: grains that rise into a wider bore, or out of the well, load the flow less, and more of it remains.",
    "One grade of round grains, one liquid, no flow beside the pack, one-dimensional along the hole.",
  ],
  uses: [...Object.values(packLaws), packWeightGradient, dixonSpheres],
  tolerances: { rate: RATE_TOLERANCE },
  inputs: {
    ...packInputs,
    top: { kind: "measuredDepth", note: "depth of the top of the pack" },
  },
  results: packResults,
  cautions: [
    "A pack throttles a well; it does not kill it. While grains lie on a flowing well the flow, the pressure and the pack must be watched, and what follows it must be ready.",
  ],
  solve: ({ well, liquid, grade, base, top, voidage, law, drive, clearRate, rest }, look) => {
    if (!(top >= well.top && top < base && base <= well.base))
      throw new InputError({
        code: "outside",
        where: "resting-pack.top, resting-pack.base",
        problem: `a pack from ${top} m to ${base} m does not lie in the well`,
        expected: `a top above its base, both from ${well.top} m to ${well.base} m`,
      });
    const column = packColumn({ well, liquid, grade, voidage, base }, top);
    return packOutcome({ law, drive, clearRate, rest }, column, grade.grainMass, look);
  },
});
