import { readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { NotebookError } from "../../errors/index.js";
import type { MimeBundle } from "../cell-outputs.js";
import type { Endpoints } from "../endpoints.js";
import { packageRoot } from "../package-root.js";
import { PUBLISH } from "../show.js";
import { answers } from "./answers.js";
import { CellRunner } from "./cell-runner.js";
import { LiveOutput } from "./live-output.js";
import { resolveFromPackage } from "./module-resolution.js";
import { Server } from "./server.js";
import { createEngine } from "./tslab.js";
import { endWithStarter } from "./watchdog.js";

/** Runs the kernel until it is asked to end; `file` is the connection file it was started with. */
export async function main(file: string | undefined): Promise<void> {
  const endpoints = readEndpoints(file);
  endWithStarter(process.env["STILLWELL_KERNEL_FOLDER"] ?? null);
  // A kernel that a cell starts has a folder of its own or none.
  delete process.env["STILLWELL_KERNEL_FOLDER"];
  const root = packageRoot();
  resolveFromPackage("stillwell", root);
  dropLoaderWarning();

  const output = new LiveOutput();
  const engine = createEngine({
    root,
    cwd: process.cwd(),
    onDisplay: (content, isUpdate) =>
      output.publish(isUpdate ? "update_display_data" : "display_data", content),
  });
  Reflect.set(globalThis, PUBLISH, (data: MimeBundle) =>
    output.publish("display_data", { data, metadata: {}, transient: {} }),
  );
  const here = dirname(fileURLToPath(import.meta.url));
  const isOurs = (frame: string): boolean =>
    /\(?node:/.test(frame) || frame.includes(here) || engine.isOwnFrame(frame);
  const runner = new CellRunner({
    engine,
    output,
    // Fixed now: a cell may change the working folder.
    drafts: process.env["STILLWELL_DRAFTS"] ?? join(process.cwd(), ".stillwell"),
    isOurs,
  });
  const end = (): void => {
    engine.close();
    void server.close().then(() => process.exit(0));
  };
  const server = new Server({
    endpoints,
    answer: answers({ engine, runner, output, version: versionIn(root), end }),
  });
  process.on("SIGINT", () => runner.interrupt());
  process.on("uncaughtException", (error) => runner.takeStray(error));
  process.on("unhandledRejection", (reason) => runner.takeStray(reason));
  await server.listen();
  output.takeOver();
}

function readEndpoints(file: string | undefined): Endpoints {
  try {
    return JSON.parse(readFileSync(file ?? "", "utf8")) as Endpoints;
  } catch (cause) {
    throw new NotebookError({
      code: "no-connection-file",
      where: "kernel",
      problem: `cannot read the connection file ${file ?? "(none was named)"}`,
      expected: "a path as the one argument, as a notebook front end gives it",
      cause,
    });
  }
}

function versionIn(root: string): string {
  const parsed: unknown = JSON.parse(readFileSync(join(root, "package.json"), "utf8"));
  return typeof parsed === "object" && parsed !== null && "version" in parsed
    ? String(parsed.version)
    : "";
}

/** Node remarks that a cell loads an ES module by `require`; the analyst can do nothing about it. */
function dropLoaderWarning(): void {
  const told = process.listeners("warning");
  process.removeAllListeners("warning");
  process.on("warning", (warning) => {
    if (warning.name === "ExperimentalWarning" && warning.message.includes("require()")) return;
    for (const listener of told) listener(warning);
  });
}
