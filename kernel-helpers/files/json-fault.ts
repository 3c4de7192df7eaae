/** Where a text stops being JSON. */
export interface JsonFault {
  readonly line: number;
  readonly column: number;
  /** Whether it is right as far as it goes, as a file that was cut off. */
  readonly isCutOff: boolean;
}

/** The first place where a text is not JSON (RFC 8259), or null when it is. */
export function jsonFault(text: string): JsonFault | null {
  const at = new JsonScan(text).fault();
  if (at === null) return null;
  const before = text.slice(0, at).split("\n");
  return {
    line: before.length,
    column: (before[before.length - 1] ?? "").length + 1,
    isCutOff: at >= text.length,
  };
}

const SPACE = /[ \t\n\r]*/y;
const NUMBER = /-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?/y;
// Up to the first character that a string cannot hold there.
const STRING_PART = /"(?:[^"\\\u0000-\u001f]+|\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4}))*/y;

// What is left of an escape, a fraction or an exponent where a file was cut off.
const STRING_STUMP = /\\(?:u[0-9a-fA-F]{0,3})?$/y;
const NUMBER_STUMP = /(?:\.|[eE][+-]?)$/y;

/** A recogniser with its own stack, so that no depth of nesting overflows. */
class JsonScan {
  private at = 0;
  constructor(private readonly text: string) {}

  fault(): number | null {
    const open: ("{" | "[")[] = [];
    let wants: "value" | "value or end" | "name" | "name or end" | "next" = "value";
    for (;;) {
      this.take(SPACE);
      const c = this.text[this.at];
      const inside = open[open.length - 1];
      if (wants === "next") {
        if (inside === undefined) return this.at < this.text.length ? this.at : null;
        if (c === ",") wants = inside === "{" ? "name" : "value";
        else if (c === (inside === "{" ? "}" : "]")) open.pop();
        else return this.at;
        this.at++;
      } else if (
        (wants === "value or end" && c === "]") ||
        (wants === "name or end" && c === "}")
      ) {
        open.pop();
        wants = "next";
        this.at++;
      } else if (wants === "name" || wants === "name or end") {
        if (!this.string()) return this.at;
        this.take(SPACE);
        if (this.text[this.at] !== ":") return this.at;
        this.at++;
        wants = "value";
      } else if (c === "{" || c === "[") {
        open.push(c);
        wants = c === "{" ? "name or end" : "value or end";
        this.at++;
      } else if (this.scalar(c)) wants = "next";
      else return this.at;
    }
  }

  private scalar(c: string | undefined): boolean {
    if (c === '"') return this.string();
    const word = c === "t" ? "true" : c === "f" ? "false" : c === "n" ? "null" : null;
    if (word === null) return this.number();
    for (const letter of word) {
      if (this.text[this.at] !== letter) return false;
      this.at++;
    }
    return true;
  }

  private number(): boolean {
    if (this.take(NUMBER)) return !this.take(NUMBER_STUMP);
    // A lone minus sign: the fault is after it.
    if (this.text[this.at] === "-") this.at++;
    return false;
  }

  private string(): boolean {
    if (!this.take(STRING_PART)) return false;
    if (this.text[this.at] !== '"') {
      this.take(STRING_STUMP);
      return false;
    }
    this.at++;
    return true;
  }

  private take(pattern: RegExp): boolean {
    pattern.lastIndex = this.at;
    const found = pattern.exec(this.text);
    if (!found) return false;
    this.at = pattern.lastIndex;
    return true;
  }
}
