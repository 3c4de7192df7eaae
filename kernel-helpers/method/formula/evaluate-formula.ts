import { SolveError } from "../../errors/index.js";
import { constants, functions, type Expression, type Formula } from "./expression.js";

/** The value of a formula; a division by zero, the root of a negative number and the like are named errors. */
export function evaluateFormula(
  { tree, text }: Formula,
  values: { readonly [name: string]: number },
): number {
  const x = run(tree, values, text);
  if (Number.isFinite(x)) return x;
  throw fault(text, `gives ${x}`);
}

function run(e: Expression, values: { readonly [name: string]: number }, text: string): number {
  switch (e.node) {
    case "number":
      return e.value;
    case "constant":
      return constants[e.name];
    case "name": {
      const x = values[e.name];
      if (x === undefined) throw fault(text, `has no value for "${e.name}"`);
      return x;
    }
    case "minus":
      return -run(e.of, values, text);
    case "call": {
      const args = e.args.map((a) => run(a, values, text));
      const x = functions[e.fn](...(args as [number]));
      if (Number.isNaN(x)) throw fault(text, `takes ${e.fn} of ${args.join(", ")}`);
      return x;
    }
    case "binary": {
      const a = run(e.left, values, text);
      const b = run(e.right, values, text);
      switch (e.op) {
        case "+":
          return a + b;
        case "-":
          return a - b;
        case "*":
          return a * b;
        case "/":
          if (b === 0) throw fault(text, "divides by zero");
          return a / b;
        case "^": {
          const x = a ** b;
          if (Number.isNaN(x)) throw fault(text, `raises ${a} to the power ${b}`);
          return x;
        }
      }
    }
  }
}

const fault = (text: string, problem: string): SolveError =>
  new SolveError({ code: "not-finite", where: `formula "${text}"`, problem });
