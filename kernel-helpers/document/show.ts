import type { PlainJson, TypeJson } from "../study/index.js";
import {
  decimalsFor,
  displayUnit,
  formatFixed,
  formatNumber,
  inUnit,
  isKind,
  unitOf,
  type DisplaySystem,
  type Kind,
  type Unit,
} from "../units/index.js";

/** A value as the reader sees it; the unit is empty where there is none. */
export interface ShownValue {
  readonly text: string;
  readonly unit: string;
  /** How it is set: one number, which lines up on the decimal point, a range of numbers, or words. */
  readonly form: "number" | "range" | "words";
}

/** Significant digits of a computed number: inputs are shown as typed. */
export const DIGITS = 4;

const symbolOf = (u: Unit<Kind>): string => (u.symbol === "1" ? "" : u.symbol);

export function showNumber(
  kind: Kind,
  si: number,
  system: DisplaySystem,
  unit?: string | null,
): ShownValue {
  const u = unit ? unitOf(kind, unit, "display") : displayUnit(kind, system, si);
  return { text: formatNumber(inUnit(si as never, u), DIGITS), unit: symbolOf(u), form: "number" };
}
export const inWords = (text: string): ShownValue => ({ text, unit: "", form: "words" });
export const joined = ({ text, unit }: Omit<ShownValue, "form">): string =>
  unit === "" ? text : unit === "°" ? `${text}${unit}` : `${text}\u00a0${unit}`;

/** A column of numbers in one unit, all with the same decimals, so that the decimal points line up. */
export function showColumn(
  kind: Kind,
  values: readonly (number | null)[],
  system: DisplaySystem,
  unit?: string | null,
): { readonly unit: string; readonly cells: readonly string[] } {
  const numbers = values.filter((x): x is number => x !== null);
  const largest = numbers.reduce((a, x) => Math.max(a, Math.abs(x)), 0);
  const u = unit ? unitOf(kind, unit, "display") : displayUnit(kind, system, largest);
  const shown = values.map((x) => (x === null ? null : inUnit(x as never, u)));
  const size = shown.reduce<number>((a, x) => Math.max(a, Math.abs(x ?? 0)), 0);
  const decimals = Math.min(decimalsFor(size, DIGITS), 6);
  const wide = size >= 1e7 || (size > 0 && size < 1e-4);
  return {
    unit: symbolOf(u),
    cells: shown.map((x) =>
      x === null ? "–" : wide ? formatNumber(x, DIGITS) : formatFixed(x, decimals),
    ),
  };
}

/** The text of a choice or a text. */
export const textOf = (value: PlainJson): string =>
  typeof value === "string" ? value : JSON.stringify(value);

/** Any recorded value in one line. */
export function showValue(
  type: TypeJson,
  value: PlainJson,
  system: DisplaySystem,
  unit?: string | null,
): ShownValue {
  if (value === null) return inWords("none");
  if (isKind(type)) return showNumber(type, value as number, system, unit);
  switch (type.type) {
    case "oneOf":
    case "text":
      return inWords(textOf(value));
    case "optional":
      return showValue(type.of, value, system, unit);
    case "list":
      return inWords(`${(value as readonly PlainJson[]).length} entries`);
    case "profile": {
      const { value: values } = value as { value: readonly number[] };
      const low = Math.min(...values);
      const high = Math.max(...values);
      const u = unit
        ? unitOf(type.of, unit, "display")
        : displayUnit(type.of, system, Math.max(-low, high));
      const [a, b] = [low, high].map((x) => formatNumber(inUnit(x as never, u), DIGITS));
      return {
        text: a === b ? `${a ?? ""} throughout` : `${a ?? ""} to ${b ?? ""}`,
        unit: symbolOf(u),
        form: "range",
      };
    }
    case "struct":
    case "anyOf": {
      const name = (value as { name?: PlainJson }).name;
      return inWords(
        typeof name === "string"
          ? name
          : type.type === "struct"
            ? type.id.replace(/-/g, " ")
            : "object",
      );
    }
  }
}
