import { isStated, type DeclaredMethod, type Item, type StudyRecord } from "../study/index.js";
import { aligned } from "./align.js";
import { cautionsOf } from "./cautions.js";
import { checkView } from "./checks.js";
import { conclusionView } from "./conclusions.js";
import { Context } from "./context.js";
import type { Chart } from "./figures/chart.js";
import { figureView } from "./figure.js";
import { assumptionView, inputView } from "./inputs.js";
import { appliedBy, methodsApplied, methodsOf } from "./methods-applied.js";
import { findingText } from "./item-texts.js";
import { methodView, modelView } from "./method-views.js";
import { openItems } from "./open-items.js";
import { comparisonView } from "./comparison-view.js";
import { objectView } from "./object-view.js";
import { formulaView, stepView } from "./steps.js";
import { sentenceCase } from "./sentence-case.js";
import { recordedTable } from "./tables.js";
import type { Block, Link, PackageView, SectionView } from "./view.js";

/** A record → everything a package shows, in its order. Plain data: a rendering adds no fact. */
export function packageView(record: StudyRecord, charts: readonly Chart[]): PackageView {
  const { body, run, hash } = record;
  const { study } = body;
  const ctx = new Context(body);
  const open = openItems(ctx, record);
  const blocking = open.filter((o) => o.blocksApproval).length;

  const used = new Map<string, Link[]>();
  for (const item of body.items) {
    if (item.op !== "step" && item.op !== "run") continue;
    for (const id of item.op === "step" ? methodsOf(body, item) : [item.use])
      used.set(id, [...(used.get(id) ?? []), ctx.numbering.link(item.id)]);
  }
  const applied = methodsApplied(body);
  const methods = body.declared.filter(
    (d): d is DeclaredMethod => d.role === "method" && applied.has(d.id),
  );
  const models = body.declared.filter((d) => d.role === "model");
  const composed = new Map(models.map((m) => [m.id, appliedBy(body, m.id)]));
  const cited = new Set(
    methods.flatMap((m) => [m.source.cite, ...m.checks.map((c) => c.from.cite)]),
  );
  const references = body.references.filter((r) => cited.has(r.id));
  const citations = new Map(references.map((r, i) => [r.id, String(i + 1)]));
  const throughModels = (id: string): Link[] =>
    models
      .filter((m) => (composed.get(m.id) ?? applied).has(id))
      .map((m) => ({ text: ctx.numbering.methodNumber(m.id), to: `method-${m.id}` }));

  const block = (item: Item): Block | null => {
    switch (item.op) {
      case "given":
      case "assumed":
      case "conclude":
        return null;
      case "step":
        return stepView(ctx, item);
      case "run":
      case "entity":
        return objectView(ctx, item);
      case "formula":
        return formulaView(ctx, item);
      case "compare":
        return comparisonView(ctx, item);
      case "check":
        return checkView(ctx, item);
      case "caution":
        return {
          kind: "caution",
          number: ctx.numbering.of(item.id),
          anchor: ctx.numbering.anchor(item.id),
          text: item.text,
        };
      case "figure":
        return figureView(ctx, item, charts);
      case "table":
        return recordedTable(ctx, item);
    }
  };
  const blocksIn = (section: string | null): Block[] =>
    body.items.filter((i) => i.section === section).flatMap((i) => block(i) ?? []);
  const sections: SectionView[] = [
    {
      anchor: "section-opening",
      title: "Common to all sections",
      about: null,
      blocks: blocksIn(null),
    },
    ...body.sections.map((s) => ({
      anchor: `section-${s.id}`,
      title: sentenceCase(s.title),
      about: s.about,
      blocks: blocksIn(s.id),
    })),
  ].filter((s) => s.blocks.length > 0 || s.about !== null);

  return {
    cover: {
      title: study.title,
      number: study.number,
      revision: study.revision,
      status: run.clean ? "For checking" : "Draft",
      statusBecause: [
        ...(run.clean ? [] : ["not from a clean run of the whole notebook"]),
        ...(blocking > 0
          ? [`${blocking} open item${blocking === 1 ? "" : "s"} must be closed before approval`]
          : []),
        "not signed",
      ],
      recorded: `${run.at.slice(0, 10)} ${run.at.slice(11, 16)} UTC`,
      hash,
      prepared: study.prepared,
      checked: study.checked ?? "not named",
      approved: study.approved ?? "not named",
      disclaimer: study.disclaimer,
    },
    revisions: [{ revision: study.revision, what: "This issue.", hash: hash.slice(0, 16) }],
    purpose: study.purpose,
    decision: study.decision,
    conclusions: body.items.flatMap((i) => (i.op === "conclude" ? [conclusionView(ctx, i)] : [])),
    cautions: cautionsOf(ctx, body),
    limits: body.items.flatMap((i) =>
      "findings" in i
        ? i.findings
            .filter((f) => f.code !== "pass-the-reference")
            .map((f) => ({ text: findingText(ctx, f), at: ctx.numbering.titled(i.id) }))
        : [],
    ),
    inputs: aligned(
      body.items.flatMap((i) => (isStated(i) && i.op === "given" ? [inputView(ctx, i)] : [])),
    ),
    assumptions: aligned(
      body.items.flatMap((i) =>
        isStated(i) && i.op === "assumed" ? [assumptionView(ctx, i)] : [],
      ),
    ),
    methods: methods.map((m) =>
      methodView(ctx, m, citations, [...(used.get(m.id) ?? []), ...throughModels(m.id)]),
    ),
    models: models.map((m) =>
      modelView(ctx, m, composed.get(m.id) ?? applied, used.get(m.id) ?? []),
    ),
    sections,
    comparisons: body.items.flatMap((i) => (i.op === "compare" ? [comparisonView(ctx, i)] : [])),
    uncertainty: uncertaintyText(record),
    open,
    references: references.map((r) => ({
      number: citations.get(r.id) ?? "",
      anchor: `ref-${r.id}`,
      id: r.id,
    })),
    software: [
      ...Object.entries(run.versions).map(([name, value]) => ({ name, value })),
      { name: "recorded at (UTC)", value: run.at },
      ...(run.notebook
        ? [
            { name: "notebook", value: run.notebook.name },
            { name: "notebook SHA-256", value: run.notebook.sha256 },
          ]
        : []),
      { name: "record schema", value: String(record.schema) },
      { name: "record body SHA-256", value: hash },
    ],
    hash,
  };
}

/** Says what was done about uncertainty, and what was not. */
function uncertaintyText({ body }: StudyRecord): string {
  const spreads = body.items.filter(
    (i) => isStated(i) && i.form === "number" && i.spread !== null,
  ).length;
  return spreads === 0
    ? "No spread was stated for any input, and none was propagated: the results are single values."
    : `${spreads} input${spreads === 1 ? " has a stated spread" : "s have stated spreads"} (see Inputs and Assumptions). No spread was propagated to the results: they are single values at the stated inputs.`;
}
