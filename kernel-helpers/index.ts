export * from "./errors/index.js";
export * from "./units/index.js";
export * from "./method/index.js";
export * from "./physics/bed/ergun-1952.js";
