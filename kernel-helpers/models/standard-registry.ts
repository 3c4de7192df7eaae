import type { Struct, Use } from "../method/index.js";
import { FallingBody, Grade, Liquid, Rod, SolidMaterial, Sphere } from "../materials/index.js";
import { methods } from "../physics/index.js";
import { BoreSection, Well } from "../well/index.js";
import { models } from "./registry.js";

/** Everything a record of this version can have used. */
export const standardRegistry: readonly (Use | Struct)[] = [
  ...methods,
  ...models,
  Liquid,
  SolidMaterial,
  Sphere,
  Rod,
  FallingBody,
  Grade,
  BoreSection,
  Well,
];
