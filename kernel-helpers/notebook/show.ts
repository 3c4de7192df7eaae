import type { MimeBundle } from "./cell-outputs.js";
import { present } from "./present.js";

/** Under this symbol our kernel offers to put out a mime bundle in the cell that runs. */
export const PUBLISH = Symbol.for("stillwell.publish");

/**
 * Shows a value in the middle of a cell, as the last expression of a cell is shown. In another
 * TypeScript kernel it takes the richest format only; outside a notebook it prints the plain text.
 */
export async function show(value: unknown): Promise<void> {
  const bundle = await present(value);
  const publish: unknown = Reflect.get(globalThis, PUBLISH);
  if (typeof publish === "function") (publish as (bundle: MimeBundle) => void)(bundle);
  else if (!showInTslab(bundle)) console.log(bundle["text/plain"]);
}

const RICHEST_FIRST = ["text/html", "image/svg+xml", "text/markdown", "text/latex"];

function showInTslab(bundle: MimeBundle): boolean {
  const host: unknown = Reflect.get(globalThis, "__tslab__");
  const mime = RICHEST_FIRST.find((m) => typeof bundle[m] === "string");
  if (mime === undefined || !isTslab(host)) return false;
  host.require("tslab").display.raw(mime, String(bundle[mime]));
  return true;
}

interface Tslab {
  require(id: "tslab"): { display: { raw(mime: string, data: string): void } };
}
const isTslab = (x: unknown): x is Tslab =>
  typeof x === "object" && x !== null && "require" in x && typeof x.require === "function";
