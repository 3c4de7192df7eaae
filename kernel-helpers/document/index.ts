export * from "./cautions.js";
export * from "./figures/chart.js";
export * from "./package-view.js";
export * from "./view.js";
