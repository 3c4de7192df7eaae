import { StudyError } from "../errors/index.js";
import { typeName, type Type } from "../method/index.js";
import { frame } from "../tables/index.js";
import type { DisplaySystem } from "../units/index.js";
import { columnsOf } from "./columns-of.js";
import { encode } from "./encode.js";
import { decode, partType, type Get } from "./decode.js";
import { Blocked, type Done } from "./evaluate.js";
import type { Item } from "./item.js";
import { standsOn } from "./edges-of.js";
import type { Path } from "./node.js";
import type { Ref } from "./wires.js";

interface Held {
  readonly item: Item;
  readonly done: Done | null;
  readonly turn: number;
  readonly version: number;
  /** The versions of what it stands on, as used. */
  readonly saw: ReadonlyMap<string, number>;
}

/** The items of one study, with the versions they saw: what is stale, what is gone, what would loop. */
export class Ledger {
  private readonly held = new Map<string, Held>();
  constructor(
    private readonly turn: () => number,
    private readonly display: DisplaySystem,
  ) {}

  items(): Item[] {
    return [...this.held.values()].map((h) => h.item);
  }

  readonly get: Get = (id) => {
    const h = this.held.get(id);
    if (!h) throw unknown(id);
    if (!h.done)
      throw new StudyError({
        code: "no-value",
        where: id,
        problem: `a ${h.item.op} has no value to use`,
      });
    if ("stop" in h.done.result) throw new Blocked(id);
    return h.done;
  };

  /** Refuses an id twice in one cell execution and a loop; a later execution replaces. */
  put(item: Item, done: Done | null): void {
    this.admit(item.id);
    const ups = standsOn(item);
    if (this.held.has(item.id) && this.reaches(ups, item.id, new Set()))
      throw new StudyError({ code: "circular", where: item.id, problem: "would stand on itself" });
    for (const up of ups) if (!this.held.has(up)) throw unknown(up);
    this.held.set(item.id, {
      item,
      done,
      turn: this.turn(),
      version: (this.held.get(item.id)?.version ?? 0) + 1,
      saw: new Map(ups.map((up) => [up, this.held.get(up)?.version ?? 0])),
    });
  }

  /** Checked before anything is computed, so that a slip costs nothing. */
  admit(id: string): void {
    if (!/^[A-Za-z][A-Za-z0-9_.-]*$/.test(id))
      throw new StudyError({
        code: "bad-id",
        where: JSON.stringify(id),
        problem: "is not an id",
        expected: "a letter, then letters, digits, - _ or .",
      });
    if (this.held.get(id)?.turn === this.turn())
      throw new StudyError({
        code: "duplicate-id",
        where: id,
        problem: "is recorded twice",
        remedy: "give each item its own id",
      });
  }

  withdraw(id: string): void {
    if (!this.held.delete(id)) throw unknown(id);
  }

  /** Items that stand on something recorded again, or withdrawn, since. They keep their value until their own cell runs again. */
  stale(): string[] {
    const known = new Map<string, boolean>();
    const old = (id: string): boolean => {
      const before = known.get(id);
      if (before !== undefined) return before;
      const h = this.held.get(id);
      if (!h) return true;
      known.set(id, false);
      const is = [...h.saw].some(
        ([up, version]) => this.held.get(up)?.version !== version || old(up),
      );
      known.set(id, is);
      return is;
    };
    return [...this.held.keys()].filter(old);
  }

  ref<T extends Type>(id: string, type: T, path: Path = []): Ref<T> {
    const part = (p: unknown): unknown => {
      const step =
        typeof type !== "string" && type.type === "profile"
          ? { depth: encode("measuredDepth", p, `${id} depth`, this.owns) }
          : (p as string | number);
      return this.ref(id, partType(type, step, id), [...path, step]);
    };
    const ledger = this as Ledger;
    const last = path.at(-1);
    const name = typeof last === "string" ? last : id;
    const handle: object = {
      __ref: type,
      id,
      path,
      at: part,
      columns: () => columnsOf(type, (handle as Ref<T>).value, this.display, name),
      frame: () => frame(columnsOf(type, (handle as Ref<T>).value, this.display, name)),
      in: (unit: { symbol: string }) => ({ shown: handle, unit: unit.symbol }),
      get value(): unknown {
        try {
          return decode(type, { ref: id, path }, ledger.get, id);
        } catch (e) {
          if (!(e instanceof Blocked)) throw e;
          throw new StudyError({
            code: "no-value",
            where: id,
            problem: `no ${typeName(type)}: "${e.by}" ended without a value`,
          });
        }
      },
    };
    owners.set(handle, this);
    return handle as Ref<T>;
  }

  readonly owns = (ref: object): boolean => owners.get(ref) === this;

  private reaches(ids: Iterable<string>, goal: string, seen: Set<string>): boolean {
    return [...ids].some(
      (id) =>
        id === goal ||
        (!seen.has(id) && this.reaches(this.held.get(id)?.saw.keys() ?? [], goal, seen.add(id))),
    );
  }
}
const owners = new WeakMap<object, Ledger>();

const unknown = (id: string): StudyError =>
  new StudyError({
    code: "unknown",
    where: id,
    problem: "is not in this study",
    remedy: "run the cell that records it",
  });
