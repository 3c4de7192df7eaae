import { refusal, type ErrorReport } from "../compiler-words.js";
import { present } from "../present.js";
import { thrownReport } from "../thrown-words.js";
import { nextTurn, writeDrafts } from "./drafts.js";
import type { LiveOutput } from "./live-output.js";
import type { Engine, Ran } from "./tslab.js";

export interface CellRunnerParts {
  readonly engine: Engine;
  readonly output: LiveOutput;
  /** The folder that drafts of studies are written to after each cell. */
  readonly drafts: string;
  /** True for a line of a stack that belongs to the machinery, not to the analyst. */
  readonly isOurs: (frame: string) => boolean;
}

/** Runs cells one after another and puts out what comes of each. */
export class CellRunner {
  count = 0;
  /** What was thrown where no cell could catch it, while a cell ran. */
  private stray: { readonly thrown: unknown } | null = null;
  private interrupted: (() => void) | null = null;
  constructor(private readonly parts: CellRunnerParts) {}

  /** The error that ended the cell, or null; published already. */
  async run(source: string, isSilent: boolean): Promise<ErrorReport | null> {
    const { output } = this.parts;
    if (!isSilent) this.count += 1;
    this.stray = null;
    nextTurn();
    const report = await this.outcome(source, isSilent);
    if (report) {
      const { line, ...content } = report;
      output.publish("error", content, line === null ? {} : { line });
    }
    writeDrafts(this.parts.drafts, (says) => output.write("stderr", says));
    output.flush();
    return report;
  }

  /** Stops the cell that runs, as far as it waits for something. */
  interrupt(): void {
    this.parts.engine.interrupt();
    this.interrupted?.();
  }

  /** An error that nobody caught: it fails the cell that runs, and is told under the last one. */
  takeStray(thrown: unknown): void {
    if (this.interrupted) this.stray ??= { thrown };
    else {
      const { traceback } = this.report(thrown, "");
      this.parts.output.write(
        "stderr",
        `Not caught, after the cell had ended:\n${traceback.join("\n")}\n`,
      );
    }
  }

  private async outcome(source: string, isSilent: boolean): Promise<ErrorReport | null> {
    const stopped = new Promise<never>((_, reject) => {
      this.interrupted = () => reject(new Error("Interrupted asynchronously"));
    });
    stopped.catch(() => undefined);
    try {
      const ran = await this.parts.engine.run(source, this.count);
      if (ran.outcome === "refused") return refusal(ran.diagnostics, source);
      if (ran.outcome === "threw") return this.report(ran.thrown, source);
      if (ran.last && !isSilent) await Promise.race([this.show(ran.last), stopped]);
      // A rejection that nobody caught is announced once the queue of promises has run dry.
      await new Promise(setImmediate);
      const stray = this.stray;
      return stray && this.report(stray.thrown, source);
    } catch (thrown) {
      return this.report(thrown, source);
    } finally {
      this.interrupted = null;
    }
  }

  private async show(last: NonNullable<Extract<Ran, { outcome: "ran" }>["last"]>): Promise<void> {
    const data = await present(last.value, last.known);
    this.parts.output.publish("execute_result", {
      data,
      metadata: {},
      execution_count: this.count,
    });
  }

  private report(thrown: unknown, source: string): ErrorReport {
    const { engine, isOurs } = this.parts;
    const { locate } = engine.positions;
    return thrownReport({ thrown, source, cell: this.count, locate, isOurs });
  }
}
