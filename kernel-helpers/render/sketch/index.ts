export { sideBySide } from "./side-by-side.js";
export { wellSketch, type SketchSection, type WellSketch } from "./well-sketch.js";
