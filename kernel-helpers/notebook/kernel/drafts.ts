import { mkdirSync, renameSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { draftFile } from "../draft-files.js";

// A study finds its turn and signs up under these; the names are shared with the room `study`.
const TURN = Symbol.for("stillwell.turn");
const STUDIES = Symbol.for("stillwell.studies");

/** Tells the studies that the next cell execution begins. */
export function nextTurn(): void {
  const turn: unknown = Reflect.get(globalThis, TURN);
  Reflect.set(globalThis, TURN, (typeof turn === "number" ? turn : 0) + 1);
}

/**
 * Writes the record of each study of this kernel into the folder, each beside its place and then
 * renamed, so that a reader never meets half a record. A study whose record cannot be written is
 * told through `warn`; it stops nothing else.
 */
export function writeDrafts(folder: string, warn: (says: string) => void): void {
  const studies: unknown = Reflect.get(globalThis, STUDIES);
  if (!(studies instanceof Map)) return;
  for (const [id, study] of studies as Map<unknown, unknown>) {
    try {
      if (!isRecorded(study)) throw new TypeError("it has no record()");
      const text = JSON.stringify(study.record(), null, 1) as string | undefined;
      if (text === undefined) throw new TypeError("record() gave nothing that JSON can hold");
      mkdirSync(folder, { recursive: true });
      const place = join(folder, draftFile(String(id)));
      const beside = `${place}.${process.pid}.tmp`;
      writeFileSync(beside, `${text}\n`);
      renameSync(beside, place);
    } catch (error) {
      const why = error instanceof Error ? error.message : String(error);
      warn(`The draft of study ${String(id)} was not written: ${why}\n`);
    }
  }
}

const isRecorded = (x: unknown): x is { record(): unknown } =>
  typeof x === "object" && x !== null && "record" in x && typeof x.record === "function";
