import type { PDFDict, PDFDocument, PDFObject } from "pdf-lib";

/**
 * Renames the ids of structure elements by their order. Chromium takes them from counters that depend
 * on how the page happened to arrive, so that the same HTML would not always give the same bytes.
 */
export async function stableIds(pdf: PDFDocument): Promise<void> {
  const { PDFArray, PDFDict, PDFName, PDFString } = await import("pdf-lib");
  const get = (dict: PDFDict, key: string): PDFObject | undefined => dict.lookup(PDFName.of(key));
  const elements = pdf.context
    .enumerateIndirectObjects()
    .map(([, object]) => object)
    .filter((object) => object instanceof PDFDict)
    .filter((dict) => get(dict, "Type") === PDFName.of("StructElem"));

  const old = new Set<string>();
  for (const element of elements) {
    const id = get(element, "ID");
    if (id instanceof PDFString) old.add(id.asString());
  }
  // The tree of ids is sorted by name: names of one length in the old order keep it so.
  const renamed = new Map(
    [...old].sort().map((id, i) => [id, PDFString.of(`n${String(i + 1).padStart(8, "0")}`)]),
  );
  const inArray = (value: PDFObject | undefined): void => {
    if (!(value instanceof PDFArray)) return;
    value.asArray().forEach((item, i) => {
      const name = item instanceof PDFString ? renamed.get(item.asString()) : undefined;
      if (name) value.set(i, name);
    });
  };

  for (const element of elements) {
    const id = get(element, "ID");
    const name = id instanceof PDFString ? renamed.get(id.asString()) : undefined;
    if (name) element.set(PDFName.of("ID"), name);
    const attributes = get(element, "A");
    for (const each of attributes instanceof PDFArray ? attributes.asArray() : [attributes]) {
      const dict = each && pdf.context.lookup(each);
      if (dict instanceof PDFDict) inArray(get(dict, "Headers"));
    }
  }
  const walk = (node: PDFObject | undefined): void => {
    if (!(node instanceof PDFDict)) return;
    inArray(get(node, "Names"));
    inArray(get(node, "Limits"));
    const kids = get(node, "Kids");
    if (kids instanceof PDFArray) for (const kid of kids.asArray()) walk(pdf.context.lookup(kid));
  };
  const root = get(pdf.catalog, "StructTreeRoot");
  if (root instanceof PDFDict) walk(get(root, "IDTree"));
}
