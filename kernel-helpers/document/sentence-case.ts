/** A heading begins with a capital, unless its first word is a symbol such as "pH". */
export const sentenceCase = (title: string): string =>
  title.replace(/^\p{Ll}(?=\p{Ll})|^a(?= )/u, (c) => c.toUpperCase());
