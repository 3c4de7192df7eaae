import { InputError } from "../../errors/index.js";
import {
  constants,
  functions,
  type Expression,
  type Formula,
  type FunctionName,
} from "./expression.js";

interface Token {
  readonly kind: "number" | "name" | "sign" | "end";
  readonly text: string;
  readonly at: number;
}

const LONGEST = 2000;
const DEEPEST = 100;

/**
 * Text → formula. Numbers, names, + − * / ^ (right-associative, above the unary minus), parentheses and
 * a few functions; `pi` and `g` are constants unless `shadowed` names them as values of one's own.
 */
export function parseFormula(text: string, shadowed: readonly string[] = []): Formula {
  const tokens = tokenize(text);
  let i = 0;
  let depth = 0;
  const names: string[] = [];
  const peek = (): Token => tokens[i] ?? { kind: "end", text: "", at: text.length };
  const take = (sign: string): boolean => {
    if (peek().kind !== "sign" || peek().text !== sign) return false;
    i += 1;
    return true;
  };
  const need = (sign: string): void => {
    if (!take(sign)) throw wrong(text, peek(), `"${sign}"`);
  };
  const sum = (): Expression => {
    let left = product();
    for (;;) {
      const op = take("+") ? "+" : take("-") ? "-" : null;
      if (!op) return left;
      left = { node: "binary", op, left, right: product() };
    }
  };
  const product = (): Expression => {
    let left = signed();
    for (;;) {
      const op = take("*") ? "*" : take("/") ? "/" : null;
      if (!op) return left;
      left = { node: "binary", op, left, right: signed() };
    }
  };
  // Every way to nest, by a sign, a power, parentheses or a call, passes here.
  const signed = (): Expression => {
    depth += 1;
    if (depth > DEEPEST) throw wrong(text, peek(), `a formula nested less than ${DEEPEST} deep`);
    const inner: Expression = take("-")
      ? { node: "minus", of: signed() }
      : take("+")
        ? signed()
        : power();
    depth -= 1;
    return inner;
  };
  const power = (): Expression => {
    const left = atom();
    return take("^") ? { node: "binary", op: "^", left, right: signed() } : left;
  };
  const atom = (): Expression => {
    const t = peek();
    if (take("(")) {
      const inner = sum();
      need(")");
      return inner;
    }
    i += 1;
    if (t.kind === "number") {
      const value = Number(t.text);
      if (!Number.isFinite(value)) throw wrong(text, t, "a finite number");
      return { node: "number", value, typed: t.text };
    }
    if (t.kind !== "name") {
      i -= 1;
      throw wrong(text, t, "a number, a name or an opening parenthesis");
    }
    if (peek().kind === "sign" && peek().text === "(") return call(t);
    if (Object.hasOwn(constants, t.text) && !shadowed.includes(t.text))
      return { node: "constant", name: t.text as keyof typeof constants };
    if (!names.includes(t.text)) names.push(t.text);
    return { node: "name", name: t.text };
  };
  const call = (t: Token): Expression => {
    if (!Object.hasOwn(functions, t.text))
      throw wrong(text, t, `a function: ${Object.keys(functions).join(", ")}`);
    need("(");
    const args = [sum()];
    while (take(",")) args.push(sum());
    need(")");
    const many = t.text === "min" || t.text === "max";
    if (many ? args.length < 2 : args.length !== 1)
      throw wrong(
        text,
        t,
        `${t.text} with ${many ? "two arguments or more" : "one argument"}, got ${args.length}`,
      );
    return { node: "call", fn: t.text as FunctionName, args };
  };
  const tree = sum();
  if (peek().kind !== "end") throw wrong(text, peek(), "an operator or the end");
  return { text, tree, names };
}

function tokenize(text: string): Token[] {
  if (text.length > LONGEST)
    throw new InputError({
      code: "not-a-formula",
      where: `formula "${text.slice(0, 60)}…"`,
      problem: `is ${text.length} characters long`,
      expected: `at most ${LONGEST}`,
    });
  const out: Token[] = [];
  const pattern =
    /\s*(?:(\d+\.?\d*(?:[eE][+-]?\d+)?|\.\d+(?:[eE][+-]?\d+)?)|([A-Za-z_][A-Za-z0-9_]*)|([-+*/^(),]))/y;
  let at = 0;
  while (text.slice(at).trim() !== "") {
    pattern.lastIndex = at;
    const found = pattern.exec(text);
    const start = at + (/^\s*/.exec(text.slice(at))?.[0].length ?? 0);
    if (!found)
      throw wrong(
        text,
        { kind: "sign", text: text.charAt(start), at: start },
        "a number, a name or one of + - * / ^ ( ) ,",
      );
    const [, number, name, sign] = found;
    out.push({
      kind: number ? "number" : name ? "name" : "sign",
      text: number ?? name ?? sign ?? "",
      at: start,
    });
    at = pattern.lastIndex;
  }
  return out;
}

const wrong = (text: string, t: Token, expected: string): InputError =>
  new InputError({
    code: "not-a-formula",
    where: `formula "${text}"`,
    problem: t.kind === "end" ? "ends too early" : `has "${t.text}" at character ${t.at + 1}`,
    expected,
  });
