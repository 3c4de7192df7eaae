export * from "./render-html.js";
export * from "./write-package.js";
