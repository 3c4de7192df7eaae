import { isStop, type Finding, type Stop, type Type, type Use } from "../method/index.js";
import { decode, type Get } from "./decode.js";
import type { Result } from "./item.js";
import type { Node } from "./node.js";
import { plain } from "./plain.js";

export interface Done {
  readonly type: Type;
  readonly live: unknown;
  readonly result: Result;
  readonly findings: readonly Finding[];
  readonly looked: readonly string[];
  readonly diagnostics: { readonly [name: string]: number | string };
}

/**
 * Thrown by `get` when an input ended without a value: the outcome travels on, it never becomes a number.
 * An error only so that it can be thrown: nobody sees it.
 */
export class Blocked extends Error {
  constructor(readonly by: string) {
    super(by);
  }
}

/** The one evaluator, for recording and for replay. */
export function evaluate(
  use: Use,
  id: string,
  args: { readonly [name: string]: Node },
  get: Get,
): Done {
  try {
    const values = Object.fromEntries(
      Object.entries(use.inputs).map(([n, f]) => [
        n,
        decode(f.kind, args[n] ?? { absent: true }, get, `${id}.${n}`),
      ]),
    );
    const { live, findings, looked, diagnostics } = use.apply(values);
    const result: Result = isStop(live)
      ? { stop: live.stop, because: live.because }
      : { value: plain(use.output, live, id) };
    return { type: use.output, live, result, findings, looked, diagnostics };
  } catch (e) {
    if (!(e instanceof Blocked)) throw e;
    const stop: Stop = { stop: "blocked", because: `"${e.by}" ended without a value` };
    return {
      type: use.output,
      live: stop,
      result: stop,
      findings: [],
      looked: [],
      diagnostics: {},
    };
  }
}
