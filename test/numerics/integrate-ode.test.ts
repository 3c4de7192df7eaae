import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  dormandPrinceAt,
  dormandPrinceStep,
} from "../../kernel-helpers/numerics/dormand-prince.js";
import { integrateOde } from "../../kernel-helpers/numerics/integrate-ode.js";
import type { OdeProblem } from "../../kernel-helpers/numerics/ode-problem.js";
import { codeOf } from "../code-of.js";

type Pair = readonly [number, number];
const oscillator: OdeProblem<Pair> = {
  rate: (_, [x, v]) => [v, -x],
  from: 0,
  to: 20,
  start: [1, 0],
  relative: 1e-9,
  absolute: 1e-9,
};
const decay: OdeProblem<readonly [number]> = {
  rate: (_, [y]) => [-y],
  from: 0,
  to: 5,
  start: [1],
  relative: 1e-8,
  absolute: 1e-12,
};

describe("integrateOde against exact solutions", () => {
  it("exponential decay", () => {
    expect(Math.abs(integrateOde(decay).end.y[0] / Math.exp(-5) - 1)).toBeLessThan(1e-7);
  });
  it("a harmonic oscillator, at every wanted place", () => {
    const at = [0, 0.3, 1, 1.0001, 7.7, 19.99, 20];
    const { points } = integrateOde({ ...oscillator, at });
    expect(points.map((p) => p.x)).toEqual(at);
    for (const { x, y } of points) {
      expect(y[0]).toBeCloseTo(Math.cos(x), 6);
      expect(y[1]).toBeCloseTo(-Math.sin(x), 6);
    }
  });
  it("a fall against quadratic drag", () => {
    const terminal = 4.2;
    const { end } = integrateOde({
      rate: (_, [v]) => [9.81 * (1 - (v / terminal) ** 2)],
      from: 0,
      to: 0.6,
      start: [0],
      relative: 1e-9,
      absolute: 1e-9,
    });
    expect(end.y[0]).toBeCloseTo(terminal * Math.tanh((9.81 * 0.6) / terminal), 7);
  });
  it("a solution of x alone is a quadrature", () => {
    const { end } = integrateOde({ ...decay, rate: (x) => [1 / (1 + x * x)], start: [0], to: 1 });
    expect(end.y[0]).toBeCloseTo(Math.PI / 4, 8);
  });
  it("returns to the start of the Arenstorf orbit after its printed period", () => {
    // Hairer, Norsett and Wanner, Solving Ordinary Differential Equations I, section II.0.
    const mu = 0.012277471;
    const start: readonly [number, number, number, number] = [0.994, 0, 0, -2.0015851063790825];
    const { end, steps } = integrateOde({
      rate: (_, [x, y, u, v]) => {
        const d1 = ((x + mu) ** 2 + y ** 2) ** 1.5;
        const d2 = ((x - 1 + mu) ** 2 + y ** 2) ** 1.5;
        return [
          u,
          v,
          x + 2 * v - ((1 - mu) * (x + mu)) / d1 - (mu * (x - 1 + mu)) / d2,
          y - 2 * u - ((1 - mu) * y) / d1 - (mu * y) / d2,
        ];
      },
      from: 0,
      to: 17.065216560157964,
      start: start,
      relative: 1e-12,
      absolute: 1e-12,
    });
    expect(end.y[0]).toBeCloseTo(0.994, 4);
    expect(end.y[1]).toBeCloseTo(0, 3);
    expect(steps).toBeLessThan(2500);
  });
});

