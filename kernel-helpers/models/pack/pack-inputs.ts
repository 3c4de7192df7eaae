import { oneOf, optional, positive, properFraction } from "../../method/index.js";
import { Grade, Liquid } from "../../materials/index.js";
import { packLaws, type PackLaw } from "../../physics/index.js";
import { Well } from "../../well/index.js";
import { restLaws } from "./rest-of-path.js";

export const packInputs = {
  well: { kind: Well, note: "well" },
  liquid: { kind: Liquid, note: "liquid that flows" },
  grade: { kind: Grade, note: "grains of the pack" },
  base: { kind: "measuredDepth", note: "depth of the base of the pack" },
  voidage: {
    kind: optional("dimensionless"),
    symbol: String.raw`\varepsilon`,
    note: "voidage (Dixon's, by bore, when not stated)",
    possible: properFraction,
  },
  law: {
    kind: oneOf(...(Object.keys(packLaws) as PackLaw[])),
    note: "law of the pack's resistance",
  },
  drive: {
    kind: "pressureDifference",
    symbol: String.raw`\Delta p_0`,
    note: "driving pressure of the whole path: at rest, with the hydrostatic head taken off",
    possible: positive,
  },
  clearRate: {
    kind: "flowRate",
    symbol: "q_0",
    note: "flow of the clear well, in place",
    possible: positive,
  },
  rest: { kind: restLaws, note: "how the loss of the rest of the path goes with the rate" },
} as const;
