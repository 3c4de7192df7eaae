import { dirname } from "node:path";
import { readRecord } from "../../files/index.js";
import { writePackage, type PaperSize } from "../../render/index.js";
import { recordNotebook, type RecordedStudy } from "../record-notebook.js";
import { sayRecorded } from "../say-recorded.js";
import type { CommandContext } from "./command-context.js";
import type { RunOptions } from "./run.js";

export interface PackageOptions extends RunOptions {
  readonly paper: PaperSize;
  readonly pdf: boolean;
}

/** `stillwell package`: a record, or a notebook that is run first, becomes HTML and PDF. */
export async function makePackage(
  source: string,
  options: PackageOptions,
  context: CommandContext,
): Promise<number> {
  const { terminal, signal } = context;
  const studies = await studiesOf(source, options, context);
  if (studies === null) return signal.aborted ? 130 : 1;
  let code = 0;
  for (const study of studies) {
    const written = await writePackage({
      record: study.record,
      folder: study.folder,
      paper: options.paper,
      pdf: options.pdf,
      signal,
      onProgress: (what) => terminal.progress(`  ${what}`),
    });
    terminal.settle();
    sayRecorded(study, terminal);
    terminal.out(`  HTML   ${written.html}`);
    if (written.pdf)
      terminal.out(`  PDF    ${written.pdf} (${written.pages} pages, ${written.browser})`);
    if (written.pdfFailure) {
      terminal.err(
        `The PDF could not be made; the HTML is complete. ${written.pdfFailure.message}`,
      );
      code = 1;
    }
  }
  return code;
}

async function studiesOf(
  source: string,
  options: PackageOptions,
  { terminal, signal }: CommandContext,
): Promise<readonly RecordedStudy[] | null> {
  if (!source.endsWith(".ipynb")) {
    const record = readRecord(source);
    return [{ record, folder: dirname(source), file: source }];
  }
  terminal.err(`Running ${source}`);
  return recordNotebook({
    notebook: source,
    out: options.out,
    cellTimeoutSeconds: options.cellTimeout,
    signal,
    terminal,
  });
}
