export * from "./di-felice-1996.js";
export * from "./francis-1933.js";
export * from "./haberman-sayre-1958.js";
export * from "./munroe-1888.js";
