export * from "./read-json-file.js";
export * from "./read-record.js";
export * from "./write-atomic.js";
