import { unit } from "./unit.js";

// Factors are exact. lb = 0.45359237 kg, ft = 0.3048 m, in = 0.0254 m, US gallon = 231 in3,
// petroleum barrel = 42 US gallons, lbf = lb x 9.80665 m/s2 (NIST SP 811, appendix B).
const SI = "SI" as const;
const NIST = "NIST SP 811, app. B" as const;
const LB = 0.45359237;
const FT = 0.3048;
const INCH = 0.0254;
const GALLON = 231 * INCH ** 3;
const BARREL = 42 * GALLON;
const PSI = (LB * 9.80665) / INCH ** 2;
const ATM = 101325;
const DAY = 86400;

export const fraction = unit({ kind: "dimensionless", symbol: "1", scale: 1, source: SI });
export const percent = unit({ kind: "dimensionless", symbol: "%", scale: 0.01, source: SI });

export const rad = unit({ kind: "angle", symbol: "rad", scale: 1, source: SI });
export const deg = unit({ kind: "angle", symbol: "°", scale: Math.PI / 180, source: SI });

export const m = unit({ kind: "length", symbol: "m", scale: 1, source: SI });
export const mm = unit({ kind: "length", symbol: "mm", scale: 1e-3, source: SI });
export const cm = unit({ kind: "length", symbol: "cm", scale: 1e-2, source: SI });
export const micrometre = unit({ kind: "length", symbol: "µm", scale: 1e-6, source: SI });
export const ft = unit({ kind: "length", symbol: "ft", scale: FT, source: NIST });
export const inch = unit({ kind: "length", symbol: "in", scale: INCH, source: NIST });

export const mMD = unit({ kind: "measuredDepth", symbol: "m MD", scale: 1, source: SI });
export const ftMD = unit({ kind: "measuredDepth", symbol: "ft MD", scale: FT, source: NIST });
export const mTVD = unit({ kind: "verticalDepth", symbol: "m TVD", scale: 1, source: SI });
export const ftTVD = unit({ kind: "verticalDepth", symbol: "ft TVD", scale: FT, source: NIST });

export const m2 = unit({ kind: "area", symbol: "m²", scale: 1, source: SI });
export const mm2 = unit({ kind: "area", symbol: "mm²", scale: 1e-6, source: SI });
export const in2 = unit({ kind: "area", symbol: "in²", scale: INCH ** 2, source: NIST });

export const m3 = unit({ kind: "volume", symbol: "m³", scale: 1, source: SI });
export const litre = unit({ kind: "volume", symbol: "L", scale: 1e-3, source: SI });
export const bbl = unit({ kind: "volume", symbol: "bbl", scale: BARREL, source: NIST });
export const usGal = unit({ kind: "volume", symbol: "US gal", scale: GALLON, source: NIST });

export const kg = unit({ kind: "mass", symbol: "kg", scale: 1, source: SI });
export const tonne = unit({ kind: "mass", symbol: "t", scale: 1000, source: SI });
export const lbm = unit({ kind: "mass", symbol: "lbm", scale: LB, source: NIST });

export const sec = unit({ kind: "time", symbol: "s", scale: 1, source: SI });
export const minute = unit({ kind: "time", symbol: "min", scale: 60, source: SI });
export const hour = unit({ kind: "time", symbol: "h", scale: 3600, source: SI });
export const day = unit({ kind: "time", symbol: "d", scale: DAY, source: SI });

export const perSecond = unit({ kind: "frequency", symbol: "1/s", scale: 1, source: SI });

export const mps = unit({ kind: "velocity", symbol: "m/s", scale: 1, source: SI });
export const mmps = unit({ kind: "velocity", symbol: "mm/s", scale: 1e-3, source: SI });
export const ftps = unit({ kind: "velocity", symbol: "ft/s", scale: FT, source: NIST });

export const mps2 = unit({ kind: "acceleration", symbol: "m/s²", scale: 1, source: SI });

export const newton = unit({ kind: "force", symbol: "N", scale: 1, source: SI });
export const kN = unit({ kind: "force", symbol: "kN", scale: 1e3, source: SI });
export const lbf = unit({ kind: "force", symbol: "lbf", scale: LB * 9.80665, source: NIST });

export const watt = unit({ kind: "power", symbol: "W", scale: 1, source: SI });
export const kW = unit({ kind: "power", symbol: "kW", scale: 1e3, source: SI });
export const hp = unit({
  kind: "power",
  symbol: "hp",
  scale: 550 * FT * LB * 9.80665,
  source: NIST,
});

export const kgpm3 = unit({ kind: "density", symbol: "kg/m³", scale: 1, source: SI });
export const gpcm3 = unit({ kind: "density", symbol: "g/cm³", scale: 1000, source: SI });
export const ppg = unit({
  kind: "density",
  symbol: "lbm/US gal",
  scale: LB / GALLON,
  source: NIST,
});
export const pcf = unit({ kind: "density", symbol: "lbm/ft³", scale: LB / FT ** 3, source: NIST });

export const Pas = unit({ kind: "viscosity", symbol: "Pa·s", scale: 1, source: SI });
export const cP = unit({ kind: "viscosity", symbol: "cP", scale: 1e-3, source: NIST });

