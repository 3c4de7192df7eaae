/** Exponents of mass, length, time and temperature. */
export type Dimension = readonly [M: number, L: number, T: number, K: number];

/**
 * The kinds of quantity, each with its SI unit, its dimension and the words an error message uses.
 * Kinds of one dimension are kept apart where a mix-up costs a well: depth along the hole and
 * vertical depth, absolute pressure and a difference, a temperature and a difference, a rate in
 * place and a rate at standard conditions. Absolute pressure is in Pa, temperature in K.
 */
export const kinds = {
  dimensionless: { si: "1", dimension: [0, 0, 0, 0], words: "a dimensionless number" },
  angle: { si: "rad", dimension: [0, 0, 0, 0], words: "an angle" },
  length: { si: "m", dimension: [0, 1, 0, 0], words: "a length" },
  measuredDepth: { si: "m", dimension: [0, 1, 0, 0], words: "a measured depth (along the hole)" },
  verticalDepth: { si: "m", dimension: [0, 1, 0, 0], words: "a true vertical depth" },
  area: { si: "m2", dimension: [0, 2, 0, 0], words: "an area" },
  volume: { si: "m3", dimension: [0, 3, 0, 0], words: "a volume" },
  mass: { si: "kg", dimension: [1, 0, 0, 0], words: "a mass" },
  time: { si: "s", dimension: [0, 0, 1, 0], words: "a time" },
  frequency: { si: "1/s", dimension: [0, 0, -1, 0], words: "a rate per time" },
  velocity: { si: "m/s", dimension: [0, 1, -1, 0], words: "a velocity" },
  acceleration: { si: "m/s2", dimension: [0, 1, -2, 0], words: "an acceleration" },
  force: { si: "N", dimension: [1, 1, -2, 0], words: "a force" },
  power: { si: "W", dimension: [1, 2, -3, 0], words: "a power" },
  density: { si: "kg/m3", dimension: [1, -3, 0, 0], words: "a density" },
  viscosity: { si: "Pa s", dimension: [1, -1, -1, 0], words: "a dynamic viscosity" },
  surfaceTension: { si: "N/m", dimension: [1, 0, -2, 0], words: "a surface tension" },
  pressure: { si: "Pa", dimension: [1, -1, -2, 0], words: "an absolute pressure" },
  pressureDifference: { si: "Pa", dimension: [1, -1, -2, 0], words: "a pressure difference" },
  pressureGradient: { si: "Pa/m", dimension: [1, -2, -2, 0], words: "a pressure gradient" },
  temperature: { si: "K", dimension: [0, 0, 0, 1], words: "a temperature" },
  temperatureDifference: {
    si: "K",
    dimension: [0, 0, 0, 1],
    words: "a temperature difference",
  },
  flowRate: { si: "m3/s", dimension: [0, 3, -1, 0], words: "a volume rate in place" },
  standardLiquidRate: {
    si: "m3/s",
    dimension: [0, 3, -1, 0],
    words: "a liquid rate at standard conditions",
  },
  standardGasRate: {
    si: "m3/s",
    dimension: [0, 3, -1, 0],
    words: "a gas rate at standard conditions",
  },
  massRate: { si: "kg/s", dimension: [1, 0, -1, 0], words: "a mass rate" },
  permeability: { si: "m2", dimension: [0, 2, 0, 0], words: "a permeability" },
} as const satisfies Record<string, { si: string; dimension: Dimension; words: string }>;

export type Kind = keyof typeof kinds;

export const isKind = (x: unknown): x is Kind => typeof x === "string" && Object.hasOwn(kinds, x);
