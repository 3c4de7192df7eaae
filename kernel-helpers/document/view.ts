// The view model: what templates see. Plain data, no arithmetic left to do, absent is null.

export interface Link {
  readonly text: string;
  /** Anchor within the package, without the hash sign. */
  readonly to: string;
}
/** Running text with links in it. */
export type TextRun = {
  readonly text: string;
  readonly to: string | null;
  readonly strong: boolean;
};

/** A value in a column: how it is set, and the unseen digits behind it that line the decimal points up. */
export interface Aligned {
  readonly value: string;
  readonly unit: string;
  readonly form: "number" | "range" | "words";
  readonly padding: string;
}
export interface Row extends Aligned {
  readonly symbol: string | null;
  readonly meaning: string;
  /** Where the value comes from; null when it is stated in place. */
  readonly from: Link | null;
}
export interface InputView extends Aligned {
  readonly number: string;
  readonly anchor: string;
  readonly title: string;
  readonly symbol: string | null;
  readonly spread: string | null;
  readonly because: string;
  readonly file: string | null;
  readonly details: readonly Row[];
  readonly usedBy: readonly Link[];
}
export interface AssumptionView extends InputView {
  readonly how: string;
  readonly by: string;
  readonly required: boolean;
  readonly state: string;
}
export interface CheckView {
  readonly kind: "check";
  readonly number: string;
  readonly anchor: string;
  readonly title: string;
  readonly value: string;
  /** The same for a column of values. */
  readonly shown: Aligned;
  readonly sense: string;
  readonly limit: string;
  readonly valueFrom: Link | null;
  readonly limitFrom: Link | null;
  readonly verdict: "passes" | "fails" | "not evaluated";
  readonly margin: string;
  readonly because: string;
  readonly assumptions: readonly Link[];
}
export interface ConclusionView {
  readonly number: string;
  readonly anchor: string;
  readonly title: string;
  readonly sentence: readonly TextRun[];
  readonly standing: string;
  readonly stands: boolean;
  readonly checks: readonly CheckView[];
  readonly assumptions: readonly Link[];
  /** Those of the assumptions that must be verified before approval. */
  readonly unverified: readonly Link[];
  readonly inputs: readonly Link[];
}
export interface StepView {
  readonly kind: "step";
  readonly number: string;
  readonly anchor: string;
  readonly title: string;
  readonly method: Link | null;
  readonly cite: string | null;
  readonly equation: string;
  readonly putIn: string | null;
  readonly rows: readonly Row[];
  readonly result: Row | null;
  readonly stop: string | null;
  readonly findings: readonly string[];
  readonly usedBy: readonly Link[];
}
export interface ObjectView {
  readonly kind: "object" | "run";
  readonly number: string;
  readonly anchor: string;
  readonly title: string;
  readonly method: Link | null;
  readonly about: readonly string[];
  readonly rows: readonly Row[];
  readonly results: readonly Row[];
  readonly tables: readonly TableView[];
  readonly stop: string | null;
  readonly findings: readonly string[];
  readonly diagnostics: readonly { readonly name: string; readonly value: string }[];
  readonly usedBy: readonly Link[];
}
export interface ComparisonView {
  readonly kind: "comparison";
  readonly number: string;
  readonly anchor: string;
  readonly title: string;
  readonly main: Row;
  readonly alternate: Row;
  readonly difference: string;
  readonly because: string;
}
export interface TableCell {
  readonly text: string;
  /** Where the value comes from. */
  readonly to: string | null;
  readonly padding: string;
}
export interface TableView {
  readonly kind: "table";
  readonly number: string | null;
  readonly anchor: string;
  readonly caption: string;
  readonly columns: readonly {
    readonly head: string;
    readonly unit: string;
    readonly numeric: boolean;
  }[];
  readonly rows: readonly (readonly TableCell[])[];
  /** What the reader must know about the entries. */
  readonly notes: readonly string[];
}
export interface Series {
  readonly label: string;
  readonly depth: readonly number[];
  readonly value: readonly number[];
}
/** A well drawn to scale in depth beside curves on the same depths. Numbers are in the display units. */
export interface DepthDrawing {
  readonly drawing: "well-and-depth";
  readonly depthUnit: string;
  /** Depth units in a metre: bores are in metres. */
  readonly perMetre: number;
  readonly top: number;
  readonly base: number;
  readonly sections: readonly {
    readonly name: string;
    readonly wall: "casing" | "liner" | "open hole";
    readonly top: number;
    readonly base: number;
    /** Inside diameter in metres: only proportions are drawn. */
    readonly bore: number;
  }[];
  readonly pack: { readonly top: number; readonly base: number } | null;
  readonly xTitle: string;
  /** Unit of all series. */
  readonly unit: string;
  readonly series: readonly Series[];
  readonly marks: readonly { readonly depth: number; readonly label: string }[];
}
export interface FigureView {
  readonly kind: "figure";
  readonly number: string;
  readonly anchor: string;
  readonly caption: string;
  readonly drawing: DepthDrawing | null;
  readonly stop: string | null;
  /** The same data as a table, for readers who cannot use the drawing. */
  readonly alternative: TableView | null;
}
export interface CautionView {
  readonly kind: "caution";
  readonly number: string;
  readonly anchor: string;
  readonly text: string;
}
export type Block =
  StepView | ObjectView | ComparisonView | CheckView | TableView | FigureView | CautionView;
