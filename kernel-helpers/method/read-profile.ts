import { InputError } from "../errors/index.js";
import type { Along } from "./descriptors.js";
import type { Kind, Quantity } from "../units/index.js";

/** Linear between the depths of a profile; where two values share a depth, the upper one. */
export function readProfile<K extends Kind>(
  { depth, value }: Along<K>,
  at: number,
  where: string,
): Quantity<K> {
  if (at === depth[0]) return value[0] as Quantity<K>;
  const i = depth.findIndex((d, k) => k > 0 && at <= d);
  const [a, b, va, vb] = [depth[i - 1], depth[i], value[i - 1], value[i]];
  if (a === undefined || b === undefined || va === undefined || vb === undefined || at < a)
    throw new InputError({
      code: "outside",
      where,
      problem: `has no value at a measured depth of ${at} m`,
      expected: `a depth from ${depth[0] ?? "?"} m to ${depth.at(-1) ?? "?"} m`,
    });
  return (va + ((vb - va) * (at - a)) / (b - a)) as Quantity<K>;
}
