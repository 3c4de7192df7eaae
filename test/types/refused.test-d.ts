// Compiled, never run: each line after an expect-error comment must not compile, against the built
// declarations, with the compiler of the workspace and with the one inside the kernel.
import { BoreSection, Liquid, Study, Well, cP, inch, kgpm3, m, mMD, mps, mTVD, psi, degC, deltaK, ergun } from "stillwell";
import type { Quantity, Ref } from "stillwell";

type Equal<A, B> = (<T>() => T extends A ? 1 : 2) extends <T>() => T extends B ? 1 : 2 ? true : false;
const holds = <T extends true>(): T | undefined => undefined;

const s = new Study({ id: "t", title: "", number: "", revision: "", purpose: "", decision: "", prepared: "" });
const rho = s.given("rho", 850, kgpm3, { source: "sample" });
const bore = s.given("bore", "8.5", inch, { source: "tally" });
const oil = s.entity("oil", Liquid, { name: "oil", density: rho, viscosity: cP(5) });
holds<Equal<typeof rho, Ref<"density">>>();
holds<Equal<ReturnType<typeof inch>, Quantity<"length">>>();
const density = oil.at("density");
holds<Equal<typeof density, Ref<"density">>>();
const head: Quantity<"density"> = oil.value.densityAt(10);
const gradient: Quantity<"pressureGradient"> = ergun({ u: mps(1), d: m(0.01), eps: 0.4, rho: kgpm3(850), mu: cP(5), D: m(0.2) });
export const used = [head, gradient];

export const refused = (): void => {
  // @ts-expect-error a pressure for a length
  ergun({ u: mps(1), d: psi(1), eps: 0.4, rho: kgpm3(850), mu: cP(5), D: m(0.2) });
  // @ts-expect-error a bare number for a velocity
  ergun({ u: 1, d: m(1), eps: 0.4, rho: kgpm3(850), mu: cP(5), D: m(0.2) });
  // @ts-expect-error a misspelt argument in a solver
  ergun.si({ u: 1, dia: 1, eps: 0.4, rho: 850, mu: 5e-3, D: 0.2 });
  // @ts-expect-error a length reference for a density, in an entity
  s.entity("a", Liquid, { name: "x", density: bore, viscosity: cP(1) });
  // @ts-expect-error a vertical depth for a measured one
  BoreSection({ name: "x", wall: "casing", top: mTVD(0), base: mMD(10), bore: inch(8), inclination: 0 as never });
  // @ts-expect-error no such wall
  s.entity("b", BoreSection, { name: "x", wall: "brick", top: mMD(0), base: mMD(1), bore, inclination: 0 as never });
  // @ts-expect-error a liquid for a well
  s.step("c", ergun, { u: oil, d: bore, eps: 0.4, rho, mu: cP(1), D: bore });
  // @ts-expect-error a difference of temperature is not a temperature
  const t: Quantity<"temperature"> = deltaK(3);
  // @ts-expect-error null is no quantity
  const n: Quantity<"temperature"> = null;
  // @ts-expect-error a formula takes references, not bare quantities
  s.formula("d", "2*x", { x: degC(3) }, "temperature");
  // @ts-expect-error no such part
  oil.at("colour");
  // @ts-expect-error a well is made of sections
  Well({ sections: [oil] });
  void [t, n];
};
