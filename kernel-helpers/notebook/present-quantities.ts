import { inspect } from "node:util";
import {
  decimalsFor,
  displayUnit,
  formatFixed,
  formatNumber,
  inUnit,
  kinds,
  type Kind,
} from "../units/index.js";
import { displaySystem } from "./display-system.js";
import type { KnownType } from "./known-type.js";
import type { Presenter } from "./presenter.js";

const DIGITS = 4;
const LONGEST_LIST = 12;

/** Quantities, lists of them and objects that hold them, with unit and kind. */
export const presentQuantities: Presenter = {
  claims: (value, known) => known !== null && fits(value, known),
  bundle: (value, known) => ({ "text/plain": known ? say(value, known) : inspect(value) }),
};

function fits(value: unknown, known: KnownType): boolean {
  if ("kind" in known) return isShown(value, known.kind);
  if ("each" in known) return isQuantityList(value, known.each);
  return isPlainObject(value) && rowsOf(value, known, "").some((row) => row.isQuantity);
}

function say(value: unknown, known: KnownType): string {
  if (!("fields" in known)) {
    const { text, kind } = sayOne(value, known);
    return `${text} (${kind})`;
  }
  const rows = rowsOf(isPlainObject(value) ? value : {}, known, "");
  const widest = (pick: (row: Row) => string): number =>
    Math.max(...rows.map((row) => pick(row).length));
  const [name, text] = [widest((r) => r.name), widest((r) => r.text)];
  return rows
    .map((r) => `${r.name.padEnd(name)}  ${r.text.padEnd(text)}  ${r.kind}`.trimEnd())
    .join("\n");
}

interface Row {
  readonly name: string;
  readonly text: string;
  readonly kind: string;
  readonly isQuantity: boolean;
}

function rowsOf(
  value: { readonly [name: string]: unknown },
  known: Extract<KnownType, { fields: unknown }>,
  path: string,
): Row[] {
  return Object.entries(Object.getOwnPropertyDescriptors(value)).flatMap(([key, own]): Row[] => {
    // To look at a value runs none of its code, so an accessor is left alone.
    if (own.enumerable !== true || !("value" in own)) return [];
    const x: unknown = own.value;
    const name = path + key;
    const of = Object.hasOwn(known.fields, key) ? known.fields[key] : undefined;
    if (typeof x === "function") return [];
    if (of && "fields" in of && isPlainObject(x)) return rowsOf(x, of, `${name}.`);
    if (of && !("fields" in of) && fits(x, of))
      return [{ name, ...sayOne(x, of), isQuantity: true }];
    const text = inspect(x, { depth: 0, breakLength: Infinity });
    return [{ name, text, kind: "", isQuantity: false }];
  });
}

/** One quantity, or a list of them in one unit. */
function sayOne(value: unknown, known: KnownType): { text: string; kind: string } {
  if ("kind" in known && typeof value === "number") {
    const unit = displayUnit(known.kind, displaySystem(), value);
    return {
      text: `${formatNumber(inUnit(value, unit), DIGITS)} ${unit.symbol}`,
      kind: kindWords(known.kind),
    };
  }
  if ("each" in known && "kind" in known.each && Array.isArray(value)) {
    const { kind } = known.each;
    const numbers = value.filter((x) => typeof x === "number");
    const largest = Math.max(...numbers.map(Math.abs));
    const unit = displayUnit(kind, displaySystem(), largest);
    const decimals = decimalsFor(Math.abs(inUnit(largest, unit)), DIGITS);
    const shown = numbers.slice(0, LONGEST_LIST).map((x) => formatFixed(inUnit(x, unit), decimals));
    const more = numbers.length > LONGEST_LIST ? `, … ${numbers.length} in all` : "";
    return { text: `[${shown.join(", ")}${more}] ${unit.symbol}`, kind: kindWords(kind) };
  }
  return { text: inspect(value), kind: "" };
}

/** A kind as it stands in brackets: "an absolute pressure" is "absolute pressure". */
const kindWords = (kind: Kind): string =>
  kinds[kind].words.replace(/^an? /, "").replace(/ \(.*\)$/, "");

/** A bare number says all there is to a dimensionless one. */
const isShown = (x: unknown, kind: Kind): x is number =>
  typeof x === "number" && Number.isFinite(x) && kind !== "dimensionless";

const isQuantityList = (x: unknown, each: KnownType): boolean =>
  Array.isArray(x) && x.length > 0 && "kind" in each && x.every((item) => isShown(item, each.kind));

function isPlainObject(x: unknown): x is { readonly [name: string]: unknown } {
  if (typeof x !== "object" || x === null) return false;
  const prototype: unknown = Object.getPrototypeOf(x);
  return prototype === Object.prototype || prototype === null;
}
