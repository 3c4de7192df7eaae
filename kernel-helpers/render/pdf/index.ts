export {
  pageCss,
  pageOfPages,
  type PaperSize,
  type Running,
  type RunningLine,
  type RunningPart,
} from "./page-css.js";
export { printPdf, type PdfInfo, type PrintedPdf } from "./print-pdf.js";
export { readPdf, type PdfFacts } from "./read-pdf.js";
