import { describe, expect, it } from "vitest";
import * as c from "../../kernel-helpers/units/catalogue.js";
import { allUnits, unitOf } from "../../kernel-helpers/units/lookup.js";
import { codeOf } from "../code-of.js";

describe("unitOf", () => {
  it("finds every unit by its kind and symbol", () => {
    for (const u of allUnits) expect(unitOf(u.kind, u.symbol, "record")).toBe(u);
  });
  it("tells units of one symbol apart by their kind", () => {
    expect(unitOf("pressure", "MPa", "x")).toBe(c.MPa);
    expect(unitOf("pressureDifference", "MPa", "x")).toBe(c.deltaMPa);
    expect(unitOf("temperatureDifference", "°F", "x")).toBe(c.deltaF);
  });
  it("takes what can be typed for a symbol", () => {
    expect(unitOf("density", "kg/m3", "x")).toBe(c.kgpm3);
    expect(unitOf("viscosity", "Pa s", "x")).toBe(c.Pas);
    expect(unitOf("length", "\u03bcm", "x")).toBe(c.micrometre);
    expect(unitOf("length", " m ", "x")).toBe(c.m);
  });
  it("refuses another symbol, naming those of the kind", () => {
    const act = (): unknown => unitOf("density", "sg", "mud.csv, column 2");
    expect(codeOf(act)).toBe("unknown-unit");
    expect(act).toThrow(
      'mud.csv, column 2: "sg" is not a unit of density; expected one of kg/m³, g/cm³, lbm/US gal, lbm/ft³',
    );
  });
  it("tells the case of letters apart", () => {
    expect(codeOf(() => unitOf("pressure", "mPa", "x"))).toBe("unknown-unit");
    expect(codeOf(() => unitOf("permeability", "md", "x"))).toBe("unknown-unit");
  });
});
