export { Passage } from "./descent/descent-results.js";
export * from "./descent.js";
export { PackPart } from "./pack/pack-results.js";
export * from "./pack-to-cut.js";
export * from "./registry.js";
export * from "./resting-pack.js";
export * from "./standard-registry.js";
