import { Command, CommanderError, InvalidArgumentError, Option } from "commander";
import { StillwellError } from "../errors/index.js";
import { stillwellVersion } from "../study/version.js";
import type { CommandContext } from "./commands/command-context.js";
import type { MethodsOptions } from "./commands/methods.js";
import type { NewOptions } from "./commands/new.js";
import type { PackageOptions } from "./commands/package.js";
import type { RunOptions } from "./commands/run.js";
import { processTerminal } from "./terminal.js";

const seconds = (text: string): number => {
  const x = Number(text);
  if (Number.isFinite(x) && x > 0) return x;
  throw new InvalidArgumentError(`${JSON.stringify(text)} is not a number of seconds above 0.`);
};

// Commands are loaded when called: help and a catalogue need no kernel and no browser.

/** The command line: answers with the exit code. 0 done, 1 refused or failed, 2 wrongly called, 130 interrupted. */
export async function main(argv: readonly string[]): Promise<number> {
  const terminal = processTerminal();
  const stopping = new AbortController();
  const context: CommandContext = { terminal, signal: stopping.signal };
  const onSignal = (): void => stopping.abort();
  process.on("SIGINT", onSignal);
  process.on("SIGTERM", onSignal);
  let code = 0;
  const program = new Command("stillwell")
    .description(
      "Calculations for source control of a well: run notebooks, write calculation packages, replay records.",
    )
    .version(stillwellVersion)
    .exitOverride()
    .showSuggestionAfterError()
    .configureOutput({ writeErr: (text) => process.stderr.write(text) });
  const out = () =>
    new Option("-o, --out <folder>", "where records and packages are written").default("out");
  const limit = () =>
    new Option("--cell-timeout <seconds>", "the longest that one cell may run")
      .argParser(seconds)
      .default(null, "no limit");
  program
    .command("run")
    .description("run a notebook headless and write its record")
    .argument("<notebook>", "an .ipynb file")
    .addOption(out())
    .addOption(limit())
    .action(async (notebook: string, options: RunOptions) => {
      const { run } = await import("./commands/run.js");
      code = await run(notebook, options, context);
    });
  program
    .command("package")
    .description("write the calculation package of a record, or of a notebook that is run first")
    .argument("<source>", "a record.json or an .ipynb file")
    .addOption(out())
    .addOption(limit())
    .addOption(
      new Option("--paper <size>", "paper of the PDF").choices(["A4", "Letter"]).default("A4"),
    )
    .option("--no-pdf", "write the HTML only")
    .action(async (source: string, options: PackageOptions) => {
      const { makePackage } = await import("./commands/package.js");
      code = await makePackage(source, options, context);
    });
  program
    .command("replay")
    .description("recompute a record without its notebook and compare")
    .argument("<record>", "a record.json")
    .action(async (record: string) => {
      const { replayRecord } = await import("./commands/replay.js");
      code = replayRecord(record, context);
    });
  program
    .command("new")
    .description("make a study folder that runs")
    .argument("<folder>", "the folder; what is in it already stays")
    .option("--from <spec>", "what the study depends on: a version, or a packed file")
    .action(async (folder: string, options: NewOptions) => {
      const { newStudy } = await import("./commands/new.js");
      code = newStudy(folder, options, context);
    });
  program
    .command("methods")
    .description("the catalogue: source, range, and what each method was checked against")
    .argument("[id]", "one method")
    .option("--family <name>", "only the methods for one thing")
    .option("--json", "as JSON")
    .action(async (id: string | undefined, options: MethodsOptions) => {
      const { listMethods } = await import("./commands/methods.js");
      code = listMethods(id, options, context);
    });
  for (const command of program.commands) command.exitOverride();
  try {
    await program.parseAsync(["node", "stillwell", ...argv]);
  } catch (e) {
    if (e instanceof CommanderError) return e.exitCode === 0 ? 0 : 2;
    if (stopping.signal.aborted) {
      terminal.err("Interrupted.");
      return 130;
    }
    if (!(e instanceof StillwellError)) throw e;
    terminal.err(e.message);
    return 1;
  } finally {
    terminal.settle();
    process.off("SIGINT", onSignal);
    process.off("SIGTERM", onSignal);
  }
  return code;
}
