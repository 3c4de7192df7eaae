import { readFileSync, readdirSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { afterAll, describe, expect, it } from "vitest";
import { RenderError } from "../../../kernel-helpers/errors/index.js";
import { withBrowser, type BrowserSession } from "../../../kernel-helpers/render/browser/index.js";
import { depthChart, renderChart } from "../../../kernel-helpers/render/charts/index.js";
import { fontCss, fontStacks, mathCss } from "../../../kernel-helpers/render/fonts/index.js";
import { renderMath } from "../../../kernel-helpers/render/math/index.js";
import {
  pageCss,
  pageOfPages,
  printPdf,
  readPdf,
  type PaperSize,
  type PrintedPdf,
} from "../../../kernel-helpers/render/pdf/index.js";
import { wellSketch } from "../../../kernel-helpers/render/sketch/index.js";
import { browsersHere, env, folder, removeFolder } from "./browsers.js";

afterAll(removeFolder);

const info = {
  title: "A calculation “of” flow",
  author: "An Engineer",
  subject: "Calculation package",
  keywords: ["record", "abc"],
  created: new Date("2026-01-02T03:04:05Z"),
};
const plot = { height: 400, plotTop: 50, plotBottom: 350 };

function page(body: string, size: PaperSize = "A4", fonts = fontCss({ covering: body })): string {
  const rule = pageCss({
    size,
    header: { left: `SW-1 "rev" \\ B`, right: "Draft" },
    footer: { right: pageOfPages },
  });
  return `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>t</title><style>${fonts}${mathCss({ covering: body })}${rule}body{font:10pt ${fontStacks.serif}}h1,h2{break-before:page}</style></head><body>${body}</body></html>`;
}

async function report(): Promise<string> {
  const equation = await renderMath({ tex: String.raw`\frac{a}{b}`, isDisplay: true });
  const chart = await renderChart(
    depthChart({
      description: "Pressure against depth",
      series: [{ label: "p", depth: [0, 3000], value: [1, 9] }],
      depthRange: [0, 3000],
      depthTitle: "Depth [m]",
      xTitle: "Pressure [MPa]",
      width: 400,
      ...plot,
    }),
  );
  const sketch = wellSketch({
    description: "The well",
    sections: [{ name: "casing", top: 0, base: 1500, bore: 0.2, kind: "casing" }],
    depthRange: [0, 3000],
    depthUnit: "m",
    width: 200,
    ...plot,
  });
  return page(
    `<nav><a href="#one">One</a> <span data-page-of="one"></span> <a href="#two é">Two</a> <span data-page-of="two é"></span></nav>` +
      `<h1 id="one">One ≤ ρ</h1>${equation}<table><thead><tr><th scope="col">a</th></tr></thead><tbody><tr><td>1</td></tr></tbody></table>` +
      `<p>${"long text ".repeat(900)}</p><h2 id="two é">Two</h2>${chart}${sketch}`,
  );
}

const hostile = page(
  `<p>text</p><script>document.body.textContent = "script ran"</script>` +
    `<img src="http://127.0.0.1:9/picture.png" onerror="document.body.textContent = 'handler ran'">` +
    `<iframe src="file:///etc/hostname"></iframe><object data="file:///etc/hostname"></object>` +
    `<iframe src="data:text/html,<script>parent.document.body.textContent=1</script><img src=http://127.0.0.1:9/inner.png>"></iframe>` +
    `<link rel="stylesheet" href="https://127.0.0.1:9/style.css"><meta http-equiv="refresh" content="0;url=http://127.0.0.1:9/elsewhere">` +
    `<form name="querySelectorAll"></form><img name="fonts" src="data:,">` +
    `<style>@import url(http://127.0.0.1:9/import.css); p{background:url(http://127.0.0.1:9/background.png)}</style>` +
    `<p><a href="#here">here</a> on page <span data-page-of="here"></span></p><p id="here">end</p>`,
);

/** The processes that this one has started. */
const children = (): readonly number[] =>
  readdirSync("/proc/self/task")
    .flatMap((task) => readFileSync(`/proc/self/task/${task}/children`, "utf8").trim().split(" "))
    .filter((pid) => pid !== "")
    .map(Number);

const browsers = await browsersHere();

it("there is a browser to print with", () => {
  expect(browsers.length).toBeGreaterThan(0);
});

describe.each(browsers)("the $kind browser", (browser) => {
  const print = (session: BrowserSession, html: string): Promise<PrintedPdf> =>
    printPdf({ html, session, info });
  const refusal = async (act: Promise<unknown>): Promise<string> => {
    const error: unknown = await act.catch((e: unknown) => e);
    return error instanceof RenderError ? error.code : `no refusal: ${String(error)}`;
  };

  it("prints tagged pages with outline, text, fonts, true page numbers and the same bytes each time", async () => {
    const html = await report();
    const [first, second] = await withBrowser(
      async (session) => [await print(session, html), await print(session, html)] as const,
      { env, browser },
    );
    expect(first.bytes).toEqual(second.bytes);
    expect(first.blocked).toEqual([]);
    expect(first.browser.kind).toBe(browser.kind);
    const facts = await readPdf(first.bytes);
    expect(facts.pages).toBe(first.pages);
    expect(facts.pages).toBeGreaterThanOrEqual(4);
    expect(Object.fromEntries(facts.anchors)).toEqual({ one: 2, "two é": facts.pages });
    expect(first.passes).toBe(2);
    expect(facts).toMatchObject({
      title: info.title,
      author: info.author,
      subject: info.subject,
      keywords: "record abc",
      producer: "Stillwell",
      created: info.created,
      language: "en",
      outline: ["One ≤ ρ", "Two"],
    });
    expect(facts.structure).toMatchObject({ H1: 1, H2: 1, Table: 1, TH: 1, TD: 1, Figure: 3 });
    expect(facts.alternatives).toEqual(["a over b", "Pressure against depth", "The well"]);
    expect(facts.fonts.map((f) => f.name).join(" ")).toMatch(/SourceSerif4/);
    expect(facts.fonts.every((f) => f.isEmbedded)).toBe(true);
    const [width, height] = facts.size;
    expect([Math.round(width), Math.round(height)]).toEqual([595, 842]);
  });

  it("prints on US Letter, and refuses anchors that are not there and pages without a letter", async () => {
    await withBrowser(
      async (session) => {
        const letter = await readPdf((await print(session, page("<p>x</p>", "Letter"))).bytes);
        expect(letter.size).toEqual([612, 792]);
        const lost = page(`<p>x <span data-page-of="nowhere"></span></p>`);
        expect(await refusal(print(session, lost))).toBe("no-anchor");
        const blank = `<!doctype html><html lang="en"><title>t</title><body></body></html>`;
        expect(await refusal(print(session, blank))).toBe("no-text");
      },
      { env, browser },
    );
  });

  it("runs no script and loads nothing of a hostile page, and prints its text", async () => {
    const { printed, text } = await withBrowser(
      async (session) => ({
        printed: await print(session, hostile),
        text: await session.withPage(hostile, async (p) =>
          p.evaluate(`String(Document.prototype.querySelector.call(document, "body").innerText)`),
        ),
      }),
      { env, browser },
    );
    expect(text).toContain("text");
    expect(text).not.toContain("ran");
    expect(printed.pages).toBe(1);
    const blocked = printed.blocked.join(" ");
    for (const name of ["picture.png", "style.css", "elsewhere", "background.png"])
      expect(blocked).toContain(name);
    expect(printed.blocked.every((url) => !url.startsWith("data:"))).toBe(true);
  });

  it("is stopped by a signal, and leaves neither process nor profile behind", async () => {
    const stop = new AbortController();
    const reason = new Error("stopped by the user");
    const use = withBrowser(
      async (session) => {
        setTimeout(() => stop.abort(reason), 50);
        await session.withPage(page("<p>x</p>"), (p) => p.evaluate("new Promise(() => {})"));
      },
      { env, browser, signal: stop.signal },
    );
    await expect(use).rejects.toBe(reason);
    await expect(
      withBrowser(() => Promise.resolve(1), { env, browser, signal: stop.signal }),
    ).rejects.toBe(reason);
    expect(readdirSync(folder).filter((name) => name.startsWith("puppeteer"))).toEqual([]);
  });

  if (process.platform === "linux")
    it("that is killed from outside is reported at once", async () => {
      const use = withBrowser(
        (session) =>
          session.withPage(page("<p>x</p>"), (p) => {
            for (const pid of children()) process.kill(pid, "SIGKILL");
            return p.evaluate("new Promise(() => {})");
          }),
        { env, browser },
      );
      await expect(use).rejects.toMatchObject({ code: "browser-stopped" });
    });

  it("is closed when its use fails, with the error of the use", async () => {
    const use = withBrowser(() => Promise.reject(new Error("of the use")), { env, browser });
    await expect(use).rejects.toThrow("of the use");
    expect(readdirSync(folder).filter((name) => name.startsWith("puppeteer"))).toEqual([]);
  });
});

const shipped = browsers.find((browser) => browser.kind === "shipped");
if (shipped)
  it("a page printed without any font is refused", async () => {
    const empty = join(folder, "empty.conf");
    const cache = `<cachedir>${join(folder, "fontconfig")}</cachedir>`;
    writeFileSync(empty, `<?xml version="1.0"?><fontconfig>${cache}</fontconfig>`);
    const browser = { ...shipped, env: { ...shipped.env, FONTCONFIG_FILE: empty } };
    const print = withBrowser(
      (session) => printPdf({ html: "<!doctype html><title>t</title><p>text", session, info }),
      { env, browser },
    );
    await expect(print).rejects.toMatchObject({ code: "no-text" });
  });

describe("a browser that does not start", () => {
  it("is reported with its path and what it said", async () => {
    const broken = { executable: process.execPath, kind: "chosen", version: null } as const;
    const use = withBrowser(() => Promise.resolve(), {
      env,
      browser: { ...broken, headless: true, env, args: [] },
    });
    await expect(use).rejects.toMatchObject({ code: "browser-start", where: process.execPath });
  });
});
