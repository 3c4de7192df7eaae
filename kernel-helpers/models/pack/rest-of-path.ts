import { oneOf } from "../../method/index.js";

/** How the loss of the rest of the path goes with the rate: Darcy inflow is linear, turbulent pipe flow quadratic. */
export const restLaws = oneOf("linear", "quadratic");
export type RestLaw = (typeof restLaws.among)[number];

/** Pressure that the rest of the path takes at a rate: the whole drive at the rate of the clear well [Pa]. */
export const restLoss = (rest: RestLaw, drive: number, share: number): number =>
  drive * (rest === "linear" ? share : share ** 2);

/** The share of the clear rate at which the rest of the path takes a pressure. */
export const shareAt = (rest: RestLaw, drive: number, loss: number): number => {
  const x = Math.max(loss, 0) / drive;
  return rest === "linear" ? x : Math.sqrt(x);
};
