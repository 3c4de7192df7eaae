import { InputError } from "../errors/index.js";
import { entity, notNegative, oneOf, optional, positive, text } from "../method/index.js";
import type { Quantity } from "../units/index.js";

/** A length of hole with one bore and one inclination. */
export const BoreSection = entity({
  id: "bore-section",
  revision: 1,
  title: "Bore section",
  fields: {
    name: { kind: text, note: "what it is called" },
    wall: { kind: oneOf("casing", "liner", "open hole"), note: "what the wall is" },
    top: { kind: "measuredDepth", note: "depth of its top", possible: notNegative },
    base: { kind: "measuredDepth", note: "depth of its base", possible: positive },
    bore: { kind: "length", symbol: "D", note: "inside diameter", possible: positive },
    inclination: {
      kind: "angle",
      symbol: String.raw`\theta`,
      note: "from the vertical, mean over the section",
      possible: { from: 0, below: Math.PI / 2 },
    },
    roughness: {
      kind: optional("length"),
      symbol: String.raw`\epsilon`,
      note: "absolute roughness of the wall",
      possible: notNegative,
    },
  },
  build: (f) => {
    if (f.base <= f.top)
      throw new InputError({
        code: "empty-section",
        where: `bore-section "${f.name}"`,
        problem: `its base at ${f.base} m is not below its top at ${f.top} m`,
        expected: "a base deeper than the top",
      });
    return {
      ...f,
      length: (f.base - f.top) as Quantity<"length">,
      area: ((Math.PI / 4) * f.bore ** 2) as Quantity<"area">,
    };
  },
});