describe("the step", () => {
  const errorOf = (h: number, part: number): number => {
    const trial = dormandPrinceStep((x, [y = 0]) => [y * Math.cos(x)], {
      x: 0.4,
      y: [Math.exp(Math.sin(0.4))],
      first: [Math.exp(Math.sin(0.4)) * Math.cos(0.4)],
      h,
    });
    const [y = NaN] = part === 1 ? trial.to : dormandPrinceAt(trial, part);
    return Math.abs(y - Math.exp(Math.sin(0.4 + part * h)));
  };
  it("errs with the sixth power of its length, and within with the fifth", () => {
    expect(Math.log2(errorOf(0.4, 1) / errorOf(0.2, 1))).toBeGreaterThan(5.6);
    expect(Math.log2(errorOf(0.4, 0.5) / errorOf(0.2, 0.5))).toBeGreaterThan(4.6);
  });
  it("joins its ends", () => {
    const trial = dormandPrinceStep((_, y) => y, { x: 0, y: [2], first: [2], h: 0.5 });
    expect(dormandPrinceAt(trial, 0)).toEqual([2]);
    expect(dormandPrinceAt(trial, 1)[0]).toBeCloseTo(trial.to[0] as number, 14);
  });
});

describe("integrateOde as a property", () => {
  it("errs less when asked to, and about as much as asked", () => {
    const errorAt = (relative: number): number =>
      Math.abs(
        integrateOde({ ...oscillator, relative, absolute: relative }).end.y[0] - Math.cos(20),
      );
    const [coarse, middle, fine] = [1e-4, 1e-6, 1e-8].map(errorAt) as [number, number, number];
    expect(coarse).toBeGreaterThan(middle);
    expect(middle).toBeGreaterThan(fine);
    expect(fine).toBeLessThan(1e-6);
  });
  it("comes back to where it began when it is run backwards", () => {
    const place = fc.double({ min: -3, max: 3, noNaN: true });
    fc.assert(
      fc.property(place, place, fc.double({ min: 0.1, max: 10, noNaN: true }), (x, v, span) => {
        const there = integrateOde({ ...oscillator, start: [x, v], to: span }).end.y;
        const back = integrateOde({ ...oscillator, start: there, from: span, to: 0 }).end;
        expect(back.x).toBe(0);
        expect(back.y[0]).toBeCloseTo(x, 5);
        expect(back.y[1]).toBeCloseTo(v, 5);
      }),
      { numRuns: 30 },
    );
  });
  it("gives the same numbers whatever places are wanted", () => {
    const plain = integrateOde(oscillator);
    const asked = integrateOde({ ...oscillator, at: [0.1, 0.2, 13] });
    expect(asked.end).toEqual(plain.end);
    expect(plain.points).toHaveLength(plain.steps + 1);
  });
  it("goes nowhere when both ends are the same", () => {
    const { end, points, steps } = integrateOde({ ...decay, to: 0, at: [0] });
    expect([end, points, steps]).toEqual([{ x: 0, y: [1] }, [{ x: 0, y: [1] }], 0]);
  });
  it("keeps each step within the longest allowed", () => {
    const { points } = integrateOde({ ...decay, largestStep: 0.05 });
    const gaps = points.slice(1).map((p, i) => p.x - (points[i] as { x: number }).x);
    expect(Math.max(...gaps)).toBeLessThanOrEqual(0.05 * (1 + 1e-9));
  });
});

