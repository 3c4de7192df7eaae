import { StudyError } from "../errors/index.js";
import type { Struct, Use } from "../method/index.js";
import type { Ledger } from "./ledger.js";
import { KnownNumbers } from "./literal-findings.js";
import type { SectionFacts } from "./record.js";

/** What the scopes of one study share. */
export class WorkSheet {
  readonly known = new KnownNumbers();
  readonly uses = new Map<string, Use | Struct>();
  readonly sections = new Map<string, SectionFacts>();
  constructor(readonly ledger: Ledger) {}

  addSection(section: SectionFacts): void {
    const before = this.sections.get(section.id);
    if (before && before.within !== section.within)
      throw new StudyError({
        code: "duplicate-id",
        where: section.id,
        problem: `is already a section${before.within ? ` of "${before.within}"` : ""}`,
      });
    this.sections.set(section.id, section);
  }
}
