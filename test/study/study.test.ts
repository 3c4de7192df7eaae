import { afterEach, describe, expect, it } from "vitest";
import {
  lineage,
  parseRecord,
  replay,
  Study,
  type StudyRecord,
} from "../../kernel-helpers/study/index.js";
import { toCsv } from "../../kernel-helpers/tables/index.js";
import { cP, kgpm3, m, mm, MPa } from "../../kernel-helpers/units/index.js";
import { buildExample } from "./build-example.js";
import { Fluid, Inflow, outflow, registry, reynolds } from "./example.js";

const TURN = Symbol.for("stillwell.turn");
const realm = globalThis as unknown as { [TURN]?: number | undefined };
const turn = (n: number) => (realm[TURN] = n);
afterEach(() => {
  realm[TURN] = undefined;
});
const copy = (r: StudyRecord): StudyRecord => JSON.parse(JSON.stringify(r)) as StudyRecord;

describe("a recorded study", () => {
  it("survives JSON and its own schema, and replays to the same values", () => {
    const { s } = buildExample();
    const record = parseRecord(copy(s.record()), "example");
    const report = replay(record.body, registry);
    expect(report.failed).toEqual([]);
    expect(report.moved).toEqual([]);
    expect(report.compared).toBe(11);
  });
  it("has a hash that does not depend on when it ran, and does on what it says", () => {
    const { s } = buildExample();
    const a = s.record({ at: "2026-01-01T00:00:00Z" });
    const b = s.record({ at: "2027-01-01T00:00:00Z" });
    expect(a.hash).toBe(b.hash);
    expect(buildExample("other").s.record().hash).not.toBe(a.hash);
  });
  it("carries a typed stop through everything that stands on it, and evaluates no check on it", () => {
    const { s } = buildExample();
    const { results } = replay(s.record().body, registry, { pr: 30e6 });
    expect(results.get("q")).toEqual({
      stop: "no-flow",
      because: "the column outweighs the reservoir",
    });
    for (const id of ["Re", "double", "d1", "fast", "is-fast"])
      expect(results.get(id)).toMatchObject({ stop: "blocked" });
  });
  it("says what moved when a recorded value no longer follows from its inputs", () => {
    const record = copy(buildExample().s.record());
    const item = record.body.items.find((i) => i.id === "double") as { result: { value: number } };
    item.result.value *= 1 + 1e-6;
    const { moved } = replay(record.body, registry);
    expect(moved.map((x) => x.id)).toEqual(["double"]);
  });
  it("keeps a number as typed, with its unit", () => {
    const item = buildExample()
      .s.record()
      .body.items.find((i) => i.id === "bore");
    expect(item).toMatchObject({
      op: "assumed",
      typed: 152.4,
      unit: "mm",
      result: { value: 0.1524 },
    });
  });
  it("reads a profile at a recorded depth, and keeps that depth as an edge", () => {
    const { s, q, shoe } = buildExample();
    const at = q.at("pressure").at(shoe);
    expect(at.value).toBeCloseTo(2e6 + 850 * 9.80665 * 1450, 3);
    expect(lineage(s.record().body).allBelow("c")).toContain("shoe");
  });
  it("knows every given and assumption a conclusion stands on, and everything that stands on one", () => {
    const l = lineage(buildExample().s.record().body);
    expect(l.groundsOf("c").map((g) => g.id)).toEqual(["pr", "rho", "shoe", "bore"]);
    expect(l.allAbove("rho")).toEqual([
      "oil",
      "q",
      "Re",
      "double",
      "d1",
      "fast",
      "is-fast",
      "t",
      "c",
    ]);
  });
});

/** The findings of one recorded item. */
const findingsOf = (record: StudyRecord, id: string) => {
  const item = record.body.items.find((i) => i.id === id);
  if (!item || !("findings" in item)) throw new Error(`${id} has no findings`);
  return item.findings;
};

describe("findings", () => {
  it("tell a value outside the stated range, without an exception", () => {
    const findings = findingsOf(buildExample().s.record(), "Re");
    expect(findings.map((f) => f.code)).toEqual(["out-of-range"]);
    expect(findings[0]?.says).toMatch(/test-reynolds: Re .*; stated range 1\.000 to 1000/);
  });
  it("merge over the depths of a model, with the worst and where it is", () => {
    const findings = findingsOf(buildExample().s.record(), "q");
    expect(findings).toHaveLength(1);
    expect(findings[0]?.count).toEqual([2, 2]);
    expect(findings[0]?.says).toContain("at 3000 m");
  });
  it("notice a number typed again where a reference belongs", () => {
    const { s, q, bore } = buildExample();
    s.step("again", reynolds, {
      v: q.at("speed"),
      D: bore,
      density: kgpm3(850),
      viscosity: cP(1),
    });
    const found = findingsOf(s.record(), "again").find((f) => f.code === "pass-the-reference");
    expect(found?.says).toContain('"rho"');
  });
});

