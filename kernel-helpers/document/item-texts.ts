import type { AppliedUse, FormulaItem, Result } from "../study/index.js";
import { sayStop } from "./context.js";

export const stopText = (result: Result): string | null =>
  "stop" in result ? `No value (${sayStop(result.stop)}): ${result.because}.` : null;

export const saysOf = (item: AppliedUse | FormulaItem): string[] =>
  item.findings.map((f) => f.says);
