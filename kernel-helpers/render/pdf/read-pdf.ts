import type { PDFDict, PDFDocument } from "pdf-lib";
import { anchorPages } from "./anchor-pages.js";

/** What a PDF is made of, as far as a reader or a test asks. */
export interface PdfFacts {
  readonly pages: number;
  /** Width and height of the first page, in points. */
  readonly size: readonly [number, number];
  readonly title: string | null;
  readonly author: string | null;
  readonly subject: string | null;
  readonly keywords: string | null;
  readonly producer: string | null;
  readonly created: Date | null;
  readonly language: string | null;
  readonly outline: readonly string[];
  /** How many structure elements there are of each type: `{ H1: 3, P: 40, Figure: 2 }`; empty if untagged. */
  readonly structure: Readonly<Record<string, number>>;
  /** The alternative texts of figures, in the order of the file. */
  readonly alternatives: readonly string[];
  readonly fonts: readonly { readonly name: string; readonly isEmbedded: boolean }[];
  readonly anchors: ReadonlyMap<string, number>;
}

export async function readPdf(bytes: Uint8Array): Promise<PdfFacts> {
  const { PDFDocument } = await import("pdf-lib");
  return pdfFacts(await PDFDocument.load(bytes, { updateMetadata: false }));
}

export async function pdfFacts(pdf: PDFDocument): Promise<PdfFacts> {
  const { PDFDict, PDFHexString, PDFName, PDFString } = await import("pdf-lib");
  const text = (value: unknown): string | null =>
    value instanceof PDFString || value instanceof PDFHexString ? value.decodeText() : null;
  const get = (dict: PDFDict, key: string): unknown => dict.lookup(PDFName.of(key));
  const name = (dict: PDFDict, key: string): string => {
    const value = get(dict, key);
    return value instanceof PDFName ? value.decodeText() : "";
  };

  const structure = new Map<string, number>();
  const alternatives: string[] = [];
  const fonts: { name: string; isEmbedded: boolean }[] = [];
  const isTagged = get(pdf.catalog, "StructTreeRoot") instanceof PDFDict;
  for (const [, object] of pdf.context.enumerateIndirectObjects()) {
    if (!(object instanceof PDFDict)) continue;
    if (isTagged && name(object, "Type") === "StructElem") {
      const type = name(object, "S");
      structure.set(type, (structure.get(type) ?? 0) + 1);
      const alternative = text(get(object, "Alt"));
      if (alternative !== null) alternatives.push(alternative);
    }
    if (name(object, "Type") !== "Font") continue;
    const subtype = name(object, "Subtype");
    // The descendant of a composite font holds its file.
    if (subtype === "Type0") continue;
    const descriptor = get(object, "FontDescriptor");
    fonts.push({
      name: name(object, "BaseFont") || subtype,
      isEmbedded:
        subtype === "Type3" ||
        (descriptor instanceof PDFDict &&
          ["FontFile", "FontFile2", "FontFile3"].some((key) => get(descriptor, key) !== undefined)),
    });
  }

  const outline: string[] = [];
  const walk = (parent: unknown): void => {
    if (!(parent instanceof PDFDict)) return;
    for (
      let item = get(parent, "First");
      item instanceof PDFDict && outline.length < 100_000;
      item = get(item, "Next")
    ) {
      outline.push(text(get(item, "Title")) ?? "");
      walk(item);
    }
  };
  walk(get(pdf.catalog, "Outlines"));

  const { width, height } = pdf.getPage(0).getSize();
  return {
    pages: pdf.getPageCount(),
    size: [width, height],
    title: pdf.getTitle() ?? null,
    author: pdf.getAuthor() ?? null,
    subject: pdf.getSubject() ?? null,
    keywords: pdf.getKeywords() ?? null,
    producer: pdf.getProducer() ?? null,
    created: pdf.getCreationDate() ?? null,
    language: text(get(pdf.catalog, "Lang")),
    outline,
    structure: Object.fromEntries([...structure].sort(([a], [b]) => (a < b ? -1 : 1))),
    alternatives,
    fonts,
    anchors: await anchorPages(pdf),
  };
}
