import { InputError } from "../../errors/index.js";
import { kinds, type Dimension } from "../../units/index.js";
import type { Expression, Formula } from "./expression.js";

const NONE: Dimension = [0, 0, 0, 0];
const G: Dimension = [0, 1, -2, 0];
const map = ([M, L, T, K]: Dimension, f: (x: number, i: number) => number): Dimension => [
  f(M, 0),
  f(L, 1),
  f(T, 2),
  f(K, 3),
];
const same = (a: Dimension, b: Dimension): boolean =>
  a.every((x, i) => Math.abs(x - (b[i] ?? 0)) < 1e-12);

/** The dimension a formula gives; throws where it adds unlike things or takes the exponential of one with a dimension. */
export function dimensionOf(
  { tree, text }: Formula,
  dims: { readonly [name: string]: Dimension },
): Dimension {
  return walk(tree, dims, text);
}

function walk(
  e: Expression,
  dims: { readonly [name: string]: Dimension },
  text: string,
): Dimension {
  const of = (x: Expression): Dimension => walk(x, dims, text);
  switch (e.node) {
    case "number":
      return NONE;
    case "constant":
      return e.name === "g" ? G : NONE;
    case "name":
      return (
        (Object.hasOwn(dims, e.name) ? dims[e.name] : undefined) ??
        fail(text, `does not know the dimension of "${e.name}"`)
      );
    case "minus":
      return of(e.of);
    case "call": {
      // Nothing is the same in every unit: max(0, v) is a velocity.
      const isNothing = (x: Expression): boolean => x.node === "number" && x.value === 0;
      const args = (e.args.every(isNothing) ? e.args : e.args.filter((x) => !isNothing(x))).map(of);
      const [first = NONE] = args;
      if (e.fn === "sqrt") return map(first, (x) => x / 2);
      if (e.fn === "abs") return first;
      if (e.fn === "min" || e.fn === "max") {
        const other = args.find((d) => !same(d, first));
        return other
          ? fail(text, `cannot take the ${e.fn} of ${sayLike(first)} and ${sayLike(other)}`)
          : first;
      }
      return same(first, NONE) ? NONE : fail(text, `cannot take ${e.fn} of ${sayLike(first)}`);
    }
    case "binary": {
      const a = of(e.left);
      const b = of(e.right);
      if (e.op === "*") return map(a, (x, i) => x + (b[i] ?? 0));
      if (e.op === "/") return map(a, (x, i) => x - (b[i] ?? 0));
      if (e.op === "^") {
        if (!same(b, NONE)) return fail(text, `cannot raise to the power of ${sayLike(b)}`);
        if (same(a, NONE)) return NONE;
        const n = plainNumber(e.right);
        return n === null
          ? fail(text, `cannot raise ${sayLike(a)} to a power that is not a plain number`)
          : map(a, (x) => x * n);
      }
      if (same(a, b)) return a;
      return fail(
        text,
        e.op === "+"
          ? `cannot add ${sayLike(b)} to ${sayLike(a)}`
          : `cannot subtract ${sayLike(b)} from ${sayLike(a)}`,
      );
    }
  }
}

/** An exponent that is known without values: a number, its negative, or a fraction of two. */
function plainNumber(e: Expression): number | null {
  if (e.node === "number") return e.value;
  if (e.node === "minus") {
    const x = plainNumber(e.of);
    return x === null ? null : -x;
  }
  if (e.node !== "binary") return null;
  const [a, b] = [plainNumber(e.left), plainNumber(e.right)];
  if (a === null || b === null) return null;
  return e.op === "/"
    ? a / b
    : e.op === "*"
      ? a * b
      : e.op === "+"
        ? a + b
        : e.op === "-"
          ? a - b
          : a ** b;
}

/** The first kind of that dimension, in words. */
function sayLike(d: Dimension): string {
  const found = Object.values(kinds).find((k) => same(k.dimension, d));
  return found
    ? found.words
    : `something of dimension ${d.map((x, i) => `${"MLTΘ".charAt(i)}^${x}`).join(" ")}`;
}
const fail = (text: string, problem: string): never => {
  throw new InputError({ code: "wrong-dimension", where: `formula "${text}"`, problem });
};
