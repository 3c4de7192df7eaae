import { readFileSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, it } from "vitest";
import type { Use } from "../../kernel-helpers/method/index.js";
import { standardRegistry } from "../../kernel-helpers/models/index.js";
import { declaredSources } from "../../scripts/declared-sources.mjs";
import { lockFaults, type Lock } from "../../scripts/method-lock.mjs";
import { root } from "./sources.js";

const folder = join(root, "kernel-helpers");
const declared = declaredSources(folder);
const lock = JSON.parse(readFileSync(join(folder, "methods.lock.json"), "utf8")) as Lock;

describe("methods.lock.json", () => {
  it("holds the revision and the source of every method, model and entity; update it with: node scripts/lock-methods.mjs", () => {
    expect(lockFaults(declared, lock).map((f) => f.says)).toEqual([]);
  });
});

describe("a declared method or model", () => {
  const uses = new Map(
    standardRegistry
      .filter((x): x is Use => "uses" in x)
      .map((u) => [u.id, u.uses.map((each) => each.id)]),
  );
  const usedBy = (id: string): string[] => (uses.get(id) ?? []).flatMap((u) => [u, ...usedBy(u)]);

  it("lists every method that it reaches, since a record stores their revisions", () => {
    const missing = declared
      .filter(({ id }) => uses.has(id))
      .flatMap(({ id, where, reaches }) => {
        const listed = new Set(usedBy(id));
        return reaches
          .filter((r) => uses.has(r) && !listed.has(r))
          .map((r) => `${where} reaches ${r}, which is not among its uses`);
      });
    expect(missing).toEqual([]);
  });
  it("is in the registry under its id", () => {
    const lost = declared.filter(({ id, role }) => role !== "entity" && !uses.has(id));
    expect(lost.map(({ where, id }) => `${where} declares ${id}`)).toEqual([]);
  });
});
