const entities: Readonly<Record<string, string>> = {
  "&": "&amp;",
  "<": "&lt;",
  ">": "&gt;",
  '"': "&quot;",
  "'": "&#39;",
};

/** Text as HTML or SVG content, safe between tags and inside quoted attributes. */
export const escapeHtml = (text: string): string =>
  text.replace(/[&<>"']/g, (c) => entities[c] ?? c).replace(forbiddenInXml, "\ufffd");

// Characters that an SVG file may not hold even when escaped.
const forbiddenInXml = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\ufffe\uffff]/g;
