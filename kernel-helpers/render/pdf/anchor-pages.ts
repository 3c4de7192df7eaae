import type { PDFDocument } from "pdf-lib";

/**
 * The page, from 1, on which each linked-to element stands. Chromium writes one named destination
 * for every id that a link within the page points at, its name percent-encoded.
 */
export async function anchorPages(pdf: PDFDocument): Promise<ReadonlyMap<string, number>> {
  const { PDFArray, PDFDict, PDFName } = await import("pdf-lib");
  const pageOf = new Map(pdf.getPages().map((page, i) => [page.ref.toString(), i + 1]));
  const found = new Map<string, number>();
  const destinations = pdf.catalog.lookup(PDFName.of("Dests"));
  if (!(destinations instanceof PDFDict)) return found;
  for (const [name, value] of destinations.entries()) {
    const destination = pdf.context.lookup(value);
    if (!(destination instanceof PDFArray)) continue;
    const page = pageOf.get(String(destination.get(0)));
    if (page !== undefined) found.set(decoded(name.decodeText()), page);
  }
  return found;
}

function decoded(name: string): string {
  try {
    return decodeURIComponent(name);
  } catch {
    return name;
  }
}
