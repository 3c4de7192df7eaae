export { fontCss } from "./font-css.js";
export { fontStacks } from "./font-stacks.js";
export { mathCss } from "./math-css.js";
