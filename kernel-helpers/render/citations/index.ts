export { formatReference } from "./format-reference.js";
export { numberCitations, type CitationNumbers } from "./number-citations.js";
