import {
  carbonSteel,
  FallingBody,
  Grade,
  Liquid,
  Rod,
  Sphere,
} from "../../kernel-helpers/materials/index.js";
import { cP, deg, inch, kgpm3, m, mMD } from "../../kernel-helpers/units/index.js";
import { BoreSection, Well } from "../../kernel-helpers/well/index.js";

export const bore = inch("6.094");
export const liquid = Liquid({ name: "oil", density: kgpm3(700), viscosity: cP(0.9) });
export const water = Liquid({ name: "water", density: kgpm3(1000), viscosity: cP(1) });

/** One straight bore from the top down. */
export const pipe = (length: number, D = bore as number, theta = 0) =>
  Well({
    sections: [
      BoreSection({
        name: "pipe",
        wall: "casing",
        top: mMD(0),
        base: mMD(length),
        bore: m(D),
        inclination: deg(theta),
      }),
    ],
  });
/** A wide bore above a narrow one. */
export const tapered = Well({
  sections: [
    BoreSection({
      name: "casing",
      wall: "casing",
      top: mMD(0),
      base: mMD(1000),
      bore: inch("8.681"),
      inclination: deg(0),
    }),
    BoreSection({
      name: "liner",
      wall: "liner",
      top: mMD(1000),
      base: mMD(1500),
      bore,
      inclination: deg(0),
    }),
  ],
});
/** A narrow bore above a wide one: a liner above a hole that has washed out. */
export const washed = Well({
  sections: [
    BoreSection({
      name: "liner",
      wall: "liner",
      top: mMD(0),
      base: mMD(1000),
      bore,
      inclination: deg(0),
    }),
    BoreSection({
      name: "washed hole",
      wall: "open hole",
      top: mMD(1000),
      base: mMD(1500),
      bore: m(0.3),
      inclination: deg(0),
    }),
  ],
});
export const ball = (d: number) =>
  FallingBody({ material: carbonSteel, shape: Sphere({ diameter: m(d) }) });
export const rod = (d: number, L: number, nose: "flat" | "rounded" = "flat") =>
  FallingBody({ material: carbonSteel, shape: Rod({ diameter: m(d), length: m(L), nose }) });
export const grade = (d: number) => Grade({ material: carbonSteel, diameter: m(d) });
