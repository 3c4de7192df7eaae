import { describe, expect, it } from "vitest";
import * as c from "../../kernel-helpers/units/catalogue.js";
import { displayUnit, siUnit } from "../../kernel-helpers/units/display.js";
import { kinds, type Kind } from "../../kernel-helpers/units/kinds.js";
import { allUnits } from "../../kernel-helpers/units/lookup.js";

const allKinds = Object.keys(kinds) as Kind[];

describe("displayUnit", () => {
  it("gives a unit of the kind, in both systems and at every size", () => {
    for (const kind of allKinds)
      for (const system of ["SI", "field"] as const)
        for (const size of [0, 1e-9, 0.3, 1, -50, 1e5, 1e12, NaN, Infinity]) {
          const u = displayUnit(kind, system, size);
          expect([kind, system, size, u.kind]).toEqual([kind, system, size, kind]);
          expect(allUnits).toContain(u);
        }
  });
  it.each([
    ["length", "SI", 0.2, c.mm],
    ["length", "SI", 0.5, c.m],
    ["length", "SI", -3000, c.m],
    ["length", "field", 0.244, c.inch],
    ["length", "field", 3, c.ft],
    ["time", "SI", 90, c.sec],
    ["time", "SI", 600, c.minute],
    ["time", "field", 3600 * 3, c.hour],
    ["time", "SI", 86400 * 3, c.day],
    ["pressure", "SI", 3e7, c.MPa],
    ["pressure", "field", 3e7, c.psia],
    ["pressureDifference", "SI", 2e4, c.deltaKPa],
    ["pressureDifference", "SI", -2e6, c.deltaMPa],
    ["temperature", "SI", 400, c.degC],
    ["temperature", "field", 400, c.degF],
    ["density", "SI", 1200, c.kgpm3],
    ["density", "field", 1200, c.ppg],
    ["flowRate", "field", 1, c.bblpday],
    ["standardLiquidRate", "field", 1, c.STBpday],
    ["standardGasRate", "SI", 10, c.gasSm3pday],
    ["standardGasRate", "field", 10, c.MMscfpday],
    ["standardGasRate", "field", 1e-3, c.scfpday],
    ["mass", "SI", 5000, c.tonne],
    ["permeability", "field", 1e-13, c.mD],
  ] as const)("%s in %s at %d", (kind, system, size, unit) => {
    expect(displayUnit(kind, system, size)).toBe(unit);
  });
  it("keeps what the kinds keep apart: gas from liquid, measured from vertical", () => {
    expect(displayUnit("measuredDepth", "field", 1).symbol).toBe("ft MD");
    expect(displayUnit("verticalDepth", "field", 1).symbol).toBe("ft TVD");
    expect(displayUnit("measuredDepth", "SI", 1).symbol).toBe("m MD");
    expect(displayUnit("standardLiquidRate", "SI", 1).symbol).toBe("Sm³/d");
  });
});

describe("siUnit", () => {
  it.each(allKinds)("%s has one, that can be looked up", (kind) => {
    const u = siUnit(kind);
    expect([u.kind, u.scale, u.offset]).toEqual([kind, 1, 0]);
    expect(allUnits).toContain(u);
  });
});
