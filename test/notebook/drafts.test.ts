import { mkdtempSync, readFileSync, readdirSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { draftFile, draftId } from "../../kernel-helpers/notebook/draft-files.js";
import { nextTurn, writeDrafts } from "../../kernel-helpers/notebook/kernel/drafts.js";

const STUDIES = Symbol.for("stillwell.studies");
const TURN = Symbol.for("stillwell.turn");
let folder = "";
let before: readonly [unknown, unknown] = [undefined, undefined];
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), "drafts-"));
  before = [Reflect.get(globalThis, STUDIES), Reflect.get(globalThis, TURN)];
});
afterEach(() => {
  rmSync(folder, { recursive: true });
  Reflect.set(globalThis, STUDIES, before[0]);
  Reflect.set(globalThis, TURN, before[1]);
});
const signUp = (studies: Record<string, unknown>): void =>
  void Reflect.set(globalThis, STUDIES, new Map(Object.entries(studies)));
const write = (): string[] => {
  const said: string[] = [];
  writeDrafts(join(folder, "drafts"), (says) => said.push(says));
  return said;
};

describe("drafts", () => {
  it("hold the record of each study, and nothing else lies beside them", () => {
    signUp({ a: { record: () => ({ n: 1 }) }, b: { record: () => ({ n: 2 }) } });
    expect(write()).toEqual([]);
    expect(readdirSync(join(folder, "drafts")).sort()).toEqual(["a.draft.json", "b.draft.json"]);
    const text = readFileSync(join(folder, "drafts", "b.draft.json"), "utf8");
    expect(JSON.parse(text)).toEqual({ n: 2 });
  });
  it("are not written for a study that fails, which is told once and stops no other", () => {
    const round: { self?: unknown } = {};
    round.self = round;
    signUp({
      bad: {
        record: () => {
          throw new Error("half made");
        },
      },
      round: { record: () => round },
      nothing: { record: () => undefined },
      good: { record: () => 1 },
    });
    const said = write();
    expect(said).toHaveLength(3);
    expect(said[0]).toBe("The draft of study bad was not written: half made\n");
    expect(readdirSync(join(folder, "drafts"))).toEqual(["good.draft.json"]);
  });
  it("make no folder when there is no study", () => {
    Reflect.deleteProperty(globalThis, STUDIES);
    expect(write()).toEqual([]);
    signUp({});
    expect(write()).toEqual([]);
    expect(readdirSync(folder)).toEqual([]);
  });
  it("stay in their folder whatever the study is called", () => {
    for (const id of ["../up", "a/b", "µ & co", "..", "plain"]) {
      expect(draftFile(id)).not.toMatch(/[/\\]/);
      expect(draftId(draftFile(id))).toBe(id);
    }
    expect(draftId("a.draft.json.7.tmp")).toBeNull();
  });
});

it("each cell execution is a turn of its own", () => {
  Reflect.deleteProperty(globalThis, TURN);
  nextTurn();
  nextTurn();
  expect(Reflect.get(globalThis, TURN)).toBe(2);
});
