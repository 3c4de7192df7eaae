export * from "./bore-section.js";
export * from "./well.js";
