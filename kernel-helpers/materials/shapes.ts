import { entity, oneOf, positive } from "../method/index.js";

/** A ball. */
export const Sphere = entity({
  id: "sphere",
  revision: 1,
  title: "Sphere",
  fields: {
    diameter: { kind: "length", symbol: "d", note: "diameter", possible: positive },
  },
  build: (f) => ({
    ...f,
    shape: "sphere" as const,
    volume: (Math.PI / 6) * f.diameter ** 3,
    widest: f.diameter,
  }),
});

/** A round bar, flat at its upper end; the nose points down. */
export const Rod = entity({
  id: "rod",
  revision: 1,
  title: "Rod",
  fields: {
    diameter: { kind: "length", symbol: "d", note: "diameter", possible: positive },
    length: { kind: "length", symbol: "L", note: "length", possible: positive },
    nose: { kind: oneOf("flat", "rounded"), note: "form of the lower end" },
  },
  build: (f) => ({
    ...f,
    shape: "rod" as const,
    // The rounded nose takes less than d/3 of solid length away: counted as a full cylinder.
    volume: (Math.PI / 4) * f.diameter ** 2 * f.length,
    widest: f.diameter,
  }),
});
