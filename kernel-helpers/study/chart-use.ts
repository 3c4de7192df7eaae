import type { Fields, Shape } from "../method/index.js";

/** What a study needs to know of a chart: its id and what it draws. The drawing itself lives with the document. */
export interface ChartUse<S extends Shape = Shape> {
  readonly id: string;
  readonly revision: number;
  readonly title: string;
  readonly inputs: Fields<S>;
}
