export * from "./find-root.js";
