export * from "./falling-body.js";
export * from "./grade.js";
export * from "./liquid.js";
export * from "./shapes.js";
export * from "./solid-material.js";
export * from "./solid-materials.js";
