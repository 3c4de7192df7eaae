import { join } from "node:path";
import { RenderError } from "../../errors/index.js";
import { writeFileAtomic } from "../../files/index.js";
import type { StudyRecord } from "../../study/index.js";
import { withBrowser } from "../browser/index.js";
import type { PaperSize } from "../pdf/page-css.js";
import { printPdf } from "../pdf/index.js";
import { renderHtml } from "./render-html.js";

export interface WrittenPackage {
  readonly html: string;
  readonly pdf: string | null;
  readonly pages: number | null;
  /** Which browser printed it. */
  readonly browser: string | null;
  /** Why there is no PDF; the HTML is complete all the same. */
  readonly pdfFailure: RenderError | null;
}

/** Writes package.html and package.pdf beside a record, each whole or not at all. */
export async function writePackage({
  record,
  folder,
  paper,
  pdf,
  signal,
  onProgress,
}: {
  readonly record: StudyRecord;
  readonly folder: string;
  readonly paper: PaperSize;
  readonly pdf: boolean;
  readonly signal: AbortSignal;
  readonly onProgress: (what: string) => void;
}): Promise<WrittenPackage> {
  onProgress("setting the HTML");
  const { html, view } = await renderHtml(record, paper);
  const htmlFile = join(folder, "package.html");
  writeFileAtomic(htmlFile, html);
  const none = { html: htmlFile, pdf: null, pages: null, browser: null, pdfFailure: null };
  if (!pdf) return none;
  onProgress("printing the PDF");
  try {
    const printed = await withBrowser(
      (session) =>
        printPdf({
          html,
          session,
          info: {
            title: `${view.cover.number} rev. ${view.cover.revision}: ${view.cover.title}`,
            author: view.cover.prepared,
            subject: `Calculation package, ${view.cover.status}`,
            keywords: [`record ${record.hash}`],
            created: new Date(record.run.at),
          },
        }),
      { signal },
    );
    const pdfFile = join(folder, "package.pdf");
    writeFileAtomic(pdfFile, printed.bytes);
    return {
      html: htmlFile,
      pdf: pdfFile,
      pages: printed.pages,
      browser: `${printed.browser.kind} ${printed.browser.version}`,
      pdfFailure: null,
    };
  } catch (error) {
    if (!(error instanceof RenderError)) throw error;
    return { ...none, pdfFailure: error };
  }
}
