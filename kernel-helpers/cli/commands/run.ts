import { recordNotebook } from "../record-notebook.js";
import { sayRecorded } from "../say-recorded.js";
import type { CommandContext } from "./command-context.js";

export interface RunOptions {
  readonly out: string;
  readonly cellTimeout: number | null;
}

/** `stillwell run`: a notebook becomes records. */
export async function run(
  notebook: string,
  options: RunOptions,
  context: CommandContext,
): Promise<number> {
  const { terminal, signal } = context;
  terminal.err(`Running ${notebook}`);
  const studies = await recordNotebook({
    notebook,
    out: options.out,
    cellTimeoutSeconds: options.cellTimeout,
    signal,
    terminal,
  });
  if (studies === null) return signal.aborted ? 130 : 1;
  for (const study of studies) sayRecorded(study, terminal);
  return 0;
}
