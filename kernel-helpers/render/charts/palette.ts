/** Text, axes, and what is drawn in no colour. */
export const ink = "#1f2a2d";
export const paleInk = "#5d696c";
export const gridInk = "#dfe4e5";
/** The one colour of the report. */
export const accent = "#0b5563";

export interface LineStyle {
  readonly colour: string;
  /** Lengths of dashes and gaps; empty for a full line. */
  readonly dash: readonly number[];
}

// Neighbours differ in hue for colour-blind readers (no red beside green), in lightness for grey
// print, and in dashes for both.
const styles: readonly LineStyle[] = [
  { colour: accent, dash: [] },
  { colour: "#c65a11", dash: [7, 3] },
  { colour: "#54449a", dash: [2, 2.5] },
  { colour: "#a47c00", dash: [9, 3, 2, 3] },
  { colour: "#222222", dash: [12, 4] },
  { colour: "#6f8f97", dash: [5, 2, 1.5, 2, 1.5, 2] },
];

/** The style of a line by its place in the list; after six they come round again. */
export const lineStyle = (i: number): LineStyle =>
  styles[i % styles.length] ?? { colour: ink, dash: [] };

export const lineColours: readonly string[] = styles.map((style) => style.colour);
export const lineDashes: readonly (readonly number[])[] = styles.map((style) =>
  style.dash.length > 0 ? style.dash : [1, 0],
);
