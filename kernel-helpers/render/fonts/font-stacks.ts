/**
 * The families that HTML, page margins and drawings name; single quotes, so that they fit into
 * attributes. KaTeX_Main brings the signs (≤ ≈ → √ …) that the text faces lack.
 */
export const fontStacks = {
  serif: "'Source Serif 4',KaTeX_Main,serif",
  sans: "'Source Sans 3',KaTeX_Main,sans-serif",
} as const;
