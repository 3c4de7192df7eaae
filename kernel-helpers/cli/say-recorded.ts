import { charts } from "../document/index.js";
import { packageView } from "../document/index.js";
import type { RecordedStudy } from "./record-notebook.js";
import { sayConclusions } from "./say-conclusions.js";
import type { Terminal } from "./terminal.js";

/** Where a record is, and what it concludes. */
export function sayRecorded({ record, file }: RecordedStudy, terminal: Terminal): void {
  const { study, items } = record.body;
  terminal.out(`${study.number} rev. ${study.revision}: ${study.title}`);
  terminal.out(`  record ${file} (${items.length} items)`);
  for (const line of sayConclusions(packageView(record, charts))) terminal.out(`  ${line}`);
}
