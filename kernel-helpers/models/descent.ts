import { InputError } from "../errors/index.js";
import { FallingBody, Liquid } from "../materials/index.js";
import { model, oneOf, positive, type Value } from "../method/index.js";
import {
  diFelice,
  meanVelocity,
  pipeReynolds,
  rodLeanLimit,
  sphereLaws,
  terminalVelocitySphere,
  type SphereLaw,
} from "../physics/index.js";
import { Well } from "../well/index.js";
import { descentResults } from "./descent/descent-results.js";
import { fallTime } from "./descent/fall-time.js";
import { axisFactor, densityAlong, type LocalFlow } from "./descent/local-flow.js";
import { rodMethods, rodSlip } from "./descent/rod-slip.js";
import type { Slip } from "./descent/slip.js";
import { sphereSlip } from "./descent/sphere-slip.js";

type Section = Value<typeof Well>["sections"][number];
type Verdict = "passes" | "undecided" | "stops" | "does not fit";
interface Node extends LocalFlow, Slip {}

/**
 * One body falling against a stated flow, section by section: upflow, slip, net velocity, where it
 * stands still, when it arrives.
 *
 * U = q/A [m/s] at the rate in place q [m3/s]; net velocity = slip − U, downward positive. Two sides
 * are told: favourable (guided along the axis, in the mean flow) and unfavourable (leaning as far as
 * the bore lets it, or broadside if it can turn; in the faster flow on the axis, 1.2 times the mean in
 * turbulent and 2 in laminar flow). In a section at θ from the vertical the weight along the hole drives
 * the body, (ρ_s−ρ) g cos θ. Refuses a body wider than the bore where it is released, or lighter than
 * the liquid.
 */
export const descent = model({
  id: "descent",
  revision: 1,
  title: "Descent of one body against the flow",
  about: [
    "At each depth the body falls at its terminal slip in the bore there. The start from rest and the change at a joint are left out: they take a metre or two for a ball and up to a hundred for a long nosed bar.",
    "Favourable side: the body meets the mean flow, a long rod upright on the axis. Unfavourable side: it meets the flow on the axis (1.2 times the mean in turbulent flow, twice in laminar flow); a rod leans as far as the bore lets it, or lies across the flow if it is short enough to turn.",
    "The verdict is passes or stops only where both sides agree; otherwise it is undecided, and the shape, the guiding or a test must decide. Neither side carries the error of the drag law and the wall factor: a least net velocity within a tenth of the slip (a sixth for a rod) is near enough to go either way.",
    "The whole rate is taken to flow at every depth of the well, also below its inflow: there a body falls more easily than is told.",
    "One body alone, one liquid, steady flow. In a hole that leans only the weight along the hole drives the body; that it rides the low side, in slower flow and with friction, is left out: above 10° the result is a guide only.",
  ],
  uses: [meanVelocity, pipeReynolds, terminalVelocitySphere, diFelice, ...rodMethods],
  tolerances: {},
  inputs: {
    well: { kind: Well, note: "well" },
    liquid: { kind: Liquid, note: "liquid that flows" },
    rate: { kind: "flowRate", symbol: "q", note: "upward flow, in place", possible: positive },
    body: { kind: FallingBody, note: "falling body" },
    from: { kind: "measuredDepth", note: "depth of release" },
    law: { kind: oneOf(...(Object.keys(sphereLaws) as SphereLaw[])), note: "drag law of a ball" },
    step: { kind: "length", note: "spacing of the depths told", possible: positive },
  },
  results: descentResults,
  cautions: [
    "A body that stands still or is thrown out can strike people, the cap or the vessel above the well, and one that arches in a narrow bore can block the way for everything after it.",
  ],
  solve: ({ well, liquid, rate, body, from, law, step }, look) => {
    const { shape, material } = body;
    const start = sectionFrom(well, from);
    if (shape.widest >= start.bore)
      throw new InputError({
        code: "out-of-bounds",
        where: "descent.body",
        problem: `is ${shape.widest} m wide, and the bore of "${start.name}" is ${start.bore} m`,
        expected: "a body narrower than the bore where it is released",
      });
    const uniform = liquid.densityAlong === null && liquid.viscosityAlong === null;
    const nodes: Node[] = [];
    let couldTurn = false;
    const passages: {
      name: string;
      top: number;
      base: number;
      upflow: number;
      net: number | null;
      netLow: number | null;
      verdict: Verdict;
    }[] = [];
    for (const s of well.sections) {
      if (s.base <= from) continue;
      const top = Math.max(s.top, from);
      const upflow = meanVelocity.si({ q: rate, D: s.bore });
      if (shape.widest >= s.bore) {
        passages.push({
          name: s.name,
          top,
          base: s.base,
          upflow,
          net: null,
          netLow: null,
          verdict: "does not fit",
        });
        break;
      }
      if (shape.shape === "rod") {
        const lean = rodLeanLimit.si({ d: shape.diameter, L: shape.length, D: s.bore });
        if (couldTurn && lean < Math.PI / 2)
          look.advise(
            `the rod can turn over above "${s.name}" but not in it: it may arrive across the hole and lodge on its top`,
          );
        couldTurn = lean === Math.PI / 2;
      }
      if (s.inclination > Math.PI / 18)
        look.advise(
          `"${s.name}" leans more than 10°: a body there rides the low side, and this result is a guide only`,
        );
      const n = uniform ? 1 : Math.max(1, Math.ceil((s.base - top) / step));
      const here = Array.from({ length: n + 1 }, (_, i): Node => {
        const flow = localFlow(s, top + ((s.base - top) * i) / n);
        if (material.density < flow.rho)
          throw new InputError({
            code: "out-of-bounds",
            where: "descent.body.material.density",
            problem: `is ${material.density} kg/m3, and the liquid at ${flow.depth} m has ${flow.rho} kg/m3: the body rises`,
            expected: "a body of at least the liquid's density",
          });
        const rhoS = densityAlong(material.density, flow);
        const slip =
          shape.shape === "sphere"
            ? sphereSlip({ d: shape.diameter, rhoS, law }, flow, look)
            : rodSlip({ d: shape.diameter, L: shape.length, nose: shape.nose, rhoS }, flow, look);
        return { ...flow, ...slip };
      });
      const least = Math.min(...here.map((k) => k.favourable - k.U));
      const leastLow = Math.min(...here.map((k) => k.unfavourable - k.U));
      passages.push({
        name: s.name,
        top,
        base: s.base,
        upflow: Math.max(...here.map((k) => k.U)),
        net: least,
        netLow: leastLow,
        verdict: leastLow > 0 ? "passes" : least > 0 ? "undecided" : "stops",
      });
      nodes.push(...(uniform ? spread(here, step) : here));
    }

    function localFlow(s: Section, depth: number): LocalFlow {
      const rho = liquid.densityAt(depth);
      const mu = liquid.viscosityAt(depth);
      const U = look(meanVelocity, { q: rate, D: s.bore }, depth);
      const Re = look(pipeReynolds, { v: U, D: s.bore, rho, mu }, depth);
      return { depth, D: s.bore, rho, mu, U, axis: axisFactor(Re), theta: s.inclination };
    }
    const [first] = nodes;
    if (first && first.unfavourable <= first.U)
      look.advise(
        first.favourable <= first.U
          ? "where it is released the flow is at least as fast as the body falls: it does not stand still there but is carried up"
          : "where it is released the flow is, on the unfavourable side, at least as fast as the body falls: it may be carried up",
      );
    return told(nodes, passages);
  },
});

