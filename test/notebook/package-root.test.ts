import { existsSync } from "node:fs";
import { join, parse } from "node:path";
import { expect, it } from "vitest";
import { kernelCommand, kernelSpec } from "../../kernel-helpers/notebook/kernel-command.js";
import { packageRoot } from "../../kernel-helpers/notebook/package-root.js";
import { codeOf } from "../code-of.js";

it("the package is found from its sources and from what is compiled", () => {
  const root = packageRoot();
  expect(existsSync(join(root, "bin", "kernel.cjs"))).toBe(true);
  expect(packageRoot(join(root, "dist", "notebook", "package-root.js"))).toBe(root);
});

it("a file outside the package is refused", () => {
  expect(codeOf(() => packageRoot(join(parse(process.cwd()).root, "x.js")))).toBe("no-package");
});

it("a front end is told to start our kernel with its connection file", () => {
  const [node, bin = "", file] = kernelCommand();
  expect([node, file]).toEqual([process.execPath, "{connection_file}"]);
  expect(existsSync(bin)).toBe(true);
  expect(kernelSpec()).toMatchObject({ argv: kernelCommand(), language: "typescript" });
});
