export * from "./browser/index.js";
export * from "./citations/index.js";
export * from "./fonts/index.js";
export * from "./math/index.js";
export * from "./pdf/index.js";
export * from "./package/index.js";
