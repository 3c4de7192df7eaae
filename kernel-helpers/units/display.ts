import * as c from "./catalogue.js";
import { kinds, type Kind } from "./kinds.js";
import { allUnits } from "./lookup.js";
import { unit, type Unit } from "./unit.js";

export type DisplaySystem = "SI" | "field";

// Per kind the units of a system, the one for large values first; `from` is the SI size above which
// it is used.
type Ladder = readonly { readonly unit: Unit<Kind>; readonly from: number }[];
const one = (unit: Unit<Kind>): Ladder => [{ unit, from: 0 }];

const si: Partial<Record<Kind, Ladder>> = {
  angle: one(c.deg),
  length: [
    { unit: c.m, from: 0.5 },
    { unit: c.mm, from: 0 },
  ],
  time: [
    { unit: c.day, from: 2 * 86400 },
    { unit: c.hour, from: 2 * 3600 },
    { unit: c.minute, from: 300 },
    { unit: c.sec, from: 0 },
  ],
  mass: [
    { unit: c.tonne, from: 1000 },
    { unit: c.kg, from: 0 },
  ],
  viscosity: one(c.cP),
  pressure: one(c.MPa),
  pressureDifference: [
    { unit: c.deltaMPa, from: 1e6 },
    { unit: c.deltaKPa, from: 0 },
  ],
  pressureGradient: one(c.kPapm),
  temperature: one(c.degC),
  flowRate: one(c.m3pday),
  standardLiquidRate: one(c.Sm3pday),
  standardGasRate: one(c.gasSm3pday),
  permeability: one(c.mD),
};
const field: Partial<Record<Kind, Ladder>> = {
  angle: one(c.deg),
  length: [
    { unit: c.ft, from: 0.6 },
    { unit: c.inch, from: 0 },
  ],
  measuredDepth: one(c.ftMD),
  verticalDepth: one(c.ftTVD),
  area: one(c.in2),
  volume: one(c.bbl),
  mass: one(c.lbm),
  time: si.time ?? one(c.sec),
  velocity: one(c.ftps),
  force: one(c.lbf),
  power: one(c.hp),
  density: one(c.ppg),
  viscosity: one(c.cP),
  surfaceTension: one(c.dynpcm),
  pressure: one(c.psia),
  pressureDifference: one(c.deltaPsi),
  pressureGradient: one(c.psipft),
  temperature: one(c.degF),
  temperatureDifference: one(c.deltaF),
  flowRate: one(c.bblpday),
  standardLiquidRate: one(c.STBpday),
  standardGasRate: [
    { unit: c.MMscfpday, from: 0.1 * c.MMscfpday.scale },
    { unit: c.scfpday, from: 0 },
  ],
  massRate: one(c.lbmpmin),
  permeability: one(c.mD),
};

/** The unit a system shows a kind in; for a list or column pass its largest value, so it has one unit. */
export function displayUnit<K extends Kind>(kind: K, system: DisplaySystem, size: number): Unit<K> {
  const ladder = (system === "field" ? field : si)[kind];
  const found = ladder?.find((step) => Math.abs(size) >= step.from)?.unit;
  return (found ?? siUnit(kind)) as Unit<K>;
}

/** The coherent SI unit of a kind. */
export function siUnit<K extends Kind>(kind: K): Unit<K> {
  const found = allUnits.find((u) => u.kind === kind && u.scale === 1 && u.offset === 0);
  return (found ?? unit({ kind, symbol: kinds[kind].si, scale: 1, source: "SI" })) as Unit<K>;
}
