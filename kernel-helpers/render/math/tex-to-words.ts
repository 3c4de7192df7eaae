import { texTree, type TexNode } from "./tex-tree.js";

/**
 * A formula as it would be read aloud: `\frac{\Delta p}{L}=150\frac{(1-\varepsilon)^2}{\varepsilon^3}`
 * gives "Delta p over L equals 150 times (1 minus epsilon) squared over epsilon cubed". It covers what
 * engineering formulas are made of; a command it does not know is said by its name.
 */
export const texToWords = (tex: string): string => say(texTree(tex)).replace(/\s+/g, " ").trim();

function say(node: TexNode): string {
  switch (node.kind) {
    case "row":
      return sayRow(node.items);
    case "bracket":
      return `(${say(node.inner)})`;
    case "absolute":
      return `absolute value of ${enclosed(node.inner)}`;
    case "fraction":
      return `${grouped(node.over)} over ${grouped(node.under)}`;
    case "root":
      return `${rootName(node.degree)} of ${grouped(node.inner)}`;
    case "accent":
      return `${grouped(node.base)} ${node.text}`;
    case "scripts":
      return sayScripts(node.base, node.sub, node.sup);
    case "cases":
      return `either ${node.rows.map(say).join("; or ")}`;
    case "lines":
      return node.rows.map(say).join("; ");
    default:
      return node.text;
  }
}

function sayRow(all: readonly TexNode[]): string {
  const items = withoutIdlePauses(all);
  let text = "";
  items.forEach((item, i) => {
    const before = items[i - 1];
    // d p over d z: the letter before a symbol at the start of a part is the differential.
    const isDifferential = i === 1 && before?.kind === "symbol" && before.text === "d";
    const afterFunction = before !== undefined && isFunction(before);
    text +=
      before === undefined
        ? ""
        : isDifferential
          ? " "
          : afterFunction
            ? " of "
            : between(before, item);
    text += afterFunction ? grouped(item) : say(item);
  });
  return text;
}

const isPause = (node: TexNode | undefined): boolean =>
  node?.kind === "operator" && /^[,;]$/.test(node.text);

/** Wide spaces are read as commas, of which one is enough, and none at either end. */
const withoutIdlePauses = (items: readonly TexNode[]): readonly TexNode[] =>
  items.filter(
    (item, i) => !isPause(item) || (i > 0 && i < items.length - 1 && !isPause(items[i + 1])),
  );

function between(a: TexNode, b: TexNode): string {
  if (isPause(b)) return "";
  if ([a, b].some((n) => n.kind === "operator" || n.kind === "words")) return " ";
  if (a.kind === "prefix" || isDegrees(a)) return " ";
  // p(z) is a function of z, µ(1 − ε) is a product.
  if (b.kind === "bracket" && isSymbol(a) && isArgument(b.inner)) return " of ";
  return " times ";
}

function sayScripts(base: TexNode, sub: TexNode | null, sup: TexNode | null): string {
  const name = base.kind === "function" ? base.text : null;
  if (name !== null && /sum|product|integral/.test(name))
    return `${name}${sub ? ` from ${say(sub)}` : ""}${sup ? ` to ${say(sup)}` : ""}`;
  const under =
    sub === null ? "" : name === null ? ` sub ${letters(sub)}` : ` ${underWord(name)} ${say(sub)}`;
  return `${grouped(base)}${under}${sup ? ` ${power(sup)}` : ""}`;
}

/** The letters of a subscript are one word. */
const letters = (sub: TexNode): string =>
  sub.kind === "row" && sub.items.every((item) => item.kind === "symbol" && item.text.length === 1)
    ? sub.items.map(say).join("")
    : say(sub);

const underWord = (name: string): string =>
  name === "log" ? "base" : name === "limit" ? "as" : "over";

const marks = new Set(["prime", "degrees"]);
function power(sup: TexNode): string {
  const text = say(sup);
  if (text === "2") return "squared";
  if (text === "3") return "cubed";
  if (sup.kind === "symbol" && marks.has(text)) return text;
  if (sup.kind === "operator") return text === "times" ? "star" : text;
  return `to the power ${grouped(sup)}`;
}

const rootName = (degree: TexNode | null): string => {
  const text = degree === null ? "2" : say(degree);
  return text === "2" ? "square root" : text === "3" ? "cube root" : `root of order ${text}`;
};

/** In brackets, unless it is one thing. */
const grouped = (node: TexNode): string => (isOneThing(node) ? say(node) : enclosed(node));
const enclosed = (node: TexNode): string =>
  node.kind === "bracket" ? say(node) : `(${say(node)})`;

function isOneThing(node: TexNode): boolean {
  if (node.kind === "row") {
    const [first, second, ...more] = node.items;
    if (first === undefined) return true;
    const isSigned = first.kind === "operator" && first.text === "minus";
    const isMarked = first.kind === "prefix" || (first.kind === "symbol" && first.text === "d");
    return (
      (isSigned || isMarked) && second !== undefined && more.length === 0 && isOneThing(second)
    );
  }
  return !["fraction", "cases", "lines"].includes(node.kind);
}

const isDegrees = (node: TexNode): boolean =>
  node.kind === "scripts" && node.sup?.kind === "symbol" && node.sup.text === "degrees";

const isFunction = (node: TexNode): boolean =>
  node.kind === "function" || (node.kind === "scripts" && node.base.kind === "function");

const isSymbol = (node: TexNode): boolean =>
  node.kind === "symbol" || (node.kind === "scripts" && isSymbol(node.base) && node.sup === null);

/** One symbol, or several parted by commas. */
const isArgument = (node: TexNode): boolean =>
  node.kind === "row"
    ? node.items.every((item, i) =>
        i % 2 ? item.kind === "operator" && item.text === "," : isArgument(item),
      )
    : ["symbol", "number", "scripts", "accent"].includes(node.kind);
