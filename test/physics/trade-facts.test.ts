import { describe, expect, it } from "vitest";
import {
  diFelice,
  meanVelocity,
  munroe,
  rodLaminarVelocity,
  rodTurbulentVelocity,
  terminalVelocitySphere,
} from "../../kernel-helpers/physics/index.js";
import {
  bblpday,
  cP,
  ft,
  ftps,
  inch,
  inUnit,
  kgpm3,
  mps,
  usGalpday,
} from "../../kernel-helpers/units/index.js";

// Common practice, no source: what those who do this work know without computing.
const steel = kgpm3(7850);
const lead = kgpm3(11_340);
const water = { rho: kgpm3(1000), mu: cP(1) };

/** A sphere's slip velocity in a bore: free fall times the wall factor at the free Reynolds number. */
function ballInBore(d: number, D: number, rhoS: number, rho: number, mu: number): number {
  const v = terminalVelocitySphere.si({ d, rho, rhoS, mu, law: "brown-lawler-2003" });
  return v * diFelice.si({ d, D, Re: (rho * v * d) / mu });
}

describe("what the trade knows", () => {
  it("15 ft/s in a 7.0 inch bore is about 62 thousand barrels or 2.6 million US gallons a day", () => {
    const perRate = meanVelocity({ q: bblpday(1), D: inch(7) });
    const barrels = ftps(15) / perRate;
    expect(barrels).toBeGreaterThan(61_000);
    expect(barrels).toBeLessThan(62_500);
    const perGallon = meanVelocity({ q: usGalpday(1), D: inch(7) });
    expect(ftps(15) / perGallon / 1e6).toBeCloseTo(2.6, 1);
  });
  it("a larger steel ball falls faster than a smaller one up to 0.4 of the bore, then slower", () => {
    const D = inch(6);
    const speed = (k: number) => ballInBore(k * D, D, steel, water.rho, water.mu);
    for (let k = 0.02; k < 0.38; k += 0.02) expect(speed(k + 0.02)).toBeGreaterThan(speed(k));
    expect(speed(0.8)).toBeLessThan(speed(0.4));
    let best = 0;
    for (let k = 0.1; k < 0.9; k += 0.005) if (speed(k) > speed(best || 0.1)) best = k;
    expect(best).toBeGreaterThan(0.38);
    expect(best).toBeLessThan(0.48);
  });
  it("the fastest ball is at 0.25^(2/3) of the bore by Munroe with a steady drag coefficient", () => {
    const speed = (k: number) => Math.sqrt(k) * munroe.si({ d: k, D: 1, Re: 5000 });
    const best = 0.25 ** (2 / 3);
    expect(speed(best)).toBeGreaterThan(speed(best - 0.01));
    expect(speed(best)).toBeGreaterThan(speed(best + 0.01));
  });
  it("a rod of the same diameter falls much faster than a ball", () => {
    const { rho, mu } = water;
    for (const [d, D] of [
      [0.0254, 0.1],
      [0.05, 0.15],
      [0.05, 0.2],
    ] as const) {
      const rod = rodTurbulentVelocity.si({ d, D, L: 3, rho, rhoS: steel, mu, nose: "flat", J: 0 });
      expect(rod / ballInBore(d, D, steel, rho, mu)).toBeGreaterThan(3);
    }
  });
  it("lead falls faster than steel, as ball and as rod", () => {
    const { rho, mu } = water;
    expect(ballInBore(0.025, 0.15, lead, rho, mu)).toBeGreaterThan(
      ballInBore(0.025, 0.15, steel, rho, mu),
    );
    const rod = (rhoS: number) =>
      rodTurbulentVelocity.si({ d: 0.05, D: 0.15, L: 1, rho, rhoS, mu, nose: "flat", J: 0 });
    expect(rod(lead)).toBeGreaterThan(rod(steel));
  });
  it("a half-inch steel rod reaches the order of 10 ft/s even in thick oil in a narrow pipe", () => {
    const rod = {
      d: inch("1/2"),
      D: inch(2),
      L: ft(20),
      rho: kgpm3(900),
      rhoS: steel,
      mu: cP(200),
      nose: "flat" as const,
      J: mps(0),
    };
    for (const method of [rodLaminarVelocity, rodTurbulentVelocity]) {
      const v = inUnit(method(rod), ftps);
      expect(v).toBeGreaterThan(4);
      expect(v).toBeLessThan(25);
    }
  });
});
