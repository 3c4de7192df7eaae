import type { Body, Item } from "../study/index.js";
import { methodsApplied } from "./methods-applied.js";
import type { Link } from "./view.js";

const LETTER: { readonly [op in Item["op"]]: string } = {
  given: "I",
  assumed: "A",
  entity: "O",
  step: "S",
  run: "S",
  formula: "S",
  compare: "D",
  check: "K",
  conclude: "C",
  caution: "W",
  figure: "Figure ",
  table: "Table ",
};

/** The number and the anchor of every item, method and model: I1, A1, S1 … in the order of the record. */
export class Numbering {
  private readonly numbers = new Map<string, string>();
  private readonly titles = new Map<string, string>();
  private readonly declared = new Map<string, Link>();
  constructor(body: Body) {
    const applied = methodsApplied(body);
    const declare = (letter: string, role: "method" | "model"): void =>
      body.declared
        .filter((d) => d.role === role && (role === "model" || applied.has(d.id)))
        .forEach(({ id, title }, i) =>
          this.declared.set(id, { text: `${letter}${i + 1} ${title}`, to: `method-${id}` }),
        );
    declare("M", "method");
    declare("P", "model");
    const counts = new Map<string, number>();
    for (const item of body.items) {
      const letter = LETTER[item.op];
      const n = (counts.get(letter) ?? 0) + 1;
      counts.set(letter, n);
      this.numbers.set(item.id, `${letter}${n}`);
      this.titles.set(item.id, item.title);
    }
  }
  of(id: string): string {
    return this.numbers.get(id) ?? id;
  }
  /** A method or model that took part, with its number and title. */
  method(id: string): Link | null {
    return this.declared.get(id) ?? null;
  }
  methodNumber(id: string): string {
    return this.declared.get(id)?.text.split(" ")[0] ?? "";
  }
  anchor(id: string): string {
    return `item-${id}`;
  }
  link(id: string): Link {
    return { text: this.of(id), to: this.anchor(id) };
  }
  titled(id: string): Link {
    return { text: `${this.of(id)} ${this.titles.get(id) ?? ""}`.trim(), to: this.anchor(id) };
  }
}
