import { carman } from "./carman-1937.js";
import { eisfeldAll } from "./eisfeld-schnitzlein-all-2001.js";
import { eisfeldSpheres } from "./eisfeld-schnitzlein-spheres-2001.js";
import { erdim } from "./erdim-2015.js";
import { ergun } from "./ergun-1952.js";
import { kta } from "./kta-1981.js";
import { macdonald } from "./macdonald-1979.js";

/** The laws that a pack's gradient can be chosen from, by id. */
export const packLaws = {
  "ergun-1952": ergun,
  "macdonald-1979": macdonald,
  "carman-1937": carman,
  "kta-1981": kta,
  "erdim-2015": erdim,
  "eisfeld-schnitzlein-spheres-2001": eisfeldSpheres,
  "eisfeld-schnitzlein-all-2001": eisfeldAll,
} as const;

export type PackLaw = keyof typeof packLaws;
