import { InputError } from "../errors/index.js";
import * as bed from "./bed/index.js";
import * as counterflow from "./counterflow/index.js";
import * as drag from "./drag/index.js";
import * as packing from "./packing/index.js";
import * as pipe from "./pipe-flow/index.js";
import * as settling from "./settling/index.js";
import type { AnyMethod } from "./any-method.js";
import * as wall from "./wall/index.js";

/** Every method of physics, by topic. */
export const methods: readonly AnyMethod[] = [
  pipe.meanVelocity,
  pipe.annulusMeanVelocity,
  pipe.pipeReynolds,
  pipe.laminarFriction,
  pipe.haaland,
  pipe.colebrookWhite,
  pipe.churchill,
  pipe.frictionalGradient,
  drag.stokes,
  drag.schillerNaumann,
  drag.cliftGauvin,
  drag.haiderLevenspielSphere,
  drag.brownLawler,
  drag.cliftGraceWeber,
  drag.morrison,
  drag.hoelzerSommerfeld,
  drag.axialCylinder,
  drag.broadsideCylinder,
  settling.terminalVelocitySphere,
  settling.freeRodNewton,
  settling.freeRodHoelzerSommerfeld,
  settling.richardsonZaki,
  settling.rowe,
  settling.khanRichardson,
  settling.hinderedVelocity,
  wall.diFelice,
  wall.habermanSayre,
  wall.francis,
  wall.munroe,
  counterflow.rodLaminarVelocity,
  counterflow.rodLaminarStall,
  counterflow.rodTurbulentVelocity,
  counterflow.rodTurbulentStall,
  counterflow.rodLeanLimit,
  counterflow.leaningRodProjectedArea,
  counterflow.leaningRodCrossFlow,
  packing.dixonSpheres,
  packing.dixonCylinders,
  packing.benyahiaOneill,
  packing.zouYuLoose,
  packing.zouYuDense,
  bed.ergun,
  bed.macdonald,
  bed.carman,
  bed.kta,
  bed.erdim,
  bed.eisfeldSpheres,
  bed.eisfeldAll,
  bed.packWeightGradient,
  bed.liftVelocity,
  bed.wenYu,
];

const byId = new Map(methods.map((m) => [m.id, m]));

/** The method of an id. Throws InputError `unknown-method`. */
export function methodById(id: string): AnyMethod {
  const found = byId.get(id);
  if (found) return found;
  throw new InputError({
    code: "unknown-method",
    where: id,
    problem: "is not the id of a method",
    expected: "an id of the registry of physics",
  });
}
