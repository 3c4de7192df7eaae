import { anyOf, entity } from "../method/index.js";
import { Rod, Sphere } from "./shapes.js";
import { SolidMaterial } from "./solid-material.js";

/** One object that is to fall against the flow: what it is made of, and its shape. */
export const FallingBody = entity({
  id: "falling-body",
  revision: 1,
  title: "Falling body",
  fields: {
    material: { kind: SolidMaterial, note: "what it is made of" },
    shape: { kind: anyOf(Sphere, Rod), note: "its shape and size" },
  },
  build: (f) => ({ ...f, mass: f.material.density * f.shape.volume }),
});
