import type { Plain } from "../../method/index.js";
import { displayUnit, inUnit, type DisplaySystem } from "../../units/index.js";
import type { Well } from "../../well/index.js";
import type { DepthDrawing } from "../view.js";

/** A well as a drawing takes it: depths in the display unit. */
export function drawnWell(
  { sections }: Plain<typeof Well>,
  system: DisplaySystem,
): Pick<DepthDrawing, "depthUnit" | "perMetre" | "top" | "base" | "sections"> {
  const unit = displayUnit("measuredDepth", system, 1000);
  const depth = (si: number): number => inUnit(si as never, unit);
  return {
    depthUnit: unit.symbol,
    perMetre: depth(1),
    top: depth(sections[0]?.top ?? 0),
    base: depth(sections.at(-1)?.base ?? 0),
    sections: sections.map((s) => ({
      name: s.name,
      wall: s.wall,
      top: depth(s.top),
      base: depth(s.base),
      bore: s.bore,
    })),
  };
}
