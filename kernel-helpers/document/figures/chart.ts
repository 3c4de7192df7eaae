import type { Fields, Plains, Shape } from "../../method/index.js";
import type { ChartUse } from "../../study/index.js";
import type { DisplaySystem } from "../../units/index.js";
import type { Column } from "../tables.js";
import type { DepthDrawing } from "../view.js";

export interface Drawn {
  readonly drawing: DepthDrawing;
  /** The same data in columns. */
  readonly columns: readonly Column[];
}
/** A chart: what it draws of which values, as data in display units. The pixels are the renderer's. */
export interface Chart<S extends Shape = Shape> extends ChartUse<S> {
  draw(values: Plains<S>, system: DisplaySystem): Drawn;
}

export const chart = <S extends Shape>(parts: {
  readonly id: string;
  readonly revision: number;
  readonly title: string;
  readonly inputs: Fields<S>;
  readonly draw: (values: Plains<S>, system: DisplaySystem) => Drawn;
}): Chart<S> => parts;
