import { InputError } from "../errors/index.js";

/** A body must be narrower than the bore that it is in. */
export function refuseTooWide(where: string, d: number, D: number): void {
  if (d < D) return;
  throw new InputError({
    code: "out-of-bounds",
    where: `${where}.d`,
    problem: `cannot be ${d} m in a bore of ${D} m`,
    expected: "a diameter below that of the bore",
  });
}

/** Relations for falling and resting solids hold for solids that are not lighter than the fluid. */
export function refuseBuoyant(where: string, rhoS: number, rho: number): void {
  if (rhoS >= rho) return;
  throw new InputError({
    code: "out-of-bounds",
    where: `${where}.rhoS`,
    problem: `cannot be ${rhoS} kg/m3 in a fluid of ${rho} kg/m3: the solid rises`,
    expected: "a solid density of at least that of the fluid",
  });
}
