export * from "./stillwell-error.js";
