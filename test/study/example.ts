import {
  entity,
  list,
  method,
  model,
  oneOf,
  positive,
  profile,
  type MethodFacts,
} from "../../kernel-helpers/method/index.js";
import type { Registry } from "../../kernel-helpers/study/index.js";

// A small world of declarations, so that the study is tested apart from the physics.

export const Fluid = entity({
  id: "test-fluid",
  revision: 1,
  title: "Fluid",
  fields: {
    density: { kind: "density", symbol: String.raw`\rho`, note: "density", possible: positive },
    viscosity: {
      kind: "viscosity",
      symbol: String.raw`\mu`,
      note: "viscosity",
      possible: positive,
    },
  },
  build: (f) => ({ ...f, headOver: (height: number) => f.density * 9.80665 * height }),
});
export const Section = entity({
  id: "test-section",
  revision: 1,
  title: "Section",
  fields: {
    base: { kind: "measuredDepth", note: "depth of its base" },
    bore: { kind: "length", note: "bore", possible: positive },
  },
  build: (f) => f,
});
export const Hole = entity({
  id: "test-hole",
  revision: 1,
  title: "Hole",
  fields: { sections: { kind: list(Section), note: "from the top" } },
  build: (f) => ({ ...f, base: Math.max(...f.sections.map((s) => s.base)) }),
});
export const Inflow = entity({
  id: "test-inflow",
  revision: 1,
  title: "Inflow",
  fields: {
    pressure: { kind: "pressure", note: "reservoir pressure" },
    index: { kind: "dimensionless", note: "m3/s per Pa" },
  },
  build: (f) => f,
});
export const reynolds = method({
  id: "test-reynolds",
  revision: 1,
  family: "test",
  title: "Reynolds number",
  tex: String.raw`\frac{\rho v D}{\mu}`,
  source: { cite: "derivation", where: "definition" },
  inputs: {
    v: { kind: "velocity", symbol: "v", note: "velocity" },
    D: { kind: "length", symbol: "D", note: "bore", possible: positive },
    density: { kind: "density", symbol: String.raw`\rho`, note: "density", possible: positive },
    viscosity: {
      kind: "viscosity",
      symbol: String.raw`\mu`,
      note: "viscosity",
      possible: positive,
    },
  },
  within: {
    Re: {
      of: ({ v, D, density, viscosity }) => (density * v * D) / viscosity,
      range: [1, 1000],
      stated: true,
    },
  },
  output: { kind: "dimensionless", symbol: String.raw`\mathrm{Re}`, note: "Reynolds number" },
  compute: ({ v, D, density, viscosity }) => (density * v * D) / viscosity,
  checks: [],
});
export const outflow = model({
  id: "test-outflow",
  revision: 1,
  title: "Outflow",
  about: ["A straight line from reservoir to exit."],
  uses: [reynolds as unknown as MethodFacts],
  tolerances: {},
  inputs: {
    hole: { kind: Hole, note: "hole" },
    fluid: { kind: Fluid, note: "fluid" },
    inflow: { kind: Inflow, note: "inflow" },
    exit: { kind: oneOf("air", "seabed"), note: "exit" },
  },
  results: {
    rate: { kind: "flowRate", note: "rate" },
    speed: { kind: "velocity", note: "in the first section" },
    pressure: { kind: profile("pressure"), note: "along the hole" },
    verdict: { kind: oneOf("fast", "slow"), note: "how fast" },
  },
  solve: ({ hole, fluid, inflow, exit }, look) => {
    const top = exit === "seabed" ? 2e6 : 1e5;
    const drive = inflow.pressure - top - fluid.headOver(hole.base);
    if (drive <= 0) return { stop: "no-flow", because: "the column outweighs the reservoir" };
    const bore = hole.sections[0]?.bore ?? NaN;
    const rate = inflow.index * drive;
    const speed = rate / ((Math.PI / 4) * bore ** 2);
    for (const s of hole.sections)
      look(
        reynolds,
        { v: speed, D: s.bore, density: fluid.density, viscosity: fluid.viscosity },
        s.base,
      );
    look.diagnose("passes", 1);
    const depth = [0, ...hole.sections.map((s) => s.base)];
    return {
      rate,
      speed,
      pressure: { depth, value: depth.map((z) => top + fluid.headOver(z)) },
      verdict: speed > 1 ? "fast" : "slow",
    };
  },
});
export const registry: Registry = [Fluid, Section, Hole, Inflow, reynolds, outflow];
