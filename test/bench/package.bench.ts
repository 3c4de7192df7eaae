import { bench, describe } from "vitest";
import { renderHtml } from "../../kernel-helpers/render/package/render-html.js";
import { printPdf, withBrowser } from "../../kernel-helpers/render/index.js";
import { syntheticStudy } from "./synthetic-study.js";

const once = { iterations: 3, warmupIterations: 1, time: 0, warmupTime: 0 };
const [small, half, full, twice] = [125, 250, 500, 1000].map(syntheticStudy) as [
  ReturnType<typeof syntheticStudy>,
  ReturnType<typeof syntheticStudy>,
  ReturnType<typeof syntheticStudy>,
  ReturnType<typeof syntheticStudy>,
];

describe("a record of n steps to HTML (500 steps: aim under 2 s; growth no worse than linear)", () => {
  bench("125 steps", async () => void (await renderHtml(small, "A4")), once);
  bench("250 steps", async () => void (await renderHtml(half, "A4")), once);
  bench("500 steps", async () => void (await renderHtml(full, "A4")), once);
  bench("1000 steps", async () => void (await renderHtml(twice, "A4")), once);
});

describe("a record of 500 steps to PDF, browser start included (aim under 8 s)", () => {
  const print = async (record: typeof full): Promise<void> => {
    const { html } = await renderHtml(record, "A4");
    await withBrowser((session) =>
      printPdf({
        html,
        session,
        info: { title: "bench", author: "bench", subject: "bench", created: new Date(0) },
      }),
    );
  };
  bench("250 steps", () => print(half), once);
  bench("500 steps", () => print(full), once);
});
