import type { PDFDocument } from "pdf-lib";
import { InputError, RenderError } from "../../errors/index.js";
import type { BrowserKind, BrowserSession, LockedPage } from "../browser/index.js";
import { anchorPages } from "./anchor-pages.js";
import { pdfFacts } from "./read-pdf.js";
import { stableIds } from "./stable-ids.js";

export interface PdfInfo {
  readonly title: string;
  readonly author: string;
  readonly subject: string;
  readonly keywords?: readonly string[];
  /** The date the file states, whenever it is printed: the same HTML gives the same bytes. */
  readonly created: Date;
}

export interface PrintedPdf {
  readonly bytes: Uint8Array;
  readonly pages: number;
  /** How often it was printed until the page numbers in it were true. */
  readonly passes: number;
  /** The addresses it asked for and was refused; empty for a page that holds all it needs. */
  readonly blocked: readonly string[];
  readonly browser: { readonly kind: BrowserKind; readonly version: string };
}

const maxPasses = 4;

/**
 * Prints self-contained HTML as a tagged PDF with an outline, on the sheet its `@page` rule names.
 * In each `<span data-page-of="id"></span>` the number of the page on which that element begins is
 * put; a link to the element must stand somewhere in the HTML.
 *
 * @throws RenderError `no-text`, `unembedded-font`, `no-anchor`, `unsettled-pages`; InputError for a bad date.
 */
export async function printPdf({
  html,
  session,
  info,
}: {
  html: string;
  session: BrowserSession;
  info: PdfInfo;
}): Promise<PrintedPdf> {
  if (Number.isNaN(info.created.getTime()))
    throw new InputError({
      code: "bad-date",
      where: "info.created",
      problem: "is not a date",
      expected: "a valid Date",
    });
  return session.withPage(html, async (page) => {
    const { pdf, passes } = await printSettled(page);
    const { bytes, pages } = await finish(pdf, info);
    return {
      bytes,
      pages,
      passes,
      blocked: [...page.blocked],
      browser: { kind: session.browser.kind, version: session.version },
    };
  });
}

// `document.querySelectorAll` itself can be hidden by an element of that name in the page.
const spans = `Array.from(Document.prototype.querySelectorAll.call(document, "[data-page-of]"))`;

const equations = `Array.from(Document.prototype.querySelectorAll.call(document, "div.math"))`;
// All heights are read before any is set, so that the page is laid out once.
const emptied = `((all) => {
  const heights = all.map((e) => e.getBoundingClientRect().height + "px");
  all.forEach((e, i) => Object.assign(e.style, { height: heights[i], contentVisibility: "hidden" }));
})(${equations})`;
const refilled = `${equations}.forEach((e) => Object.assign(e.style, { height: "", contentVisibility: "" }))`;

async function printSettled(page: LockedPage): Promise<{ pdf: PDFDocument; passes: number }> {
  const wanted = await page.evaluate(`${spans}.map((e) => String(e.getAttribute("data-page-of")))`);
  if (!isListOfText(wanted) || wanted.length === 0)
    return { pdf: await load(await page.pdf({ isTagged: true })), passes: 1 };
  // The first pass only finds the pages: it goes without tags, which take as long as the rest, and
  // with each equation as an empty box of its own height. The next pass checks what it found.
  await page.evaluate(emptied);
  let numbers = await pagesOf(wanted, await load(await page.pdf({ isTagged: false })));
  await page.evaluate(refilled);
  for (let passes = 2; passes <= maxPasses; passes++) {
    await page.evaluate(
      `((numbers) => ${spans}.forEach((e, i) => { e.textContent = numbers[i]; }))(${JSON.stringify(numbers)})`,
    );
    const pdf = await load(await page.pdf({ isTagged: true }));
    const now = await pagesOf(wanted, pdf);
    if (now.every((n, i) => n === numbers[i])) return { pdf, passes };
    numbers = now;
  }
  throw new RenderError({
    code: "unsettled-pages",
    where: "table of contents",
    problem: `its page numbers still move after ${maxPasses} passes`,
    remedy: "give the numbers a fixed width, so that they do not move the text",
  });
}

/** Loads in one go: by default the library rests after every hundred objects. */
async function load(raw: Uint8Array): Promise<PDFDocument> {
  const { PDFDocument } = await import("pdf-lib");
  return PDFDocument.load(raw, { updateMetadata: false, parseSpeed: Number.POSITIVE_INFINITY });
}

async function pagesOf(ids: readonly string[], pdf: PDFDocument): Promise<readonly string[]> {
  const pages = await anchorPages(pdf);
  return ids.map((id) => {
    const page = pages.get(id);
    if (page !== undefined) return String(page);
    throw new RenderError({
      code: "no-anchor",
      where: `data-page-of="${id}"`,
      problem: "has no printed element of that id that a link points at",
      remedy: `give an element id="${id}" and link to it`,
    });
  });
}

/** Sets what the file says of itself, packs its objects (a third of the size) and checks its text. */
async function finish(
  pdf: PDFDocument,
  info: PdfInfo,
): Promise<{ bytes: Uint8Array; pages: number }> {
  const { fonts, pages } = await pdfFacts(pdf);
  if (fonts.length === 0)
    throw new RenderError({
      code: "no-text",
      where: "PDF",
      problem: `${pages} pages were printed without a single letter`,
      expected: "text",
      remedy: "embed the fonts in the HTML, or install some on this system",
    });
  const loose = fonts.find((font) => !font.isEmbedded);
  if (loose)
    throw new RenderError({
      code: "unembedded-font",
      where: `font ${loose.name}`,
      problem: "is not in the file, which would look otherwise on another machine",
    });
  await stableIds(pdf);
  pdf.setTitle(info.title, { showInWindowTitleBar: true });
  pdf.setAuthor(info.author);
  pdf.setSubject(info.subject);
  pdf.setKeywords([...(info.keywords ?? [])]);
  pdf.setProducer("Stillwell");
  pdf.setCreator("Stillwell");
  pdf.setCreationDate(info.created);
  pdf.setModificationDate(info.created);
  const bytes = await pdf.save({
    useObjectStreams: true,
    addDefaultPage: false,
    updateFieldAppearances: false,
    objectsPerTick: Number.POSITIVE_INFINITY,
  });
  return { bytes, pages };
}

const isListOfText = (value: unknown): value is readonly string[] =>
  Array.isArray(value) && value.every((item) => typeof item === "string");
