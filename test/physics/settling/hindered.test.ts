import { describe, expect, it } from "vitest";
import {
  hinderedVelocity,
  khanRichardson,
  richardsonZaki,
  rowe,
} from "../../../kernel-helpers/physics/settling/index.js";
import { m, mps } from "../../../kernel-helpers/units/index.js";

const wide = { d: m(1e-12), D: m(1) };

describe("the exponent of hindered settling", () => {
  it("never rises with the Reynolds number by the smooth laws", () => {
    let last = [9, 9];
    for (let w = -3; w < 5; w += 0.05) {
      const Re = 10 ** w;
      const now = [
        rowe.si({ Re, Ar: 0, d: 1e-9, D: 1 }),
        khanRichardson.si({ Re, Ar: Re, d: 1e-9, D: 1 }),
      ];
      expect(now[0]).toBeLessThan(last[0] ?? 0);
      expect(now[1]).toBeLessThan(last[1] ?? 0);
      last = now;
    }
  });
  it("steps by less than 5 % at the limits of the piecewise law in a wide bore", () => {
    for (const Re of [0.2, 1, 200, 500]) {
      const below = richardsonZaki({ Re: Re * (1 - 1e-9), Ar: 1, ...wide });
      const above = richardsonZaki({ Re: Re * (1 + 1e-9), Ar: 1, ...wide });
      expect(Math.abs(above / below - 1)).toBeLessThan(0.05);
    }
  });
  it("is higher in a narrow bore by both laws that know the wall", () => {
    const narrow = { d: m(0.1), D: m(1) };
    expect(richardsonZaki({ Re: 10, Ar: 400, ...narrow })).toBeGreaterThan(
      richardsonZaki({ Re: 10, Ar: 400, ...wide }),
    );
    expect(khanRichardson({ Re: 10, Ar: 400, ...narrow })).toBeGreaterThan(
      khanRichardson({ Re: 10, Ar: 400, ...wide }),
    );
  });
  it("stays between 2.4 and 4.8 by Khan and Richardson in any bore", () => {
    for (const k of [0.01, 0.04, 0.1, 0.3, 0.45, 0.6, 0.99])
      for (const Ar of [0.1, 1e2, 1e4, 1e8]) {
        const n = khanRichardson({ Re: 1, Ar, d: m(k), D: m(1) });
        expect(n).toBeGreaterThanOrEqual(2.4);
        expect(n).toBeLessThanOrEqual(4.8);
      }
  });
  it("carries a finding above d/D 0.2", () => {
    for (const law of [richardsonZaki, rowe, khanRichardson])
      expect(law.findings({ Re: 10, Ar: 400, d: m(0.3), D: m(1) }).map((f) => f.group)).toEqual([
        "d/D",
      ]);
  });
});

describe("the hindered velocity", () => {
  it("is that of one grain when there is but one, and falls with more", () => {
    const at = (eps: number) => hinderedVelocity({ v: mps(0.4), eps, n: 2.4 });
    expect(at(1 - 1e-12)).toBeCloseTo(0.4, 10);
    expect(at(0.8)).toBeLessThan(at(0.9));
  });
});
