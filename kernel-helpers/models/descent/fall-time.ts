export interface Fall {
  /** Depth where the net velocity first is nothing [m]; null when it reaches the last node. */
  readonly standsAt: number | null;
  /** Time to each depth reached; null when it never leaves the first node. */
  readonly arrival: { readonly depth: number[]; readonly value: number[] } | null;
  /** Time to the last node [s]; null when it does not reach it. */
  readonly time: number | null;
}

/**
 * Time to fall along nodes of depth at net downward velocities, velocity linear between nodes:
 * Δt = Δs ln(v2/v1)/(v2−v1). Where two nodes share a depth the velocity jumps. The body comes to
 * rest only in the limit of time where the velocity falls to nothing between two nodes: such a node
 * is not reached.
 */
export function fallTime(depth: readonly number[], net: readonly number[]): Fall {
  const reached: number[] = [];
  const times: number[] = [];
  let t = 0;
  for (let i = 0; i < depth.length; i += 1) {
    const v = net[i] ?? NaN;
    const s = depth[i] ?? NaN;
    const before = i > 0 ? { s: depth[i - 1] ?? NaN, v: net[i - 1] ?? NaN } : null;
    if (!(v > 0)) {
      const standsAt =
        before && before.s < s ? before.s + ((s - before.s) * before.v) / (before.v - v) : s;
      return { standsAt, arrival: asProfile(reached, times), time: null };
    }
    if (before && s > before.s) {
      const dv = v - before.v;
      t +=
        Math.abs(dv) < 1e-9 * v
          ? (s - before.s) / v
          : ((s - before.s) * Math.log(v / before.v)) / dv;
    }
    reached.push(s);
    times.push(t);
  }
  return { standsAt: null, arrival: asProfile(reached, times), time: t };
}

const asProfile = (depth: number[], value: number[]): Fall["arrival"] =>
  depth.length >= 2 ? { depth, value } : null;
