import { NotebookError } from "../errors/index.js";
import type { MimeBundle } from "./cell-outputs.js";
import type { Presenter } from "./presenter.js";

// A convention shared with other kernels: a method under this symbol returns a mime bundle, or a
// promise of one.
const DISPLAY = Symbol.for("Jupyter.display");

interface SelfShown {
  [DISPLAY](): unknown;
}
const isSelfShown = (x: unknown): x is SelfShown =>
  ((typeof x === "object" && x !== null) || typeof x === "function") &&
  typeof (x as Partial<SelfShown>)[DISPLAY] === "function";

/** Values that bring their own display. */
export const presentSelfShown: Presenter = {
  claims: isSelfShown,
  bundle: async (value) => {
    const bundle = isSelfShown(value) ? await value[DISPLAY]() : null;
    if (!isBundle(bundle))
      throw new NotebookError({
        code: "not-a-mime-bundle",
        where: 'Symbol.for("Jupyter.display")',
        problem: `returned ${bundle === null ? "null" : typeof bundle}`,
        expected: 'an object of mime types, such as { "text/html": "…" }',
      });
    return Object.fromEntries(Object.entries(bundle).map(([mime, x]) => [mime, plain(x)]));
  },
};

const isBundle = (x: unknown): x is MimeBundle =>
  typeof x === "object" && x !== null && Object.keys(x).every((mime) => mime.includes("/"));

/** Bytes travel as base64. */
const plain = (x: unknown): unknown =>
  x instanceof Uint8Array ? Buffer.from(x).toString("base64") : x;
