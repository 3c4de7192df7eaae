import type { DeclaredMethod } from "../study/index.js";
import { displayUnit, formatTyped, inUnit } from "../units/index.js";

export type DeclaredRange = DeclaredMethod["ranges"][number];

/** The limits of a range, exactly as they are declared. */
export function limitsText({
  kind,
  range: [low, high],
}: Pick<DeclaredRange, "kind" | "range">): string {
  const unit = displayUnit(kind, "SI", high ?? low ?? 0);
  const end = unit.symbol === "1" ? "" : unit.symbol === "°" ? "°" : `\u00a0${unit.symbol}`;
  const say = (x: number): string =>
    formatTyped(Number(inUnit(x as never, unit).toPrecision(12))) + end;
  if (low === null && high === null) return "any";
  if (high === null) return `${say(low ?? 0)} and above`;
  if (low === null || low === 0) return `up to ${say(high)}`;
  return `${say(low).replace(end, "")} to ${say(high)}`;
}

const GREEK: { readonly [word: string]: string } = {
  lambda: "λ",
  theta: "θ",
  eps: "ε",
  phi: "φ",
  psi: "ψ",
  eD: "ε/D",
};
const lettered = (group: string): string => GREEK[group] ?? group.replace(/_m$/, "ₘ");

/** The group that a range bounds: what it means, with the letter it goes by. */
export const groupText = ({ group, note }: Pick<DeclaredRange, "group" | "note">): string =>
  note === null || note === group ? lettered(group) : `${note} (${lettered(group)})`;
