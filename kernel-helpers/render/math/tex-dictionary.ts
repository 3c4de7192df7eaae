const pick = (names: string): Readonly<Record<string, string>> =>
  Object.fromEntries(
    names.split(" ").map((name) => [`\\${name}`, name.replace(/^var(?=[a-z])/, "")]),
  );

/** Commands that stand for a value. */
export const values: Readonly<Record<string, string>> = {
  ...pick(
    "alpha beta gamma delta epsilon varepsilon zeta eta theta vartheta iota kappa lambda mu nu xi pi " +
      "varpi rho varrho sigma varsigma tau upsilon phi varphi chi psi omega Gamma Theta Lambda Xi Pi " +
      "Sigma Upsilon Phi Psi Omega",
  ),
  "\\ell": "l",
  "\\hbar": "h bar",
  "\\infty": "infinity",
  "\\circ": "degrees",
  "\\degree": "degrees",
  "\\ldots": "and so on",
  "\\dots": "and so on",
  "\\cdots": "and so on",
  "\\prime": "prime",
  "\\emptyset": "the empty set",
};

/** Commands that belong to the symbol after them. */
export const prefixes: Readonly<Record<string, string>> = {
  "\\Delta": "Delta",
  "\\partial": "partial",
  "\\nabla": "nabla",
};

export const operators: Readonly<Record<string, string>> = {
  "+": "plus",
  "-": "minus",
  "−": "minus",
  "=": "equals",
  "/": "over",
  "*": "times",
  "<": "is less than",
  ">": "is greater than",
  ":": ",",
  "\\cdot": "times",
  "\\times": "times",
  "\\ast": "times",
  "\\div": "divided by",
  "\\pm": "plus or minus",
  "\\mp": "minus or plus",
  "\\le": "is at most",
  "\\leq": "is at most",
  "\\leqslant": "is at most",
  "\\ge": "is at least",
  "\\geq": "is at least",
  "\\geqslant": "is at least",
  "\\lt": "is less than",
  "\\gt": "is greater than",
  "\\ll": "is much less than",
  "\\gg": "is much greater than",
  "\\ne": "is not equal to",
  "\\neq": "is not equal to",
  "\\approx": "is about",
  "\\simeq": "is about",
  "\\sim": "is of the order of",
  "\\equiv": "is defined as",
  "\\propto": "is proportional to",
  "\\to": "to",
  "\\rightarrow": "to",
  "\\Rightarrow": "hence",
  "\\implies": "hence",
  "\\in": "in",
  "\\mid": "given",
  "\\quad": ",",
  "\\qquad": ",",
};

export const functions: Readonly<Record<string, string>> = {
  ...pick("ln log exp sin cos tan cot arcsin arccos arctan sinh cosh tanh erf"),
  "\\lg": "log",
  "\\min": "minimum",
  "\\max": "maximum",
  "\\inf": "infimum",
  "\\sup": "supremum",
  "\\lim": "limit",
  "\\sum": "sum",
  "\\prod": "product",
  "\\int": "integral",
  "\\oint": "closed integral",
};

/** Marks over a symbol, said after it. */
export const accents: Readonly<Record<string, string>> = {
  "\\bar": "bar",
  "\\overline": "bar",
  "\\dot": "dot",
  "\\ddot": "double dot",
  "\\hat": "hat",
  "\\widehat": "hat",
  "\\tilde": "tilde",
  "\\widetilde": "tilde",
  "\\vec": "vector",
};

const named = (names: string): ReadonlySet<string> =>
  new Set(names.split(" ").map((name) => `\\${name}`));

/** Commands whose argument is running text. */
export const textCommands = named("text textrm textit textbf textsf textnormal mbox");

/** Commands whose argument is a name in another type. */
export const nameCommands = named(
  "mathrm mathbf mathit mathsf mathtt boldsymbol bm operatorname operatorname* mathbb mathcal",
);

/** Commands that only move or size things. */
export const silent: ReadonlySet<string> = new Set([
  ...named(
    "thinspace enspace displaystyle textstyle scriptstyle limits nolimits nonumber middle " +
      "big Big bigg Bigg bigl bigr Bigl Bigr biggl biggr Biggl Biggr hfill allowbreak nobreak ! , ; : >",
  ),
  "\\ ",
]);
