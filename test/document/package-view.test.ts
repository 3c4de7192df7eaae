import { describe, expect, it } from "vitest";
import { packageView, STANDING_CAUTION } from "../../kernel-helpers/document/index.js";
import { replay } from "../../kernel-helpers/study/index.js";
import { buildExample } from "../study/build-example.js";
import { registry } from "../study/example.js";

const record = buildExample("view").s.record({ at: "2026-01-01T00:00:00.000Z", clean: true });
const view = packageView(record, []);
const blocks = view.sections.flatMap((s) => s.blocks);

describe("the view of a record", () => {
  it("is plain data, the same each time", () => {
    expect(JSON.parse(JSON.stringify(view))).toEqual(view);
    expect(packageView(record, [])).toEqual(view);
  });
  it("numbers items by what they are, in the order of the record", () => {
    expect(view.inputs.map((i) => i.number)).toEqual(["I1", "I2", "I3"]);
    expect(view.assumptions.map((i) => i.number)).toEqual(["A1"]);
    expect(view.conclusions.map((c) => c.number)).toEqual(["C1"]);
  });
  it("shows an input as it was typed, with its spread and what uses it", () => {
    expect(view.inputs[0]).toMatchObject({
      value: "42",
      unit: "MPa",
      because: "wireline survey",
      spread: "40 to 44 MPa (gauge)",
    });
    expect(view.assumptions[0]?.usedBy.map((l) => l.to)).toEqual(["item-q", "item-Re"]);
  });
  it("puts the numbers into the equation of a step, and says where each comes from", () => {
    const step = blocks.find((b) => b.kind === "step" && b.anchor === "item-Re");
    expect(step).toMatchObject({ equation: String.raw`\mathrm{Re}=\frac{\rho v D}{\mu}` });
    if (step?.kind !== "step") throw new Error("no step");
    expect(step.putIn).toMatch(
      /^\\mathrm\{Re\}=\\frac\{\{\(850\)\} \{\(.+\)\} \{\(0\.1524\)\}\}\{\{\(0\.005\)\}\}=/,
    );
    expect(step.rows.map((r) => r.from?.text)).toEqual([
      "S1, in the first section",
      "A1",
      "O1, density",
      "O1, viscosity",
    ]);
  });
  it("links every value of a sentence to its item, and shows a typed number as typed", () => {
    const [c] = view.conclusions;
    expect(c?.sentence.filter((r) => r.strong).map((r) => r.to)).toEqual(["item-q", "item-Re"]);
    expect(c?.sentence[1]?.text).toMatch(/MPa$/);
  });
  it("lets no link point at nothing", () => {
    const anchors = new Set([
      ...view.inputs.map((x) => x.anchor),
      ...view.assumptions.map((x) => x.anchor),
      ...view.methods.map((x) => x.anchor),
      ...view.models.map((x) => x.anchor),
      ...view.conclusions.map((x) => x.anchor),
      ...blocks.map((x) => x.anchor),
    ]);
    const links = [...JSON.stringify(view).matchAll(/"to":"([^"]+)"/g)].map((m) => m[1] ?? "");
    expect(links.length).toBeGreaterThan(30);
    expect([...new Set(links)].filter((to) => !anchors.has(to) && !to.startsWith("ref-"))).toEqual(
      [],
    );
  });
  it("always carries the standing caution, first, and each caution once", () => {
    expect(view.cautions[0]?.text).toBe(STANDING_CAUTION);
    expect(new Set(view.cautions.map((c) => c.text)).size).toBe(view.cautions.length);
    expect(view.cautions.map((c) => c.text)).toContain("This is a test.");
  });
  it("lists what is open: unverified assumptions, numbers stated in place, failing checks", () => {
    const texts = view.open.map((o) => o.text);
    expect(
      texts.some((t) =>
        t.startsWith("Assumption not verified. To verify: run a caliper (wireline engineer)"),
      ),
    ).toBe(true);
    expect(texts.some((t) => t.startsWith("States"))).toBe(true);
    expect(view.cover.statusBecause.some((t) => /\d+ open items must be closed/.test(t))).toBe(
      true,
    );
  });
  it("says which conclusion takes up a check that fails", () => {
    const failing = view.open.filter((o) => o.text.startsWith("The check fails"));
    expect(failing.map((o) => [o.at?.text.split(" ")[0], o.text])).toEqual([
      ["K1", "The check fails; taken up in conclusion C1."],
    ]);
  });
  it("names in a conclusion the checks that fail, and the assumptions that approval waits for", () => {
    expect(view.conclusions[0]?.standing).toBe("1 of its 2 checks passes: K1 fails");
    expect(view.conclusions[0]?.unverified).toEqual([{ text: "A1", to: "item-bore" }]);
  });
  it("lists under a method the steps and the models that used it", () => {
    expect(view.methods.map((m) => [m.number, m.usedIn.map((l) => l.text)])).toEqual([
      ["M1", ["S2", "P1"]],
    ]);
  });
  it("says a range that was left with the number and title of the method", () => {
    expect(view.limits.map((l) => l.text)[0]).toMatch(
      /^M1 Reynolds number: Re .*; the source states 1 to 1000$/,
    );
  });
  it("says of a draft that it is one", () => {
    const draft = packageView(buildExample("draft").s.record(), []);
    expect(draft.cover.status).toBe("Draft");
    expect(view.cover.status).toBe("For checking");
  });
});

describe("the view of a stop", () => {
  const { results } = replay(record.body, registry, { pr: 30e6 });
  const stopped = {
    ...record,
    body: {
      ...record.body,
      items: record.body.items.map((i) =>
        "result" in i ? { ...i, result: results.get(i.id) } : i,
      ) as typeof record.body.items,
    },
  };
  it("shows the reason in place of a value, and evaluates no check", () => {
    const v = packageView(stopped, []);
    const run = v.sections.flatMap((s) => s.blocks).find((b) => b.anchor === "item-q");
    expect(run).toMatchObject({ stop: "no flow: the column outweighs the reservoir." });
    expect(v.conclusions[0]?.checks.map((c) => c.verdict)).toEqual([
      "not evaluated",
      "not evaluated",
    ]);
    expect(v.conclusions[0]?.stands).toBe(false);
  });
});
