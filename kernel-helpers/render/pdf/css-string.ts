/**
 * Text as a quoted CSS string. All but plain characters are written as hexadecimal escapes, so that
 * it can neither end the string, nor the rule, nor (as `</style>`) the style element around it.
 */
export function cssString(text: string): string {
  const body = text
    .replace(/\r\n?/g, "\n")
    .replace(/[^ A-Za-z0-9.,:;()+\-=_%#\u00a0-\ud7ff\ue000-\uffff]/gu, (c) => {
      const code = c.codePointAt(0) ?? 0;
      if (code > 0xffff) return c;
      // NUL and lone halves of a surrogate pair cannot be written in CSS.
      return code === 0 || (code >= 0xd800 && code <= 0xdfff)
        ? "\ufffd"
        : `\\${code.toString(16)} `;
    });
  return `"${body}"`;
}
