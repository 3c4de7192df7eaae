import fc from "fast-check";
import { describe, expect, it } from "vitest";
import * as units from "../../kernel-helpers/units/catalogue.js";
import { kinds, type Kind } from "../../kernel-helpers/units/kinds.js";
import { allUnits } from "../../kernel-helpers/units/lookup.js";
import { inUnit, type Unit } from "../../kernel-helpers/units/unit.js";

// NIST Special Publication 811 (2008), appendix B.8, as printed there.
const printed: readonly [keyof typeof units, string, string][] = [
  ["atm", "atmosphere, standard", "1.013 25 E+05"],
  ["bar", "bar", "1.0 E+05"],
  ["bbl", "barrel [for petroleum, 42 gallons (U.S.)]", "1.589 873 E-01"],
  ["cP", "centipoise", "1.0 E-03"],
  ["mD", "darcy, a thousandth of it", "9.869 233 E-16"],
  ["day", "day", "8.64 E+04"],
  ["deg", "degree (angle)", "1.745 329 E-02"],
  ["ft", "foot", "3.048 E-01"],
  ["ftps", "foot per second", "3.048 E-01"],
  ["usGal", "gallon (U.S.)", "3.785 412 E-03"],
  ["usGalpday", "gallon (U.S.) per day", "4.381 264 E-08"],
  ["gpm", "gallon (U.S.) per minute", "6.309 020 E-05"],
  ["hp", "horsepower (550 ft·lbf/s)", "7.456 999 E+02"],
  ["hour", "hour", "3.6 E+03"],
  ["inch", "inch", "2.54 E-02"],
  ["litre", "liter", "1.0 E-03"],
  ["minute", "minute", "6.0 E+01"],
  ["lbm", "pound (avoirdupois)", "4.535 924 E-01"],
  ["pcf", "pound per cubic foot", "1.601 846 E+01"],
  ["ppg", "pound per gallon (U.S.)", "1.198 264 E+02"],
  ["lbmpmin", "pound per minute", "7.559 873 E-03"],
  ["lbf", "pound-force", "4.448 222 E+00"],
  ["psi", "pound-force per square inch", "6.894 757 E+03"],
  ["psia", "pound-force per square inch", "6.894 757 E+03"],
  ["psig", "pound-force per square inch", "6.894 757 E+03"],
  ["deltaPsi", "pound-force per square inch", "6.894 757 E+03"],
  ["in2", "square inch", "6.4516 E-04"],
  ["tonne", "ton, metric", "1.0 E+03"],
];
const numberOf = (text: string): number => Number(text.replaceAll(" ", ""));
const halfLastDigit = (text: string): number => {
  const [mantissa = "", exponent = "0"] = text.replaceAll(" ", "").split("E");
  const decimals = mantissa.split(".")[1]?.length ?? 0;
  return 0.5 * 10 ** (Number(exponent) - decimals);
};
const isClose = (x: number, y: number): boolean => Math.abs(x - y) <= 4e-16 * Math.abs(y);

describe("conversion factors", () => {
  it.each(printed)("%s: %s is %s, to the printed digits", (name, _, text) => {
    expect(Math.abs(units[name].scale - numberOf(text))).toBeLessThanOrEqual(halfLastDigit(text));
  });
  it("keep the exact definitions to rounding", () => {
    expect(isClose(inUnit(units.bbl(1), units.usGal), 42)).toBe(true);
    expect(isClose(inUnit(units.ft(1), units.inch), 12)).toBe(true);
    expect(isClose(inUnit(units.usGal(231), units.m3) * 1e6, 231 * 231 * 2.54 ** 3)).toBe(true);
    expect(isClose(inUnit(units.atm(1), units.Pa), 101325)).toBe(true);
    expect(isClose(inUnit(units.hp(1), units.watt), 745.6998715822702)).toBe(true);
    expect(isClose(units.psi.scale, 6894.757293168361)).toBe(true);
    // 1 ppg = 231/1728 of a cubic foot's worth: 1 lbm/ft3 is 0.133680555... ppg
    expect(isClose(inUnit(units.pcf(1728), units.ppg), 231)).toBe(true);
    expect(isClose(inUnit(units.bblpday(1), units.gpm) * 24 * 60, 42)).toBe(true);
    expect(isClose(inUnit(units.gpm(1), units.usGalpday), 1440)).toBe(true);
    expect(isClose(inUnit(units.psipft(1), units.Papm) * 0.3048, units.psi.scale)).toBe(true);
    expect(isClose(inUnit(units.MMscfpday(1), units.scfpday), 1e6)).toBe(true);
  });
  it("agree between kinds that share a unit", () => {
    expect(units.ftMD.scale).toBe(units.ft.scale);
    expect(units.ftTVD.scale).toBe(units.ft.scale);
    expect(units.STBpday.scale).toBe(units.bblpday.scale);
    expect(units.deltaF.scale).toBe(units.degF.scale);
    expect(units.dynpcm.scale).toBe(1e-5 / 1e-2);
  });
});