describe("re-running cells", () => {
  it("refuses an id twice in one execution and replaces it in a later one", () => {
    turn(1);
    const { s } = buildExample();
    expect(() => s.given("rho", 900, kgpm3, { source: "again" })).toThrow(
      expect.objectContaining({ code: "duplicate-id", where: "rho" }),
    );
    turn(2);
    s.given("rho", 900, kgpm3, { source: "second sample" });
    expect(s.stale()).toEqual(["oil", "q", "Re", "double", "d1", "fast", "is-fast", "t", "c"]);
    expect(s.record().run.stale).toEqual(s.stale());
  });
  it("keeps what is stale as it was until its own cell runs", () => {
    turn(1);
    const { s, oil } = buildExample();
    turn(2);
    s.given("rho", 900, kgpm3, { source: "second sample" });
    expect(oil.value.density).toBe(850);
  });
  it("refuses a loop", () => {
    turn(1);
    const { s, oil } = buildExample();
    turn(2);
    expect(() => s.entity("oil", Fluid, { density: oil.at("density"), viscosity: cP(1) })).toThrow(
      expect.objectContaining({ code: "circular", where: "oil" }),
    );
  });
  it("refuses an item recorded again as another kind where the old kind is used", () => {
    turn(1);
    const { s, pr, oil } = buildExample();
    turn(2);
    s.given("pr", 1, m, { source: "a slip" });
    expect(() =>
      s.run("q", outflow, {
        hole: { sections: [] },
        fluid: oil,
        inflow: { pressure: pr, index: 1 },
        exit: "air",
      }),
    ).toThrow(expect.objectContaining({ code: "wrong-kind", where: "q.inflow.pressure" }));
  });
  it("shows what stands on a withdrawn item as stale", () => {
    const { s } = buildExample();
    s.withdraw("shoe");
    expect(s.stale()).toEqual(["c"]);
  });
  it("refuses a reference into another study", () => {
    const { rho } = buildExample();
    const { s } = buildExample("second");
    expect(() => s.entity("oil2", Fluid, { density: rho, viscosity: cP(1) })).toThrow(
      expect.objectContaining({ code: "foreign-reference", where: "oil2.density" }),
    );
  });
});

describe("refusals name the place", () => {
  const { s, oil, q, bore, rho } = buildExample("refusals");
  const cases: [string, () => unknown, object][] = [
    [
      "a missing argument",
      () => s.step("x1", reynolds, { v: q.at("speed"), D: bore, density: rho } as never),
      { code: "missing", where: "x1.viscosity" },
    ],
    [
      "an argument that is not there",
      () =>
        s.step("x2", reynolds, {
          v: q.at("speed"),
          D: bore,
          density: rho,
          viscosity: cP(1),
          d: 1,
        } as never),
      { code: "unknown-field", where: "x2.d" },
    ],
    [
      "not a number",
      () => s.step("x3", reynolds, { v: NaN as never, D: bore, density: rho, viscosity: cP(1) }),
      { code: "wrong-kind", where: "x3.v" },
    ],
    [
      "an impossible number",
      () => s.step("x4", reynolds, { v: q.at("speed"), D: mm(-3), density: rho, viscosity: cP(1) }),
      { code: "out-of-bounds", where: "test-reynolds.D" },
    ],
    ["no source", () => s.given("x5", 1, m, { source: " " }), { code: "no-source", where: "x5" }],
    [
      "no reason",
      () => s.assumed("x6", 1, m, { reason: "", verify: { how: "", by: "" } }),
      { code: "no-source", where: "x6" },
    ],
    ["an id that is none", () => s.given("two words", 1, m, { source: "x" }), { code: "bad-id" }],
    [
      "a formula with a name it was not given",
      () => s.formula("x7", "v + w", { v: q.at("speed") }, "velocity"),
      { code: "unknown-name" },
    ],
    [
      "a formula that adds unlike things",
      () => s.formula("x8", "v + D", { v: q.at("speed"), D: bore }, "velocity"),
      {},
    ],
    [
      "a formula of another dimension",
      () => s.formula("x9", "v * D", { v: q.at("speed"), D: bore }, "velocity"),
      { code: "wrong-dimension" },
    ],
    [
      "a choice that is none",
      () =>
        s.run("x10", outflow, {
          hole: { sections: [] },
          fluid: oil,
          inflow: { pressure: MPa(1), index: 1 },
          exit: "moon" as never,
        }),
      { code: "wrong-kind", where: "x10.exit" },
    ],
    [
      "a field that is none",
      () => s.entity("x11", Inflow, { pressure: MPa(1), index: 1, more: 2 } as never),
      { code: "unknown-field", where: "x11.more" },
    ],
    [
      "an unreadable typed number",
      () => s.given("x12", "9 5/", mm, { source: "tally" }),
      { code: "not-a-number" },
    ],
  ];
  it.each(cases)("%s", (_, act, parts) => {
    expect(act).toThrow(expect.objectContaining(parts));
  });
  it("and record nothing of what was refused", () => {
    expect(s.record().body.items.some((i) => /^x\d/.test(i.id))).toBe(false);
  });
  it("a value that ended in a stop is not read as a number", () => {
    const t = new Study({
      id: "stops",
      title: "",
      number: "",
      revision: "",
      purpose: "",
      decision: "",
      prepared: "",
    });
    const run = t.run("q", outflow, {
      hole: { sections: [{ base: 3000 as never, bore: mm(100) }] },
      fluid: { density: kgpm3(1000), viscosity: cP(1) },
      inflow: { pressure: MPa(1), index: 1e-8 },
      exit: "air",
    });
    expect(() => run.at("rate").value).toThrow(
      expect.objectContaining({ code: "no-value", where: "q" }),
    );
  });
});

