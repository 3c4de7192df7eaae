import { entity, positive, text } from "../method/index.js";

/** What a falling body or a grain is made of: its density [kg/m3], and where the number comes from. */
export const SolidMaterial = entity({
  id: "solid-material",
  revision: 1,
  title: "Solid material",
  fields: {
    name: { kind: text, note: "what it is" },
    density: {
      kind: "density",
      symbol: String.raw`\rho_s`,
      note: "density of the solid",
      possible: positive,
    },
    source: { kind: text, note: "where the density comes from" },
  },
  build: (f) => f,
});
