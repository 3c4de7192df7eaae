export { escapeHtml } from "./escape-html.js";
export { typesetHtml, typesetSvg } from "./typeset.js";
