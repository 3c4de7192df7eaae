import type { Terminal } from "../terminal.js";

/** What every command is handed; it answers with an exit code. */
export interface CommandContext {
  readonly terminal: Terminal;
  readonly signal: AbortSignal;
}
