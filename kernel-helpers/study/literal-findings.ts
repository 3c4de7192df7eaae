import type { Finding } from "../method/index.js";
import type { Kind } from "../units/index.js";
import { literals, type Node } from "./node.js";

/** Recorded numbers by kind and value, to notice a number typed again where a reference belongs. */
export class KnownNumbers {
  private readonly byValue = new Map<string, string>();
  note(id: string, kind: Kind, si: number): void {
    if (si !== 0 && si !== 1) this.byValue.set(`${kind} ${si}`, id);
  }
  /** A bare number equal to a recorded one: its source, its spread and its edge are lost. */
  findings(args: { readonly [name: string]: Node }, id: string): Finding[] {
    return Object.entries(args)
      .flatMap(([name, node]) => literals(node, name))
      .flatMap(({ where, si, kind }): Finding[] => {
        const same = this.byValue.get(`${kind} ${si}`);
        return same === undefined
          ? []
          : [
              {
                code: "pass-the-reference",
                by: id,
                says: `${where} is a number equal to the recorded "${same}"; pass the reference, so that the edge is kept`,
              },
            ];
      });
  }
}
