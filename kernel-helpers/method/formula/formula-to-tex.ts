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

/** A formula in TeX; `symbolOf` gives the TeX of a name: its symbol, or the number put in its place. */
export const formulaToTex = ({ tree }: Formula, symbolOf: (name: string) => string): string =>
  tex(tree, symbolOf, 0);

// 0 sum, 1 product, 2 unary minus, 3 base of a power
function tex(e: Expression, symbolOf: (name: string) => string, context: number): string {
  const wrap = (level: number, s: string): string =>
    level < context ? String.raw`\left(${s}\right)` : s;
  const sub = (x: Expression, c: number): string => tex(x, symbolOf, c);
  switch (e.node) {
    case "number": {
      const [mantissa = "", exponent] = e.typed.toLowerCase().split("e");
      return exponent === undefined
        ? mantissa
        : wrap(1, String.raw`${mantissa}\times 10^{${Number(exponent)}}`);
    }
    case "constant":
      return e.name === "pi" ? String.raw`\pi` : "g";
    case "name":
      return `{${symbolOf(e.name)}}`;
    case "minus":
      return wrap(0, `-${sub(e.of, 2)}`);
    case "call": {
      const args = e.args.map((a) => sub(a, 0)).join(",");
      if (e.fn === "sqrt") return String.raw`\sqrt{${args}}`;
      if (e.fn === "abs") return String.raw`\left|${args}\right|`;
      return String.raw`${NAMED[e.fn] ?? ""}\left(${args}\right)`;
    }
    case "binary":
      switch (e.op) {
        case "+":
          return wrap(0, `${sub(e.left, 0)}+${sub(e.right, 0)}`);
        case "-":
          return wrap(0, `${sub(e.left, 0)}-${sub(e.right, 1)}`);
        case "/":
          return wrap(2, String.raw`\frac{${sub(e.left, 0)}}{${sub(e.right, 0)}}`);
        case "*":
          return wrap(1, product(sub(e.left, 1), sub(e.right, 1)));
        case "^":
          return wrap(2, `${sub(e.left, 3)}^{${sub(e.right, 0)}}`);
      }
  }
}

/** Two factors side by side; a dot where digits would run together. */
const product = (left: string, right: string): string =>
  /\d\}?$/.test(left) && /^\{?[\d(]/.test(right)
    ? String.raw`${left}\cdot ${right}`
    : String.raw`${left}\,${right}`;
