import type { Body } from "../study/index.js";
import type { Context } from "./context.js";
import type { PackageView } from "./view.js";

/** Shown in every package. */
export const STANDING_CAUTION =
  "This calculation is advisory. Licensed practice, local codes and the regulator decide what is done on a well, and every number here must be checked by an independent engineer before it is used on a live well.";

/** The standing caution, the author's, and those of the methods and models that took part, each once. */
export function cautionsOf(ctx: Context, body: Body): PackageView["cautions"] {
  const seen = new Set([STANDING_CAUTION]);
  const out: PackageView["cautions"][number][] = [{ text: STANDING_CAUTION, from: null }];
  const add = (text: string, from: PackageView["cautions"][number]["from"]): void => {
    if (seen.has(text)) return;
    seen.add(text);
    out.push({ text, from });
  };
  for (const item of body.items)
    if (item.op === "caution") add(item.text, ctx.numbering.link(item.id));
  for (const d of body.declared) {
    const from = ctx.numbering.method(d.id);
    if (d.role === "entity" || from === null) continue;
    for (const text of d.cautions) add(text, from);
  }
  return out;
}
