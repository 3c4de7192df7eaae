import { entity, optional, positive, profile, readProfile, text } from "../method/index.js";
import type { Quantity } from "../units/index.js";

/**
 * One liquid: density [kg/m3] and dynamic viscosity [Pa s], the same everywhere unless a profile along
 * the hole is given, which then rules: it must cover every depth where the liquid is asked for.
 */
export const Liquid = entity({
  id: "liquid",
  revision: 1,
  title: "Liquid",
  fields: {
    name: { kind: text, note: "what it is" },
    density: { kind: "density", symbol: String.raw`\rho`, note: "density", possible: positive },
    viscosity: {
      kind: "viscosity",
      symbol: String.raw`\mu`,
      note: "dynamic viscosity",
      possible: positive,
    },
    densityAlong: {
      kind: optional(profile("density")),
      note: "density by measured depth",
      possible: positive,
    },
    viscosityAlong: {
      kind: optional(profile("viscosity")),
      note: "viscosity by measured depth",
      possible: positive,
    },
  },
  build: (f) => ({
    ...f,
    densityAt: (depth: number): Quantity<"density"> =>
      f.densityAlong ? readProfile(f.densityAlong, depth, "liquid.densityAlong") : f.density,
    viscosityAt: (depth: number): Quantity<"viscosity"> =>
      f.viscosityAlong
        ? readProfile(f.viscosityAlong, depth, "liquid.viscosityAlong")
        : f.viscosity,
  }),
});