function sectionFrom(well: Value<typeof Well>, from: number): Section {
  const found = well.sections.find((s) => from >= s.top && from < s.base);
  if (found) return found;
  throw new InputError({
    code: "outside",
    where: "descent.from",
    problem: `cannot be ${from} m`,
    expected: `a depth in the well, from ${well.top} m to above ${well.base} m`,
  });
}

/** The same values at depths `step` apart: where nothing changes within a section, one evaluation serves. */
function spread([a, b]: readonly Node[], step: number): Node[] {
  if (!a || !b) return [];
  const n = Math.max(1, Math.ceil((b.depth - a.depth) / step));
  return Array.from({ length: n + 1 }, (_, i) => ({
    ...a,
    depth: a.depth + ((b.depth - a.depth) * i) / n,
  }));
}

function told<P extends { readonly verdict: Verdict }>(
  nodes: readonly Node[],
  passages: readonly P[],
) {
  const depth = nodes.map((k) => k.depth);
  const net = nodes.map((k) => k.favourable - k.U);
  const netLow = nodes.map((k) => k.unfavourable - k.U);
  const high = fallTime(depth, net);
  const low = fallTime(depth, netLow);
  const blocked = passages.at(-1)?.verdict === "does not fit";
  const end = depth.at(-1) ?? 0;
  const leastNetLow = Math.min(...netLow);
  const along = (value: readonly number[]) => ({ depth, value });
  return {
    upflow: along(nodes.map((k) => k.U)),
    slip: along(nodes.map((k) => k.favourable)),
    slipLow: along(nodes.map((k) => k.unfavourable)),
    net: along(net),
    netLow: along(netLow),
    verdict: verdictOf(high.time !== null && !blocked, low.time !== null && !blocked),
    leastNet: Math.min(...net),
    leastNetLow,
    leastAt: depth[netLow.indexOf(leastNetLow)] ?? end,
    standsAt: high.standsAt ?? (blocked ? end : null),
    standsAtLow: low.standsAt ?? (blocked ? end : null),
    time: blocked ? null : high.time,
    timeLow: blocked ? null : low.time,
    arrival: high.arrival,
    arrivalLow: low.arrival,
    passages,
  };
}
const verdictOf = (favourable: boolean, unfavourable: boolean): "passes" | "undecided" | "stops" =>
  unfavourable && favourable ? "passes" : favourable || unfavourable ? "undecided" : "stops";
