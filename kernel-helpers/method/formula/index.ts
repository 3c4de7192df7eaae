export * from "./dimension-of.js";
export * from "./evaluate-formula.js";
export * from "./expression.js";
export * from "./formula-to-tex.js";
export * from "./parse-formula.js";
