export * from "./catalogue.js";
export * from "./display.js";
export * from "./format.js";
export * from "./kinds.js";
export * from "./lookup.js";
export * from "./mixed-number.js";
export * from "./quantity.js";
export * from "./unit.js";
