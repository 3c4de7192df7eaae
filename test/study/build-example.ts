import { Study } from "../../kernel-helpers/study/index.js";
import { cP, kgpm3, mm, mMD, MPa } from "../../kernel-helpers/units/index.js";
import { Fluid, outflow, reynolds, Section } from "./example.js";

/** One study that uses every way of recording. */
export function buildExample(id = "example") {
  const s = new Study({
    id,
    title: "A small example",
    number: "EX-001",
    revision: "A",
    purpose: "To record something of every kind.",
    decision: "None: it is a test.",
    prepared: "analyst",
    disclaimer: "Invented data.",
  });
  const inputs = s.section("inputs", "Inputs");
  const pr = inputs.given("pr", 42, MPa, {
    source: "wireline survey",
    symbol: "p_r",
    spread: { low: 40, high: 44, says: "gauge" },
  });
  const rho = inputs.given("rho", 850, kgpm3, { source: "sample" });
  const shoe = inputs.given("shoe", 1450, mMD, { source: "tally" });
  const bore = inputs.assumed("bore", 152.4, mm, {
    reason: "caliper missing",
    verify: { how: "run a caliper", by: "wireline engineer" },
  });
  const oil = s.entity("oil", Fluid, { density: rho, viscosity: cP(5) });
  const work = s.section("work", "Work", "What follows from the inputs.");
  const q = work.run("q", outflow, {
    hole: { sections: [Section({ base: mMD(3000), bore: mm(216.8) }), { base: mMD(3640), bore }] },
    fluid: oil,
    inflow: { pressure: pr, index: 1e-8 },
    exit: "seabed",
  });
  const Re = work.step("Re", reynolds, {
    v: q.at("speed"),
    D: bore,
    density: oil.at("density"),
    viscosity: oil.at("viscosity"),
  });
  const double = work.formula("double", "2 * v", { v: q.at("speed") }, "velocity");
  work.compare("d1", q.at("speed"), double, { because: "It must be one more of itself." });
  const fast = work.check("fast", q.at("speed"), "at least", double, { because: "no reason" });
  const isFast = work.check("is-fast", q.at("verdict"), "is", "fast", { because: "it should be" });
  work.table("t", { caption: "Pressure", columns: [{ head: "pressure", of: q.at("pressure") }] });
  work.caution("care", "This is a test.");
  const sentence = s.conclude("c", { checks: [fast, isFast] });
  sentence`At the shoe the pressure is ${q.at("pressure").at(shoe)}; Re is ${Re}.`;
  return { s, pr, rho, shoe, bore, oil, q, Re, double, fast, isFast };
}
