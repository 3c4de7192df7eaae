import { reference, type Reference } from "../method/index.js";
import { bodyHash, type Body, type Run, type StudyFacts, type StudyRecord } from "./record.js";
import { declaredBy } from "./declared.js";
import { Ledger } from "./ledger.js";
import { Scope } from "./scope.js";
import { softwareVersions } from "./software.js";
import { WorkSheet } from "./work-sheet.js";

export type StudyOptions = Omit<StudyFacts, "checked" | "approved" | "disclaimer" | "display"> &
  Partial<Pick<StudyFacts, "checked" | "approved" | "disclaimer" | "display">>;

// The kernel counts cell executions and looks for studies under these names of the realm's registry.
const TURN = Symbol.for("stillwell.turn");
const STUDIES = Symbol.for("stillwell.studies");
const realm = globalThis as unknown as {
  [TURN]?: number;
  [STUDIES]: Map<string, { record(): unknown }> | undefined;
};

/** A recorded calculation: inputs, assumptions, methods, checks and conclusions, with every edge between them. */
export class Study extends Scope {
  readonly facts: StudyFacts;
  constructor(options: StudyOptions) {
    super(new WorkSheet(new Ledger(() => realm[TURN] ?? 0, options.display ?? "SI")), null);
    this.facts = { checked: null, approved: null, disclaimer: null, display: "SI", ...options };
    (realm[STUDIES] ??= new Map()).set(options.id, this);
  }

  /** Items that stand on something recorded again or withdrawn since; their own cells must run again. */
  stale(): string[] {
    return this.sheet.ledger.stale();
  }
  /** Takes an item back; what stands on it becomes stale. */
  withdraw(id: string): void {
    this.sheet.ledger.withdraw(id);
  }

  body(): Body {
    const declared = declaredBy(this.sheet.uses.values());
    const cited = new Set(
      declared.flatMap((d) =>
        d.role === "method" ? [d.source.cite, ...d.checks.map((c) => c.from.cite)] : [],
      ),
    );
    cited.delete("derivation");
    const references: Reference[] = [...cited].sort().map(reference);
    return {
      study: this.facts,
      sections: [...this.sheet.sections.values()],
      items: this.sheet.ledger.items(),
      declared,
      references,
    };
  }

  /** The record as it stands. It is a draft until a clean headless run says otherwise. */
  record(run: Partial<Run> = {}): StudyRecord {
    const body = JSON.parse(JSON.stringify(this.body())) as Body;
    return {
      schema: 1,
      body,
      hash: bodyHash(body),
      run: {
        at: new Date().toISOString(),
        clean: false,
        stale: this.stale(),
        versions: softwareVersions(),
        notebook: null,
        ...run,
      },
    };
  }
}
