import { InputError } from "../errors/index.js";
import { entity, list } from "../method/index.js";
import { BoreSection } from "./bore-section.js";

/** Two ends closer than this are one place: tallies are written to the centimetre. */
const JOIN = 0.01;

/** The open way from the exit down to total depth: bore sections from the top, end to end. */
export const Well = entity({
  id: "well",
  revision: 1,
  title: "Well",
  fields: { sections: { kind: list(BoreSection), note: "from the exit down, end to end" } },
  build: (f) => {
    const [first] = f.sections;
    const last = f.sections.at(-1);
    if (!first || !last)
      throw new InputError({
        code: "no-sections",
        where: "well.sections",
        problem: "is empty",
        expected: "at least one bore section",
      });
    f.sections.forEach((s, i) => {
      const above = f.sections[i - 1];
      if (!above || Math.abs(s.top - above.base) <= JOIN) return;
      const gap = s.top > above.base;
      throw new InputError({
        code: gap ? "gap" : "overlap",
        where: `well.sections[${i}] "${s.name}"`,
        problem: `${gap ? "leaves a gap below" : "overlaps"} "${above.name}": its top is at ${s.top} m and the base above it at ${above.base} m`,
        expected: `a top at ${above.base} m`,
      });
    });
    return {
      ...f,
      top: first.top,
      base: last.base,
      /** The section at a depth; at a joint, the upper one. */
      sectionAt: (depth: number) => {
        const found = f.sections.find((s) => depth >= s.top && depth <= s.base);
        if (found) return found;
        throw new InputError({
          code: "outside",
          where: "well",
          problem: `has no section at a measured depth of ${depth} m`,
          expected: `a depth from ${first.top} m to ${last.base} m`,
        });
      },
    };
  },
});
