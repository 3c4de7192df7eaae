import { accents, functions, operators, prefixes, silent, values } from "./tex-dictionary.js";
import { texTokens, type TexToken } from "./tex-tokens.js";

/** A formula as far as it matters for reading it aloud. */
export type TexNode =
  | {
      readonly kind: "number" | "symbol" | "words" | "operator" | "prefix" | "function";
      readonly text: string;
    }
  | { readonly kind: "row"; readonly items: readonly TexNode[] }
  | { readonly kind: "bracket" | "absolute"; readonly inner: TexNode }
  | { readonly kind: "fraction"; readonly over: TexNode; readonly under: TexNode }
  | { readonly kind: "root"; readonly degree: TexNode | null; readonly inner: TexNode }
  | { readonly kind: "accent"; readonly base: TexNode; readonly text: string }
  | {
      readonly kind: "scripts";
      readonly base: TexNode;
      readonly sub: TexNode | null;
      readonly sup: TexNode | null;
    }
  | { readonly kind: "cases" | "lines"; readonly rows: readonly TexNode[] };

export const texTree = (tex: string): TexNode => new Parser(texTokens(tex)).whole();

const leaves = [
  ["symbol", values],
  ["operator", operators],
  ["prefix", prefixes],
  ["function", functions],
] as const;
const fractions = new Set(["\\frac", "\\dfrac", "\\tfrac", "\\cfrac"]);
const brackets: Readonly<Record<string, readonly string[]>> = {
  "(": [")", "]"],
  "[": ["]", ")"],
  "\\{": ["\\}"],
  "\\lbrace": ["\\rbrace"],
};
const bars = ["|", "\\vert", "\\lvert", "\\rvert"];

const row = (items: readonly TexNode[]): TexNode => {
  const only = items[0];
  return items.length === 1 && only ? only : { kind: "row", items };
};

class Parser {
  private at = 0;
  constructor(private readonly tokens: readonly TexToken[]) {}

  whole(): TexNode {
    const items: TexNode[] = [];
    while (this.peek()) {
      items.push(...this.row([]));
      this.next(); // a closing mark without an opening one
    }
    return row(items);
  }

  /** Everything up to one of the marks, which is left standing, or to the end of the group. */
  private row(ends: readonly string[]): TexNode[] {
    const items: TexNode[] = [];
    while (this.peek() && !this.isOneOf([...ends, "}", "\\right", "\\end"])) {
      if (this.isOneOf(["^", "_", "'"])) this.script(items);
      else items.push(...this.item());
    }
    return items;
  }

  /** A raised or lowered part belongs to the item before it. */
  private script(items: TexNode[]): void {
    const mark = this.next()?.text;
    const last = items.pop() ?? row([]);
    const known = last.kind === "scripts" ? last : { base: last, sub: null, sup: null };
    const part: TexNode = mark === "'" ? { kind: "symbol", text: "prime" } : this.argument();
    const joined = (old: TexNode | null): TexNode => (old ? row([old, part]) : part);
    items.push(
      mark === "_"
        ? { kind: "scripts", base: known.base, sub: joined(known.sub), sup: known.sup }
        : { kind: "scripts", base: known.base, sub: known.sub, sup: joined(known.sup) },
    );
  }

  /** One item, or none for a command that only moves things. */
  private item(): readonly TexNode[] {
    const t = this.next();
    if (!t) return [];
    if (t.isWords)
      return [{ kind: t.text === "d" ? "prefix" : t.isText ? "words" : "symbol", text: t.text }];
    const name = t.text;
    if (/^\.?\d/.test(name)) return [{ kind: "number", text: name }];
    for (const [kind, dictionary] of leaves) {
      const text = dictionary[name];
      if (text !== undefined) return [{ kind, text }];
    }
    const accent = accents[name];
    if (accent !== undefined) return [{ kind: "accent", base: this.argument(), text: accent }];
    if (silent.has(name) || name === "&" || name === "~") return [];
    if (name === "{") {
      const inner = row(this.row([]));
      this.skip(["}"]);
      return [inner];
    }
    const closing = brackets[name];
    if (closing) {
      const inner = row(this.row(closing));
      this.skip(closing);
      return [{ kind: "bracket", inner }];
    }
    if (bars.includes(name)) return this.bar();
    if (fractions.has(name))
      return [{ kind: "fraction", over: this.argument(), under: this.argument() }];
    return this.command(name);
  }

  private command(name: string): readonly TexNode[] {
    switch (name) {
      case "\\sqrt": {
        const hasDegree = this.skip(["["]);
        const degree = hasDegree ? row(this.row(["]"])) : null;
        this.skip(["]"]);
        return [{ kind: "root", degree, inner: this.argument() }];
      }
      case "\\left": {
        const mark = this.next()?.text ?? "";
        const inner = row(this.row([]));
        if (this.skip(["\\right"])) this.next();
        if (bars.includes(mark)) return [{ kind: "absolute", inner }];
        return mark === "." ? [inner] : [{ kind: "bracket", inner }];
      }
      case "\\begin":
        return [this.environment()];
      case "\\tag":
      case "\\label":
        this.argument();
        return [];
      case "\\\\":
        return [{ kind: "operator", text: ";" }];
      case "\\%":
        return [{ kind: "words", text: "percent" }];
      case "!":
        return [{ kind: "words", text: "factorial" }];
      case ",":
      case ";":
        return [{ kind: "operator", text: name }];
      default:
        return [{ kind: "symbol", text: name.replace(/^\\/, "") }];
    }
  }

  /** A bar opens an absolute value if another one closes it in the same group. */
  private bar(): readonly TexNode[] {
    const start = this.at;
    const inner = row(this.row(bars));
    if (this.skip(bars)) return [{ kind: "absolute", inner }];
    this.at = start;
    return [{ kind: "operator", text: "given" }];
  }

  private environment(): TexNode {
    const name = this.next()?.text;
    if (name === "array") this.argument(); // its columns
    const isCases = name === "cases";
    const rows: TexNode[] = [];
    let cells: TexNode[] = [];
    for (;;) {
      cells.push(row(this.row(["&", "\\\\"])));
      const mark = this.next()?.text;
      if (mark === "&") continue;
      // Between a case and its condition one pauses; the columns of other environments only align.
      const items = isCases
        ? cells.flatMap((cell, i): TexNode[] =>
            i ? [{ kind: "operator", text: "," }, cell] : [cell],
          )
        : cells;
      if (items.some((cell) => cell.kind !== "row" || cell.items.length > 0)) rows.push(row(items));
      cells = [];
      if (mark !== "\\\\") break;
    }
    this.next();
    return { kind: isCases ? "cases" : "lines", rows };
  }

  private argument(): TexNode {
    if (this.isOneOf(["}", "\\right", "\\end"])) return row([]);
    return row(this.item());
  }

  private peek(): TexToken | undefined {
    return this.tokens[this.at];
  }
  private next(): TexToken | undefined {
    return this.tokens[this.at++];
  }
  private skip(texts: readonly string[]): boolean {
    const isThere = this.isOneOf(texts);
    if (isThere) this.at++;
    return isThere;
  }
  private isOneOf(texts: readonly string[]): boolean {
    const t = this.peek();
    return t !== undefined && !t.isWords && texts.includes(t.text);
  }
}
