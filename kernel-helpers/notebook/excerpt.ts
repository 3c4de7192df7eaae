/** A line of a source and, where the column is known, a caret under it; both 1-based. */
export function excerpt(source: string, line: number, column: number | null): string[] {
  const text = source.split("\n")[line - 1]?.trimEnd();
  if (text === undefined) return [];
  if (column === null) return [`  ${text}`];
  // Tabs are kept, so that the caret stands under its letter at any tab width.
  const before = text.slice(0, column - 1).replace(/[^\t]/g, " ");
  return [`  ${text}`, `  ${before}^`];
}