describe("a foreign record", () => {
  const good = (): StudyRecord => copy(buildExample().s.record());
  const read = (x: unknown) => () => parseRecord(x, "file.json");
  it("of a newer schema is refused by name", () => {
    expect(read({ ...good(), schema: 2 })).toThrow(
      expect.objectContaining({ code: "newer-schema" }),
    );
  });
  it("that is no record is refused", () => {
    for (const x of [null, 3, [], {}, { schema: "1" }, { schema: 0 }])
      expect(read(x)).toThrow(expect.objectContaining({ code: "not-a-record" }));
  });
  it("with a changed body is refused by its hash", () => {
    const r = good();
    (r.body.items[0] as { title: string }).title = "another";
    expect(read(r)).toThrow(expect.objectContaining({ code: "changed" }));
  });
  it("with a piece missing is refused with its path", () => {
    const r = good() as unknown as { body: { study: { title?: string } } };
    delete r.body.study.title;
    expect(read(r)).toThrow(
      expect.objectContaining({ code: "malformed", where: "file.json: body.study.title" }),
    );
  });
  it("made with a method this version does not have says which and where", () => {
    const { body } = good();
    const { failed } = replay(
      body,
      registry.filter((u) => u.id !== "test-reynolds"),
    );
    expect(failed.map((f) => [f.id, f.error.code])).toEqual([["Re", "unknown-method"]]);
  });
  it("made with another revision says so, and compares the rest", () => {
    const { body } = good();
    const newer = registry.map((u) =>
      u.id === "test-reynolds" ? { ...u, revision: 2 } : u,
    ) as typeof registry;
    const { failed, compared } = replay(body, newer);
    expect(failed.map((f) => [f.id, f.error.code])).toEqual([["Re", "revised"]]);
    expect(compared).toBe(10);
  });
});

describe("results as tables", () => {
  it("a profile becomes columns of depth and value, with units in their heads", () => {
    const { q } = buildExample("tables");
    expect(
      q
        .at("pressure")
        .columns()
        .map((c) => [c.head, c.unit, c.values.length]),
    ).toEqual([
      ["measured depth", "m MD", 3],
      ["pressure", "MPa", 3],
    ]);
    expect(q.columns()).toEqual(q.at("pressure").columns());
  });
  it("a frame holds the same numbers, and CSV is written by our own writer", async () => {
    const { q } = buildExample("frames");
    const frame = await q.at("pressure").frame();
    expect(frame.columns).toEqual(["measured depth [m MD]", "pressure [MPa]"]);
    expect(frame.column("measured depth [m MD]")).toEqual([0, 3000, 3640]);
    expect(toCsv({ columns: q.at("pressure").columns() })).toMatch(
      /^measured depth \[m MD\],pressure \[MPa\]\r\n0,2\r\n/,
    );
  });
  it("a single number is no table", () => {
    const { rho } = buildExample("number");
    expect(() => rho.columns()).toThrow(expect.objectContaining({ code: "no-table" }));
  });
});
