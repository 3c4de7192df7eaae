// Evaluates the TeX of a formula by what it looks like on paper, so that a missing pair of
// parentheses shows as another value. Only what formulas are set in is understood.

const FUNCTIONS: { readonly [name: string]: (...x: number[]) => number } = {
  exp: Math.exp,
  arctan: Math.atan,
  min: Math.min,
  max: Math.max,
};

export function readTex(tex: string, values: { readonly [name: string]: number }): number {
  const all =
    tex.match(/\\left[(|]|\\right[)|]|\\[a-z]+|\\,|\d+\.?\d*|\.\d+|[A-Za-z]\w*|[-+^{},]/g) ?? [];
  if (all.join("") !== tex.replaceAll(" ", "")) throw new Error(`cannot read ${tex}`);
  const tokens = withoutUnseenBraces(all);
  let i = 0;
  const is = (t: string): boolean => tokens[i] === t;
  const take = (t: string): boolean => is(t) && ++i > 0;
  const need = (t: string): void => {
    if (!take(t)) throw new Error(`wanted ${t} at ${i} of ${tex}`);
  };
  const sum = (): number => {
    let x = take("-") ? -product() : product();
    for (;;) {
      if (take("+")) x += product();
      else if (take("-")) x -= product();
      else return x;
    }
  };
  const product = (): number => {
    let x = power();
    while (take("\\,") || take("\\cdot") || take("\\times")) x *= power();
    return x;
  };
  const power = (): number => {
    const base = atom();
    return take("^") ? base ** group() : base;
  };
  const group = (): number => {
    need("{");
    const x = sum();
    need("}");
    return x;
  };
  const atom = (): number => {
    const t = tokens[i++] ?? "";
    if (t === "\\left(") {
      const x = sum();
      need("\\right)");
      return x;
    }
    if (t === "\\left|") {
      const x = sum();
      need("\\right|");
      return Math.abs(x);
    }
    if (t === "\\frac") return group() / group();
    if (t === "\\sqrt") return Math.sqrt(group());
    if (t === "\\pi") return Math.PI;
    const f = FUNCTIONS[t.slice(1)];
    if (f) {
      need("\\left(");
      const args = [sum()];
      while (take(",")) args.push(sum());
      need("\\right)");
      return f(...args);
    }
    if (/^[.\d]/.test(t)) return Number(t);
    const x = values[t];
    if (x === undefined) throw new Error(`no value for ${t} in ${tex}`);
    return x;
  };
  const x = sum();
  if (i < tokens.length) throw new Error(`${tokens[i] ?? ""} is left over in ${tex}`);
  return x;
}

/** Braces that hold no argument do not show on paper: what is in them continues the line. */
function withoutUnseenBraces(tokens: readonly string[]): string[] {
  const seen: string[] = [];
  const open: ("argument" | "first of two" | "unseen")[] = [];
  let closed: string | undefined;
  for (const t of tokens) {
    const before = seen[seen.length - 1];
    if (t === "{") {
      if (before === "\\frac") open.push("first of two");
      else if (before === "^" || before === "\\sqrt" || closed === "first of two")
        open.push("argument");
      else open.push("unseen");
    }
    const kind = open[open.length - 1];
    if (!(/[{}]/.test(t) && kind === "unseen")) seen.push(t);
    closed = t === "}" ? open.pop() : undefined;
  }
  return seen;
}
