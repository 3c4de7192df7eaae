import { readRecord } from "../../files/index.js";
import { replay } from "../../study/index.js";
import { standardRegistry } from "../../models/index.js";
import type { CommandContext } from "./command-context.js";

/** `stillwell replay`: recomputes a record without its notebook and says what came out otherwise. */
export function replayRecord(file: string, { terminal }: CommandContext): number {
  const record = readRecord(file);
  const { compared, moved, failed } = replay(record.body, standardRegistry);
  for (const { error } of failed) terminal.out(`could not be replayed: ${error.message}`);
  for (const m of moved)
    terminal.out(
      `moved: ${m.id}${m.path} was ${JSON.stringify(m.was)}, now ${JSON.stringify(m.now)}`,
    );
  terminal.out(
    moved.length + failed.length === 0
      ? `All ${compared} values of ${record.body.study.number} rev. ${record.body.study.revision} were recomputed and agree.`
      : `${compared} values compared, ${moved.length} moved, ${failed.length} could not be replayed.`,
  );
  return moved.length + failed.length === 0 ? 0 : 1;
}
