export { mathRenderer, renderMath, type MathInput, type MathRenderer } from "./render-math.js";
export { texToWords } from "./tex-to-words.js";