describe("events", () => {
  const fall: OdeProblem<Pair> = {
    rate: (_, [, v]) => [v, -9.80665],
    from: 0,
    to: 60,
    start: [100, 20],
    relative: 1e-9,
    absolute: 1e-9,
    events: [
      { name: "top", of: (_, [, v]) => v, direction: "falling", isLast: false },
      { name: "ground", of: (_, [z]) => z, direction: "falling", isLast: true },
      { name: "upward pass", of: (_, [z]) => z - 100, direction: "rising", isLast: false },
    ],
  };
  const landing = (20 + Math.sqrt(400 + 200 * 9.80665)) / 9.80665;
  it("are located, in order, and end the run when they are last", () => {
    const { events, end, endedBy } = integrateOde(fall);
    expect(events.map((e) => e.name)).toEqual(["top", "ground"]);
    expect(events[0]?.x).toBeCloseTo(20 / 9.80665, 8);
    expect(end.x).toBeCloseTo(landing, 8);
    expect(endedBy).toBe("ground");
    expect(end.y[0]).toBeCloseTo(0, 7);
  });
  it("cut off the places wanted beyond them", () => {
    const { points } = integrateOde({ ...fall, at: [1, 2, 30, 60] });
    expect(points.map((p) => p.x)).toEqual([1, 2]);
  });
  it("are all counted when none ends the run", () => {
    const zero = { of: (_: number, [x]: Pair) => x, isLast: false };
    const { events, endedBy } = integrateOde({
      ...oscillator,
      events: [
        { ...zero, name: "any", direction: "either" },
        { ...zero, name: "up", direction: "rising" },
      ],
    });
    const passes = [1, 3, 5, 7, 9, 11].map((n) => (n * Math.PI) / 2);
    const times = (name: string): number[] => events.filter((e) => e.name === name).map((e) => e.x);
    expect(times("any")).toHaveLength(6);
    times("any").forEach((t, i) => {
      expect(t).toBeCloseTo(passes[i] as number, 6);
    });
    expect(times("up")).toHaveLength(3);
    expect(endedBy).toBeNull();
  });
  it("are found on the way back too", () => {
    const { end } = integrateOde({
      ...decay,
      from: 5,
      to: 0,
      start: [Math.exp(-5)],
      events: [{ name: "half", of: (_, [y]) => y - 0.5, direction: "either", isLast: true }],
    });
    expect(end.x).toBeCloseTo(Math.LN2, 7);
  });
});

describe("integrateOde refuses", () => {
  it("a solution that runs to infinity, saying where", () => {
    const blowUp = { ...decay, rate: (_: number, [y]: readonly [number]) => [y * y] as const };
    const act = (): unknown => integrateOde({ ...blowUp, where: "flow" });
    expect(["step-too-small", "not-finite", "too-many-steps"]).toContain(codeOf(act));
    expect(act).toThrow(/flow: .* at (0\.99|1)/);
  });
  it("a rate that is not finite at the start", () => {
    expect(codeOf(() => integrateOde({ ...decay, rate: () => [NaN] }))).toBe("not-finite");
  });
  it("to pass the edge of the domain, but cuts its steps up to it", () => {
    const edge: OdeProblem<readonly [number]> = {
      ...decay,
      rate: (x) => [x > 1 ? NaN : 1],
      start: [0],
    };
    expect(codeOf(() => integrateOde(edge))).toBe("not-finite");
    const { end } = integrateOde({ ...edge, to: 1, firstStep: 0.3 });
    expect(end.y[0]).toBeCloseTo(1, 12);
  });
  it("to work without end", () => {
    expect(codeOf(() => integrateOde({ ...oscillator, maxSteps: 10 }))).toBe("too-many-steps");
  });
  it("an event that is not a number", () => {
    const events = [{ name: "odd", of: () => NaN, direction: "either", isLast: false }] as const;
    expect(codeOf(() => integrateOde({ ...decay, events }))).toBe("not-finite");
  });
  it("a problem that is none", () => {
    const code = (wrong: Partial<OdeProblem<readonly [number]>>): string =>
      codeOf(() => integrateOde({ ...decay, ...wrong }));
    expect(code({ to: Infinity })).toBe("bad-range");
    expect(code({ start: [NaN] })).toBe("bad-start");
    expect(code({ relative: 0 })).toBe("bad-tolerance");
    expect(code({ absolute: -1 })).toBe("bad-tolerance");
    expect(code({ absolute: [1e-9, 1e-9] })).toBe("bad-tolerance");
    expect(code({ firstStep: 0 })).toBe("bad-step");
    expect(code({ at: [1, 0.5] })).toBe("bad-output");
    expect(code({ at: [6] })).toBe("bad-output");
  });
});
