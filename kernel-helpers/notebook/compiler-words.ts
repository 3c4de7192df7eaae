import * as units from "../units/index.js";
import { isKind, kinds, type Kind } from "../units/index.js";
import { excerpt } from "./excerpt.js";

/** What the compiler says of one place. */
export interface Diagnostic {
  /** A file beside the notebook; null for the cell itself. */
  readonly file: string | null;
  /** Both 1-based. */
  readonly line: number;
  readonly column: number;
  readonly code: number;
  /** From the general to the particular. */
  readonly chain: readonly string[];
}

/** An error as the Jupyter protocol carries it; the message stands once in the traceback. */
export interface ErrorReport {
  readonly ename: string;
  readonly evalue: string;
  readonly traceback: readonly string[];
  /** The line of the cell, where it is known. */
  readonly line: number | null;
}

/** Why a cell was refused before it ran, in the analyst's terms. */
export function refusal(diagnostics: readonly Diagnostic[], source: string): ErrorReport {
  const [first] = diagnostics;
  return {
    ename: nameOf(diagnostics),
    evalue: first ? sayDiagnostic(first) : "",
    traceback: diagnostics.map((d) =>
      [
        `${d.file === null ? "" : `${d.file}, `}line ${d.line}: ${sayDiagnostic(d)}`,
        ...(d.file === null ? excerpt(source, d.line, d.column) : []),
      ].join("\n"),
    ),
    line: first && first.file === null ? first.line : null,
  };
}

// Not assignable, no overload, missing or unknown properties, possibly null or undefined.
const MISMATCHES = new Set([
  2322, 2345, 2353, 2531, 2532, 2533, 2739, 2740, 2741, 2769, 18047, 18048, 18049,
]);

function nameOf(diagnostics: readonly Diagnostic[]): string {
  if (diagnostics.some(({ code }) => code >= 1000 && code < 2000)) return "SyntaxError";
  return diagnostics.every(({ code }) => MISMATCHES.has(code)) ? "TypeMismatch" : "CompileError";
}

/** The last link of the chain, in short words. */
export function sayDiagnostic({ chain }: Diagnostic): string {
  const last = chain.at(-1) ?? "";
  return (
    sayKinds(last, chain) ??
    sayNoUnit(chain) ??
    sayMissing(last) ??
    sayUnknown(last) ??
    shorten(last).replace(/\.$/, "")
  );
}

const NOT_ASSIGNABLE =
  /^(?:Type|Argument of type) '(.*)' is not assignable to (?:type|parameter of type) '(.*)'\.$/s;

// A quantity, a reference to a recorded one, what stands for either, and a unit.
const OF_KINDS = /^(Quantity|Ref|Wired|Unit)<(.*)>$/s;

/** Two kinds that differ: their names alone stand at the end of the chain. */
function sayKinds(last: string, chain: readonly string[]): string | null {
  if (!chain.some((link) => /__kind|\b(Quantity|Ref|Wired|Unit)<"/.test(link))) return null;
  const [, got = "", wanted = ""] = NOT_ASSIGNABLE.exec(last) ?? [];
  const [has, wants] = [kindsIn(got), kindsIn(wanted)];
  return has && wants ? `expected ${sayAny(wants)}, got ${sayAny(has)}` : null;
}

/** Something that is no quantity where one is expected, or only stands for one. */
function sayNoUnit(chain: readonly string[]): string | null {
  for (const link of chain) {
    const [, got = "", wanted = ""] = NOT_ASSIGNABLE.exec(link) ?? [];
    const wants = kindsIn(OF_KINDS.exec(wanted)?.[2] ?? "");
    if (!wants) continue;
    const [, what, of = ""] = OF_KINDS.exec(got) ?? [];
    const has = kindsIn(of);
    if (what === "Ref" && has)
      return `expected ${sayAny(wants)} itself, got a reference to ${sayAny(has)}; its value is in .value`;
    if (what === "Unit") return `expected ${sayAny(wants)}, got a unit; it is called with a number`;
    if (has) continue;
    const makers = unitNames(wants).join(", ");
    const bare = /^-?[\d.]+$|^number$/.test(got) ? "a number without a unit" : shorten(got);
    return `expected ${sayAny(wants)}, got ${bare}${makers ? `; units: ${makers}` : ""}`;
  }
  return null;
}

function sayMissing(last: string): string | null {
  const one = /^Property '(.*?)' is missing in type '.*' but required in type '(.*)'\.$/s.exec(
    last,
  );
  if (one?.[1] !== undefined) {
    const name = one[1].replace(/\W/g, "\\$&");
    const kind = new RegExp(`\\b${name}: (?:Quantity|Wired)<"(\\w+)">`).exec(one[2] ?? "")?.[1];
    return `${one[1]} is missing${isKind(kind) ? ` (${kinds[kind].words})` : ""}`;
  }
  const more = /is missing the following properties from type '.*': (.*)$/s.exec(last)?.[1];
  return more === undefined ? null : `missing: ${more.replace(/\.$/, "")}`;
}

function sayUnknown(last: string): string | null {
  const found =
    /^Object literal may only specify known properties, (?:and|but) '(.*?)' does not exist in type '(.*?)'\.(?: Did you mean to write '(.*)'\?)?$/s.exec(
      last,
    );
  if (!found) return null;
  const [, name = "", type = "", meant] = found;
  const known = [...type.matchAll(/[{;] (?:readonly )?(\w+)\??:/g)].map((m) => m[1]);
  if (meant !== undefined) return `there is no ${name} here; ${meant} is meant?`;
  return `there is no ${name} here${known.length > 0 ? `; there are ${known.join(", ")}` : ""}`;
}

/** `'"length" | "time"'` as kinds, or null when it names anything else. */
function kindsIn(type: string): Kind[] | null {
  const names = type.split(" | ").filter((name) => name !== "undefined");
  const found = names.map((name) => name.replace(/^"(.*)"$/, "$1")).filter(isKind);
  return found.length > 0 && found.length === names.length ? found : null;
}

const sayAny = (of: readonly Kind[]): string => of.map((kind) => kinds[kind].words).join(" or ");

const unitNames = ([kind]: readonly Kind[]): string[] =>
  Object.entries(units)
    .filter(([, x]) => typeof x === "function" && "kind" in x && x.kind === kind)
    .map(([name]) => name)
    .slice(0, 6);

const LONGEST_TYPE = 80;
const shorten = (text: string): string =>
  text
    .replace(/Quantity<"(\w+)">/g, (whole, name: string) =>
      isKind(name) ? kinds[name].words : whole,
    )
    .replace(/'([^']*)'/g, (whole, type: string) =>
      type.length > LONGEST_TYPE ? `'${type.slice(0, LONGEST_TYPE)}…'` : whole,
    );