export interface SectionView {
  readonly anchor: string;
  readonly title: string;
  readonly about: string | null;
  readonly blocks: readonly Block[];
}
export interface MethodView {
  readonly number: string;
  readonly anchor: string;
  readonly id: string;
  readonly revision: number;
  readonly title: string;
  readonly equation: string;
  readonly symbols: readonly {
    readonly symbol: string;
    readonly meaning: string;
    readonly unit: string;
  }[];
  readonly source: {
    readonly number: string | null;
    readonly to: string | null;
    readonly where: string;
  };
  readonly ranges: readonly string[];
  readonly checks: readonly string[];
  readonly direction: string | null;
  readonly usedIn: readonly Link[];
}
export interface ModelView {
  readonly number: string;
  readonly anchor: string;
  readonly id: string;
  readonly revision: number;
  readonly title: string;
  readonly about: readonly string[];
  readonly methods: readonly Link[];
  readonly tolerances: readonly { readonly name: string; readonly value: string }[];
  readonly usedIn: readonly Link[];
}
export interface OpenItem {
  readonly text: string;
  readonly at: Link | null;
  readonly blocksApproval: boolean;
}
export interface ReferenceView {
  readonly number: string;
  readonly anchor: string;
  readonly id: string;
}
export interface PackageView {
  readonly cover: {
    readonly title: string;
    readonly number: string;
    readonly revision: string;
    readonly status: string;
    readonly statusBecause: readonly string[];
    /** When the record was made, UTC. */
    readonly recorded: string;
    readonly hash: string;
    readonly prepared: string;
    readonly checked: string;
    readonly approved: string;
    readonly disclaimer: string | null;
  };
  readonly revisions: readonly {
    readonly revision: string;
    readonly what: string;
    readonly hash: string;
  }[];
  readonly purpose: string;
  readonly decision: string;
  readonly conclusions: readonly ConclusionView[];
  readonly cautions: readonly { readonly text: string; readonly from: Link | null }[];
  readonly limits: readonly { readonly text: string; readonly at: Link }[];
  readonly inputs: readonly InputView[];
  readonly assumptions: readonly AssumptionView[];
  readonly methods: readonly MethodView[];
  readonly models: readonly ModelView[];
  readonly sections: readonly SectionView[];
  readonly comparisons: readonly ComparisonView[];
  readonly uncertainty: string;
  readonly open: readonly OpenItem[];
  readonly references: readonly ReferenceView[];
  readonly software: readonly { readonly name: string; readonly value: string }[];
  readonly hash: string;
}
