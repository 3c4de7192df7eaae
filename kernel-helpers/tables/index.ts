export * from "./column.js";
export * from "./frame.js";
export type { Frame, Slice } from "./guard-frame.js";
export * from "./to-csv.js";