describe("temperature and gauge pressure", () => {
  // Freezing and boiling point of water, the place where both scales read -40, absolute zero.
  it.each([
    [32, 0],
    [212, 100],
    [-40, -40],
    [-459.67, -273.15],
  ])("%d °F is %d °C", (f, c) => {
    expect(units.degF(f)).toBeCloseTo(units.degC(c), 10);
    expect(inUnit(units.degC(c), units.degF)).toBeCloseTo(f, 10);
  });
  it("differences carry no offset", () => {
    expect(units.deltaF(180)).toBeCloseTo(units.deltaK(100), 12);
    expect(units.deltaPsi(0)).toBe(0);
  });
  it("zero on a gauge is one standard atmosphere", () => {
    expect(units.psig(0)).toBe(101325);
    expect(inUnit(units.psia(114.7), units.psig)).toBeCloseTo(114.7 - 14.6959, 3);
  });
});

describe("every unit", () => {
  const dimensionOfSi: { readonly [si: string]: readonly number[] } = {
    "1": [0, 0, 0, 0],
    rad: [0, 0, 0, 0],
    m: [0, 1, 0, 0],
    m2: [0, 2, 0, 0],
    m3: [0, 3, 0, 0],
    kg: [1, 0, 0, 0],
    s: [0, 0, 1, 0],
    "1/s": [0, 0, -1, 0],
    "m/s": [0, 1, -1, 0],
    "m/s2": [0, 1, -2, 0],
    N: [1, 1, -2, 0],
    W: [1, 2, -3, 0],
    "kg/m3": [1, -3, 0, 0],
    "Pa s": [1, -1, -1, 0],
    "N/m": [1, 0, -2, 0],
    Pa: [1, -1, -2, 0],
    "Pa/m": [1, -2, -2, 0],
    K: [0, 0, 0, 1],
    "m3/s": [0, 3, -1, 0],
    "kg/s": [1, 0, -1, 0],
  };
  it("has a kind whose dimension is that of its SI unit", () => {
    for (const [kind, { si, dimension }] of Object.entries(kinds))
      expect([kind, dimension]).toEqual([kind, dimensionOfSi[si] ?? `${si} is not in this table`]);
  });
  it("goes there and back without loss", () => {
    const typed = fc.double({ min: -1e9, max: 1e9, noNaN: true });
    fc.assert(
      fc.property(fc.constantFrom(...allUnits), typed, (u, x) => {
        const slack = 4e-16 * (Math.abs(x) + 2 * Math.abs(u.offset / u.scale)) + 1e-290;
        expect(Math.abs(inUnit(u(x) as never, u) - x)).toBeLessThanOrEqual(slack);
      }),
      { numRuns: 2000 },
    );
  });
  it("keeps the order of what is typed", () => {
    for (const u of allUnits) expect(u.scale).toBeGreaterThan(0);
  });
  it("has a symbol of its own within its kind, and one symbol one scale", () => {
    for (const kind of Object.keys(kinds) as Kind[]) {
      const symbols = allUnits.filter((u) => u.kind === kind).map((u) => u.symbol);
      expect([kind, new Set(symbols).size]).toEqual([kind, symbols.length]);
    }
  });
  it("is named so that no other name differs in the case of letters only", () => {
    const byName = new Map<string, [string, Unit<Kind>]>();
    const clashes: string[] = [];
    for (const [name, u] of Object.entries(units) as [string, Unit<Kind>][]) {
      const before = byName.get(name.toLowerCase());
      if (before && before[1].scale !== u.scale) clashes.push(`${before[0]} and ${name}`);
      byName.set(name.toLowerCase(), [name, u]);
    }
    expect(clashes).toEqual([]);
  });
  it("is listed for look-up", () => {
    expect(new Set(allUnits)).toEqual(new Set(Object.values(units)));
  });
});
