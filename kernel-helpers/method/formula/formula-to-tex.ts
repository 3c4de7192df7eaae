import type { Expression, Formula, FunctionName } from "./expression.js";

const NAMED: { readonly [F in FunctionName]: string | null } = {
  sqrt: null,
  abs: null,
  exp: String.raw`\exp`,
  ln: String.raw`\ln`,
  log10: String.raw`\log_{10}`,
  sin: String.raw`\sin`,
  cos: String.raw`\cos`,
  tan: String.raw`\tan`,
  asin: String.raw`\arcsin`,
  acos: String.raw`\arccos`,
  atan: String.raw`\arctan`,
  min: String.raw`\min`,
  max: String.raw`\max`,
};

// How tightly a piece holds together; one that holds less than its place needs gets parentheses.
const SUM = 0;
const PRODUCT = 1;
const POWER = 2;
const ATOM = 3;

interface Piece {
  readonly tex: string;
  readonly holds: number;
  /** Begins with a minus sign, so that it may only stand first. */
  readonly isSigned: boolean;
}
const piece = (tex: string, holds: number, isSigned = false): Piece => ({ tex, holds, isSigned });

/**
 * A formula in TeX, with the fewest parentheses. `symbolOf` gives the TeX of a name: its symbol, or
 * the number to put in its place, which gets parentheses where its sign or its power of ten asks for
 * them.
 */
export const formulaToTex = ({ tree }: Formula, symbolOf: (name: string) => string): string =>
  write(tree, symbolOf).tex;

function write(e: Expression, symbolOf: (name: string) => string): Piece {
  const of = (x: Expression): Piece => write(x, symbolOf);
  const first = (x: Expression, least: number): Piece => enclosed(of(x), least);
  const later = (x: Expression, least: number): Piece => {
    const p = of(x);
    return p.isSigned ? enclosed(p, Infinity) : enclosed(p, least);
  };
  switch (e.node) {
    case "number":
      return number(e.typed);
    case "constant":
      return piece(e.name === "pi" ? String.raw`\pi` : "g", ATOM);
    case "name":
      return symbol(symbolOf(e.name));
    case "minus":
      return piece(`-${later(e.of, PRODUCT).tex}`, PRODUCT, true);
    case "call": {
      const args = e.args.map((a) => of(a).tex).join(",");
      if (e.fn === "sqrt") return piece(String.raw`\sqrt{${args}}`, ATOM);
      if (e.fn === "abs") return piece(String.raw`\left|${args}\right|`, ATOM);
      return piece(String.raw`${NAMED[e.fn] ?? ""}\left(${args}\right)`, POWER);
    }
    case "binary":
      switch (e.op) {
        case "+":
        case "-": {
          const left = first(e.left, SUM);
          const right = later(e.right, e.op === "+" ? SUM : PRODUCT);
          return piece(`${left.tex}${e.op}${right.tex}`, SUM, left.isSigned);
        }
        case "*": {
          const left = first(e.left, PRODUCT);
          return piece(sideBySide(left.tex, later(e.right, PRODUCT).tex), PRODUCT, left.isSigned);
        }
        case "/":
          return piece(String.raw`\frac{${of(e.left).tex}}{${of(e.right).tex}}`, POWER);
        case "^":
          return piece(`${later(e.left, ATOM).tex}^{${of(e.right).tex}}`, POWER);
      }
  }
}

const enclosed = (p: Piece, least: number): Piece =>
  p.holds >= least ? p : piece(String.raw`\left(${p.tex}\right)`, ATOM);

function number(typed: string): Piece {
  const [mantissa = "", exponent] = typed.toLowerCase().split("e");
  return exponent === undefined
    ? piece(mantissa, ATOM)
    : piece(String.raw`${mantissa}\times 10^{${Number(exponent)}}`, PRODUCT);
}

/** A symbol, or a number put in its place. */
function symbol(tex: string): Piece {
  const isSigned = /^[-−]/.test(tex);
  const isNumber = /^[-−]?[.\d]/.test(tex);
  if (isNumber && !/^[-−]?[\d.,{}\s\u202f]+$/.test(tex))
    return piece(`{${tex}}`, PRODUCT, isSigned);
  if (isSigned) return piece(`{${tex}}`, PRODUCT, true);
  return piece(`{${tex}}`, tex.includes("^") ? POWER : ATOM);
}

/** Two factors; a dot where digits would run together, or a fraction would read as part of a number. */
const sideBySide = (left: string, right: string): string =>
  /^\{*[.\d]/.test(right) || (/\d\}*$/.test(left) && right.startsWith(String.raw`\frac`))
    ? String.raw`${left}\cdot ${right}`
    : String.raw`${left}\,${right}`;
