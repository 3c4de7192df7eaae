import { SolveError } from "../../errors/index.js";
import { constants, functions, type Expression, type Formula } from "./expression.js";

type Values = { readonly [name: string]: number };
type Run = (values: Values) => number;

const compiled = new WeakMap<Formula, Run>();

/**
 * The value of a formula. A division by zero, the root of a negative number, an overflow on the way
 * and the like are named errors, `not-finite`. A formula is compiled at its first use.
 */
export function evaluateFormula(formula: Formula, values: Values): number {
  let run = compiled.get(formula);
  if (!run) compiled.set(formula, (run = compile(formula.tree, formula.text)));
  return run(values);
}

function compile(e: Expression, text: string): Run {
  switch (e.node) {
    case "number": {
      const { value } = e;
      return () => value;
    }
    case "constant": {
      const value = constants[e.name];
      return () => value;
    }
    case "name": {
      const { name } = e;
      return (values) => {
        // A name may also be one that every object inherits.
        const x: unknown = values[name];
        if (typeof x !== "number") throw fault(text, `has no value for "${name}"`);
        if (!Number.isFinite(x)) throw fault(text, `is given ${x} for "${name}"`);
        return x;
      };
    }
    case "minus": {
      const of = compile(e.of, text);
      return (values) => -of(values);
    }
    case "call":
      return compileCall(e, text);
    case "binary":
      return compileBinary(e, text);
  }
}

function compileCall({ fn, args }: Expression & { node: "call" }, text: string): Run {
  const of = args.map((a) => compile(a, text));
  const apply: (...x: number[]) => number = functions[fn];
  const [one] = of;
  const checked = (y: number, x: readonly number[]): number => {
    if (Number.isFinite(y)) return y;
    const at = x.join(", ");
    throw fault(
      text,
      Number.isNaN(y) || y < 0 ? `takes ${fn} of ${at}` : `${fn} of ${at} gives ${y}`,
    );
  };
  if (one && of.length === 1)
    return (values) => {
      const x = one(values);
      const y = apply(x);
      return Number.isFinite(y) ? y : checked(y, [x]);
    };
  return (values) => {
    const x = of.map((f) => f(values));
    return checked(apply(...x), x);
  };
}

function compileBinary({ op, left, right }: Expression & { node: "binary" }, text: string): Run {
  const a = compile(left, text);
  const b = compile(right, text);
  const checked = (y: number, x: number, by: number): number => {
    if (Number.isFinite(y)) return y;
    if (op === "/" && by === 0) throw fault(text, "divides by zero");
    if (op === "^" && (Number.isNaN(y) || x === 0))
      throw fault(text, `raises ${x} to the power ${by}`);
    throw fault(text, `overflows in ${x} ${op} ${by}`);
  };
  const operate = OPERATORS[op];
  return (values) => {
    const x = a(values);
    const by = b(values);
    const y = operate(x, by);
    return Number.isFinite(y) ? y : checked(y, x, by);
  };
}

const OPERATORS = {
  "+": (x: number, y: number) => x + y,
  "-": (x: number, y: number) => x - y,
  "*": (x: number, y: number) => x * y,
  "/": (x: number, y: number) => x / y,
  "^": (x: number, y: number) => x ** y,
} as const;

const fault = (text: string, problem: string): SolveError =>
  new SolveError({ code: "not-finite", where: `formula "${text}"`, problem });
