import { Study, type StudyRecord } from "../../kernel-helpers/study/index.js";
import { meanVelocity, pipeReynolds, haaland } from "../../kernel-helpers/physics/index.js";
import { bblpday, cP, fraction, inch, kgpm3 } from "../../kernel-helpers/units/index.js";

/** A study of as many steps as asked for, in three kinds, each with its own input. */
export function syntheticStudy(steps: number): StudyRecord {
  const s = new Study({
    id: "synthetic",
    title: "A synthetic study",
    number: "SYN-001",
    revision: "A",
    purpose: "To measure.",
    decision: "None.",
    prepared: "bench",
  });
  const D = s.given("bore", 6, inch, { source: "made up" });
  const rho = s.given("rho", 800, kgpm3, { source: "made up" });
  const mu = s.given("mu", 1, cP, { source: "made up" });
  const eD = s.given("eD", 1e-4, fraction, { source: "made up" });
  for (let i = 0; i < steps; i += 3) {
    const q = s.given(`q${i}`, 10_000 + i, bblpday, { source: "made up" });
    const v = s.step(`v${i}`, meanVelocity, { q, D });
    const Re = s.step(`Re${i}`, pipeReynolds, { v, D, rho, mu });
    s.step(`f${i}`, haaland, { Re, eD });
  }
  return s.record();
}
