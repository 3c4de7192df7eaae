import type { AppliedUse, Body, DeclaredMethod } from "../study/index.js";
import { isKind } from "../units/index.js";
import { textOf } from "./show.js";

/**
 * Methods that took part in items of a record: those of steps, those that models evaluated, and those
 * the two compose. A method that chooses among others by name composes only the one that was chosen.
 */
export function methodsApplied(
  body: Body,
  items: readonly AppliedUse[] = body.items.filter(
    (i): i is AppliedUse => i.op === "step" || i.op === "run",
  ),
): ReadonlySet<string> {
  return new Set(items.flatMap((item) => [...methodsOf(body, item)]));
}

/** Methods that took part in one item. */
export function methodsOf(body: Body, item: AppliedUse): ReadonlySet<string> {
  const methods = new Map(
    body.declared.flatMap((d) => (d.role === "method" ? [[d.id, d] as const] : [])),
  );
  const out = new Set<string>();
  const chosen = choicesOf(body, item);
  const open = item.op === "step" ? [item.use] : [...item.looked];
  for (let id = open.pop(); id !== undefined; id = open.pop()) {
    const m = methods.get(id);
    if (!m || out.has(id)) continue;
    out.add(id);
    const options = optionsOf(m);
    open.push(...m.uses.filter((u) => !options.has(u) || chosen.has(u)));
  }
  return out;
}

/** Methods that the runs of one model evaluated. */
export const appliedBy = (body: Body, model: string): ReadonlySet<string> =>
  methodsApplied(
    body,
    body.items.filter((i): i is AppliedUse => i.op === "run" && i.use === model),
  );

const optionsOf = (m: DeclaredMethod): ReadonlySet<string> =>
  new Set(
    Object.values(m.inputs).flatMap((f) =>
      !isKind(f.type) && f.type.type === "oneOf" ? f.type.among : [],
    ),
  );

/** The choices handed to an item, stated in place or recorded. */
function choicesOf(body: Body, item: AppliedUse): ReadonlySet<string> {
  const recorded = new Map(
    body.items.flatMap((i) =>
      (i.op === "given" || i.op === "assumed") && i.form === "choice"
        ? [[i.id, textOf(i.result.value)] as const]
        : [],
    ),
  );
  return new Set(
    Object.values(item.args).flatMap((node) => {
      if ("choice" in node) return [node.choice];
      const found = "ref" in node ? recorded.get(node.ref) : undefined;
      return found === undefined ? [] : [found];
    }),
  );
}
