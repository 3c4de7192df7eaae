export * from "./cautions.js";
export * from "./figures/chart.js";
export * from "./figures/descent-chart.js";
export * from "./figures/pack-chart.js";
export * from "./figures/registry.js";
export * from "./package-view.js";
export * from "./view.js";
