/** A number of more decimals stands flush right: lined up, it would push the others far from their units. */
const MOST_DECIMALS = 4;
const NUMBER = /^[−-]?[\d\u202f]+(?:\.(\d+))?$/;

/**
 * What has to stand behind each text, unseen, for the decimal points of a column set flush right to line up:
 * the digits that others have and it lacks. Texts that are no plain number get nothing.
 */
export function paddings(texts: readonly string[]): string[] {
  const decimals = texts.map((t) => {
    const m = NUMBER.exec(t);
    const n = m?.[1]?.length ?? 0;
    return m && n <= MOST_DECIMALS ? n : null;
  });
  const most = Math.max(0, ...decimals.map((d) => d ?? 0));
  return decimals.map((d) => {
    if (d === null || d === most) return "";
    return (d === 0 ? "." : "") + "0".repeat(most - d);
  });
}

/** Rows of single values with their paddings; a range or a word takes no part. */
export function aligned<
  R extends { readonly value: string; readonly form: "number" | "range" | "words" },
>(rows: readonly R[]): (R & { readonly padding: string })[] {
  const all = paddings(rows.map((r) => (r.form === "number" ? r.value : "")));
  return rows.map((r, i) => ({ ...r, padding: all[i] ?? "" }));
}
