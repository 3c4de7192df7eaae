import { join } from "node:path";
import { packageRoot } from "./package-root.js";

/** What starts our kernel; `{connection_file}` stands for the path of the connection file. */
export const kernelCommand = (): readonly string[] => [
  process.execPath,
  join(packageRoot(), "bin", "kernel.cjs"),
  "{connection_file}",
];

/** A Jupyter kernelspec. */
export interface KernelSpec {
  readonly argv: readonly string[];
  readonly display_name: string;
  readonly language: string;
  readonly interrupt_mode: "signal";
}

/** What a front end is told, so that it offers our kernel. */
export const kernelSpec = (): KernelSpec => ({
  argv: kernelCommand(),
  display_name: "Stillwell (TypeScript)",
  language: "typescript",
  interrupt_mode: "signal",
});