export const Npm = unit({ kind: "surfaceTension", symbol: "N/m", scale: 1, source: SI });
export const dynpcm = unit({ kind: "surfaceTension", symbol: "dyn/cm", scale: 1e-3, source: NIST });

// Absolute pressure. `psi` is `psia`; a gauge reading is entered with `psig`, which adds one
// standard atmosphere.
export const Pa = unit({ kind: "pressure", symbol: "Pa", scale: 1, source: SI });
export const kPa = unit({ kind: "pressure", symbol: "kPa", scale: 1e3, source: SI });
export const MPa = unit({ kind: "pressure", symbol: "MPa", scale: 1e6, source: SI });
export const bar = unit({ kind: "pressure", symbol: "bar", scale: 1e5, source: SI });
export const atm = unit({ kind: "pressure", symbol: "atm", scale: ATM, source: NIST });
export const psi = unit({ kind: "pressure", symbol: "psi", scale: PSI, source: NIST });
export const psia = unit({ kind: "pressure", symbol: "psia", scale: PSI, source: NIST });
export const psig = unit({
  kind: "pressure",
  symbol: "psig",
  scale: PSI,
  offset: ATM,
  source: NIST,
});

export const deltaPa = unit({ kind: "pressureDifference", symbol: "Pa", scale: 1, source: SI });
export const deltaKPa = unit({ kind: "pressureDifference", symbol: "kPa", scale: 1e3, source: SI });
export const deltaMPa = unit({ kind: "pressureDifference", symbol: "MPa", scale: 1e6, source: SI });
export const deltaBar = unit({ kind: "pressureDifference", symbol: "bar", scale: 1e5, source: SI });
export const deltaPsi = unit({
  kind: "pressureDifference",
  symbol: "psi",
  scale: PSI,
  source: NIST,
});

export const Papm = unit({ kind: "pressureGradient", symbol: "Pa/m", scale: 1, source: SI });
export const kPapm = unit({ kind: "pressureGradient", symbol: "kPa/m", scale: 1e3, source: SI });
export const psipft = unit({
  kind: "pressureGradient",
  symbol: "psi/ft",
  scale: PSI / FT,
  source: NIST,
});

export const kelvin = unit({ kind: "temperature", symbol: "K", scale: 1, source: SI });
export const degC = unit({
  kind: "temperature",
  symbol: "°C",
  scale: 1,
  offset: 273.15,
  source: SI,
});
export const degF = unit({
  kind: "temperature",
  symbol: "°F",
  scale: 5 / 9,
  offset: (459.67 * 5) / 9,
  source: NIST,
});
export const deltaK = unit({ kind: "temperatureDifference", symbol: "K", scale: 1, source: SI });
export const deltaF = unit({
  kind: "temperatureDifference",
  symbol: "°F",
  scale: 5 / 9,
  source: NIST,
});

export const m3ps = unit({ kind: "flowRate", symbol: "m³/s", scale: 1, source: SI });
export const m3pday = unit({ kind: "flowRate", symbol: "m³/d", scale: 1 / DAY, source: SI });
export const Lpmin = unit({ kind: "flowRate", symbol: "L/min", scale: 1e-3 / 60, source: SI });
export const bblpday = unit({
  kind: "flowRate",
  symbol: "bbl/d",
  scale: BARREL / DAY,
  source: NIST,
});
export const gpm = unit({
  kind: "flowRate",
  symbol: "US gal/min",
  scale: GALLON / 60,
  source: NIST,
});
export const usGalpday = unit({
  kind: "flowRate",
  symbol: "US gal/d",
  scale: GALLON / DAY,
  source: NIST,
});

export const Sm3ps = unit({ kind: "standardLiquidRate", symbol: "Sm³/s", scale: 1, source: SI });
export const Sm3pday = unit({
  kind: "standardLiquidRate",
  symbol: "Sm³/d",
  scale: 1 / DAY,
  source: SI,
});
export const STBpday = unit({
  kind: "standardLiquidRate",
  symbol: "STB/d",
  scale: BARREL / DAY,
  source: NIST,
});
export const gasSm3ps = unit({ kind: "standardGasRate", symbol: "Sm³/s", scale: 1, source: SI });
export const gasSm3pday = unit({
  kind: "standardGasRate",
  symbol: "Sm³/d",
  scale: 1 / DAY,
  source: SI,
});
export const scfpday = unit({
  kind: "standardGasRate",
  symbol: "scf/d",
  scale: FT ** 3 / DAY,
  source: NIST,
});
// MM is a million, as the trade writes it.
export const MMscfpday = unit({
  kind: "standardGasRate",
  symbol: "MMscf/d",
  scale: (1e6 * FT ** 3) / DAY,
  source: NIST,
});

export const kgps = unit({ kind: "massRate", symbol: "kg/s", scale: 1, source: SI });
export const lbmpmin = unit({ kind: "massRate", symbol: "lbm/min", scale: LB / 60, source: NIST });

export const m2Permeability = unit({ kind: "permeability", symbol: "m²", scale: 1, source: SI });
// darcy = 1 cP x 1 cm/s per 1 atm/cm, exactly 1/101325 cm2 x 1e-3
export const mD = unit({
  kind: "permeability",
  symbol: "mD",
  scale: 1e-10 / ATM,
  source: "definition",
});
