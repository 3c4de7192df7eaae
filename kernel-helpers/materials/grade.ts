import { entity, positive } from "../method/index.js";
import { SolidMaterial } from "./solid-material.js";

/** Round grains of one size that make a pack. */
export const Grade = entity({
  id: "grade",
  revision: 1,
  title: "Grade of grains",
  fields: {
    material: { kind: SolidMaterial, note: "what the grains are made of" },
    diameter: {
      kind: "length",
      symbol: "d",
      note: "grain diameter (surface-volume mean)",
      possible: positive,
    },
  },
  build: (f) => ({
    ...f,
    grainMass: (f.material.density * Math.PI * f.diameter ** 3) / 6,
  }),
});
