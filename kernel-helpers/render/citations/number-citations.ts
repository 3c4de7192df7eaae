/** Numbers for cited works, from 1 in the order of their first use. */
export interface CitationNumbers {
  readonly order: readonly string[];
  readonly numbers: Readonly<Record<string, number>>;
}

export function numberCitations(orderOfUse: readonly string[]): CitationNumbers {
  const order = [...new Set(orderOfUse)];
  // Made from entries, so that an id such as "__proto__" is a key like any other.
  return { order, numbers: Object.fromEntries(order.map((id, i) => [id, i + 1])) };
}
