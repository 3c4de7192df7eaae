/** The tree of a formula. */
export type Expression =
  | { readonly node: "number"; readonly value: number; readonly typed: string }
  | { readonly node: "name"; readonly name: string }
  | { readonly node: "constant"; readonly name: "pi" | "g" }
  | { readonly node: "minus"; readonly of: Expression }
  | {
      readonly node: "binary";
      readonly op: "+" | "-" | "*" | "/" | "^";
      readonly left: Expression;
      readonly right: Expression;
    }
  | { readonly node: "call"; readonly fn: FunctionName; readonly args: readonly Expression[] };

/** The functions of the language; `min` and `max` take two arguments or more. */
export const functions = {
  sqrt: Math.sqrt,
  exp: Math.exp,
  ln: Math.log,
  log10: Math.log10,
  sin: Math.sin,
  cos: Math.cos,
  tan: Math.tan,
  asin: Math.asin,
  acos: Math.acos,
  atan: Math.atan,
  abs: Math.abs,
  min: Math.min,
  max: Math.max,
} as const;
export type FunctionName = keyof typeof functions;

/** Standard gravity [m/s2] is the only dimensional constant (CGPM 1901). */
export const constants = { pi: Math.PI, g: 9.80665 } as const;

export interface Formula {
  readonly text: string;
  readonly tree: Expression;
  /** Names it uses, in order of first use. */
  readonly names: readonly string[];
}
