import { displayUnit, formatNumber, inUnit, kinds, type Kind } from "../units/index.js";
import type { Range } from "./descriptors.js";
import type { Finding } from "./finding.js";

/** A stated range of one method: of an input, or of a group made of inputs. */
export interface RangeRule {
  readonly group: string;
  readonly kind: Kind;
  readonly range: Range;
  readonly stated: boolean;
  readonly note?: string;
  of(args: never): number;
}

const outside = (x: number, [low, high]: Range): boolean => x < low || x > high;
/** How far outside, for choosing the worst of several: ratios for groups that span decades. */
const excess = (x: number, [low, high]: Range): number =>
  x < low ? (low > 0 && x > 0 ? low / x : low - x) : high > 0 ? x / high : x - high;

/** Collects range findings, over one evaluation or over every depth of a model, one per rule. */
export class RangeWatch {
  private readonly seen = new Map<
    string,
    { by: string; rule: RangeRule; of: number; out: number; worst: number; at: number | null }
  >();
  look(by: string, rules: readonly RangeRule[], args: never, depth: number | null = null): void {
    for (const rule of rules) {
      const key = `${by} ${rule.group}`;
      let s = this.seen.get(key);
      if (!s) this.seen.set(key, (s = { by, rule, of: 0, out: 0, worst: NaN, at: null }));
      s.of += 1;
      const x = rule.of(args);
      if (!outside(x, rule.range)) continue;
      s.out += 1;
      if (s.out > 1 && excess(x, rule.range) <= excess(s.worst, rule.range)) continue;
      s.worst = x;
      s.at = depth;
    }
  }
  findings(): Finding[] {
    return [...this.seen.values()]
      .filter((s) => s.out > 0)
      .map(({ by, rule, of, out, worst, at }) => ({
        code: "out-of-range" as const,
        by,
        group: rule.group,
        worst,
        range: rule.range.map((x) => (Number.isFinite(x) ? x : null)) as [
          number | null,
          number | null,
        ],
        count: [out, of] as const,
        says:
          `${by}: ${rule.group} ${of > 1 ? `outside at ${out} of ${of} places, worst ` : ""}${say(worst, rule.kind)}` +
          `${at === null ? "" : ` at ${formatNumber(at)} m`}; ${rule.stated ? "stated" : "advised"} range ${sayRange(rule)}`,
      }));
  }
}

const say = (x: number, kind: Kind): string => {
  const unit = displayUnit(kind, "SI", x);
  return `${formatNumber(inUnit(x as never, unit))}${kinds[kind].si === "1" ? "" : ` ${unit.symbol}`}`;
};
export const sayRange = ({
  range: [low, high],
  kind,
}: Pick<RangeRule, "range" | "kind">): string =>
  high === Infinity
    ? `from ${say(low, kind)}`
    : low === -Infinity || low === 0
      ? `up to ${say(high, kind)}`
      : `${say(low, kind)} to ${say(high, kind)}`;
