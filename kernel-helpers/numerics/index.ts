export * from "./expand-bracket.js";
export * from "./find-root.js";
export * from "./integrate.js";
export * from "./integrate-ode.js";
export * from "./linear-table.js";
export * from "./monotone-table.js";
export * from "./ode-problem.js";
export * from "./table-points.js";
