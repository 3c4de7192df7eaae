import { StillwellError, StudyError } from "../errors/index.js";
import { entityUse, oneOf, typeName, type Struct, type Type, type Use } from "../method/index.js";
import { isKind } from "../units/index.js";
import { Blocked, evaluate, type Done } from "./evaluate.js";
import { checkUse, compareUse, formulaUse } from "./inline-uses.js";
import { hasResult, isStated, type Item, type Result, type WithResult } from "./item.js";
import type { PlainJson } from "./plain.js";
import type { Body } from "./record.js";
import type { TypeJson } from "./type-json.js";

export type Registry = readonly (Use | Struct)[];

/** Relative tolerance of a replay: powers and logarithms differ in the last digits between engines. */
export const REPLAY_RELATIVE = 1e-9;
/** Absolute floor in SI, for values that are zero but for rounding. */
export const REPLAY_FLOOR = 1e-12;

/** One recorded value that came out otherwise. */
export interface Moved {
  readonly id: string;
  readonly path: string;
  readonly was: PlainJson | undefined;
  readonly now: PlainJson | undefined;
}
export interface ReplayReport {
  readonly results: ReadonlyMap<string, Result>;
  readonly moved: readonly Moved[];
  readonly failed: readonly { readonly id: string; readonly error: StillwellError }[];
  readonly compared: number;
}

/**
 * Recomputes every item of a record from its givens and assumptions, by the edges, and compares.
 * `set` replaces stated values (SI numbers, or choices) by id; then nothing is compared as equal by right.
 */
export function replay(
  body: Body,
  registry: Registry,
  set: { readonly [id: string]: number | string } = {},
): ReplayReport {
  const items = new Map(body.items.map((i) => [i.id, i]));
  const done = new Map<string, Done>();
  const open = new Set<string>();
  for (const id of Object.keys(set)) {
    const item = items.get(id);
    if (!item || !isStated(item) || item.form === "object")
      throw new StudyError({
        code: "not-found",
        where: id,
        problem: "cannot be set: it is not a stated number or choice of this record",
      });
  }
  const visit = (id: string): Done => {
    const before = done.get(id);
    if (before) return before;
    const item = items.get(id);
    if (!item || !hasResult(item))
      throw new StudyError({
        code: "not-found",
        where: id,
        problem: "is referred to but is not in the record",
      });
    if (open.has(id))
      throw new StudyError({ code: "circular", where: id, problem: "stands on itself" });
    open.add(id);
    try {
      const now = evaluateItem(item, registry, set[id], (up) => {
        const u = visit(up);
        if ("stop" in u.result) throw new Blocked(up);
        return u;
      });
      done.set(id, now);
      return now;
    } finally {
      open.delete(id);
    }
  };
  const failed: { id: string; error: StillwellError }[] = [];
  const moved: Moved[] = [];
  const results = new Map<string, Result>();
  for (const item of body.items.filter(hasResult)) {
    try {
      const { result } = visit(item.id);
      results.set(item.id, result);
      moved.push(...differences(item.id, item.result, result));
    } catch (error) {
      if (!(error instanceof StillwellError)) throw error;
      failed.push({ id: item.id, error });
    }
  }
  return { results, moved, failed, compared: results.size };
}

function evaluateItem(
  item: WithResult,
  registry: Registry,
  set: number | string | undefined,
  get: (id: string) => Done,
): Done {
  if (isStated(item) && item.form !== "object") {
    const type = liveType(item.type, registry);
    const live = set ?? item.result.value;
    return {
      type,
      live,
      result: { value: live },
      findings: [],
      looked: [],
      diagnostics: {},
    };
  }
  return evaluate(useOf(item, registry), item.id, item.args, get);
}

/** The use that an item was made with; a named error when this version does not have it, or has another revision. */
export function useOf(item: Extract<Item, { args: unknown }>, registry: Registry): Use {
  if (item.op === "formula") return formulaUse(item.id, item.text, item.kinds, item.type as never);
  if (item.op === "compare") return compareUse(item.of);
  if (item.op === "check") return checkUse(liveType(item.of, registry), item.sense);
  if (item.op === "figure")
    throw new StudyError({
      code: "no-value",
      where: item.id,
      problem: "a figure is drawn, not computed",
    });
  const found = registry.find((u) => u.id === item.use);
  if (!found)
    throw new StudyError({
      code: "unknown-method",
      where: item.id,
      problem: `uses "${item.use}", which this version does not have`,
      remedy: "replay it with the version that its software block names",
    });
  if (found.revision !== item.revision)
    throw new StudyError({
      code: "revised",
      where: item.id,
      problem: `was made with ${item.use} revision ${item.revision}; this version has revision ${found.revision}`,
      remedy: "run the notebook again to take the new revision",
    });
  return "role" in found ? found : entityUse(found);
}

function liveType(t: TypeJson, registry: Registry): Type {
  if (isKind(t)) return t;
  switch (t.type) {
    case "oneOf":
      return oneOf(...t.among);
    case "struct": {
      const found = registry.find((u) => u.id === t.id);
      if (found) return "role" in found ? found.output : found;
      throw new StudyError({
        code: "unknown-method",
        where: t.id,
        problem: "is not in this version",
      });
    }
    case "list":
      return { type: "list", each: liveType(t.each, registry) };
    case "profile":
    case "text":
      return t;
    default:
      throw new StudyError({
        code: "malformed",
        where: typeName(t as Type),
        problem: "cannot be replayed alone",
      });
  }
}

function differences(id: string, was: Result, now: Result): Moved[] {
  if ("stop" in was || "stop" in now) {
    const [a, b] = [was, now].map((r) => ("stop" in r ? `stop: ${r.stop}` : "a value")) as [
      string,
      string,
    ];
    return a === b ? [] : [{ id, path: "", was: a, now: b }];
  }
  return walk(id, "", was.value, now.value);
}
function walk(
  id: string,
  path: string,
  was: PlainJson | undefined,
  now: PlainJson | undefined,
): Moved[] {
  if (typeof was === "number" && typeof now === "number")
    return Math.abs(was - now) <=
      REPLAY_FLOOR + REPLAY_RELATIVE * Math.max(Math.abs(was), Math.abs(now))
      ? []
      : [{ id, path, was, now }];
  if (typeof was === "object" && was !== null && typeof now === "object" && now !== null) {
    const [a, b] = [was, now] as unknown as [Record<string, PlainJson>, Record<string, PlainJson>];
    return [...new Set([...Object.keys(a), ...Object.keys(b)])].flatMap((k) =>
      walk(id, `${path}.${k}`, a[k], b[k]),
    );
  }
  return was === now ? [] : [{ id, path, was, now }];
}
