import { beforeAll, describe, expect, it } from "vitest";
import { renderHtml } from "../../../kernel-helpers/render/package/render-html.js";
import type { Item, StudyRecord } from "../../../kernel-helpers/study/index.js";
import { buildExample } from "../../study/build-example.js";

const record = buildExample("html").s.record({ at: "2026-01-01T09:30:00.000Z", clean: true });
const withoutStyle = (html: string): string => html.replace(/<style>[\s\S]*?<\/style>/, "");
const all = (html: string, pattern: RegExp): string[] =>
  [...html.matchAll(pattern)].map((m) => m[1] ?? "");

describe("the HTML of a package", () => {
  let html = "";
  beforeAll(async () => {
    ({ html } = await renderHtml(record, "A4"));
  });

  it("holds every section in its order, each under a numbered heading", () => {
    const order = [
      'class="cover"',
      'id="revisions"',
      'class="contents"',
      'id="purpose"',
      'id="conclusions"',
      'id="cautions"',
      'id="inputs"',
      'id="assumptions"',
      'id="methods"',
      'id="calculation"',
      'id="exhibits"',
      'id="alternates"',
      'id="uncertainty"',
      'id="open"',
      'id="references"',
      'id="software"',
    ].map((mark) => html.indexOf(mark));
    expect(order.every((at) => at > 0)).toBe(true);
    expect([...order].sort((a, b) => a - b)).toEqual(order);
    expect(all(html, /<section id="[a-z]+"><h2><span class="no">(\d+)<\/span>/g)).toEqual(
      Array.from({ length: 13 }, (_, i) => String(i + 1)),
    );
  });

  it("has one first heading, and skips no level of headings", () => {
    const levels = all(html, /<h([1-6])[ >]/g).map(Number);
    expect(levels.filter((l) => l === 1)).toHaveLength(1);
    expect(levels[0]).toBe(1);
    expect(levels.filter((l, i) => i > 0 && l > (levels[i - 1] ?? 0) + 1)).toEqual([]);
  });

  it("is one file: no script, nothing fetched, no link out but to a DOI", () => {
    expect(all(html, /<(script|link|iframe|object|embed|img)\b/gi)).toEqual([]);
    expect(all(withoutStyle(html), /(\bsrc\s*=|\bstyle="[^"]*url)/gi)).toEqual([]);
    expect(all(html, /(@import)/g)).toEqual([]);
    expect(all(html, /url\(\s*["']?([^"')]{0,12})/g).filter((u) => !/^data:|^#/.test(u))).toEqual(
      [],
    );
    const out = all(html, /href="(?!#)([^"]*)"/g);
    expect(out.filter((h) => !h.startsWith("https://doi.org/"))).toEqual([]);
  });

  it("gives each link within the page one target, and no target twice", () => {
    const ids = all(html, / id="([^"]+)"/g);
    expect(new Set(ids).size).toBe(ids.length);
    const links = all(html, /href="#([^"]+)"/g);
    expect(links.length).toBeGreaterThan(40);
    expect([...new Set(links)].filter((to) => !ids.includes(to))).toEqual([]);
    const pages = all(html, /data-page-of="([^"]+)"/g);
    expect(pages.filter((to) => !ids.includes(to))).toEqual([]);
  });

  it("says its language, lets a keyboard skip to the conclusions, and heads every column", () => {
    expect(html.includes('<html lang="en">')).toBe(true);
    expect(html.includes('<a class="skip" href="#conclusions">')).toBe(true);
    expect(all(html, /<th( [^>]*)?>/g).filter((a) => !/scope="(?:col|row)"/.test(a))).toEqual([]);
  });

  it("gives as many cells to each row of a table as its head has columns", () => {
    const tables = all(withoutStyle(html), /<table[^>]*>([\s\S]*?)<\/table>/g);
    expect(tables.length).toBeGreaterThan(8);
    for (const table of tables) {
      const columns = all(/<thead>([\s\S]*?)<\/thead>/.exec(table)?.[1] ?? "", /<th( )/g).length;
      if (columns === 0) continue;
      const body = /<tbody>([\s\S]*?)<\/tbody>/.exec(table)?.[1] ?? "";
      for (const row of all(body, /<tr[^>]*>([\s\S]*?)<\/tr>/g)) {
        const cells = all(row, /<t[dh]((?: [^>]*)?)>/g).map((attributes) =>
          Number(/colspan="(\d)"/.exec(attributes)?.[1] ?? 1),
        );
        expect(cells.reduce((a, n) => a + n, 0)).toBe(columns);
      }
    }
  });

  it("shows no raw TeX outside the annotations of the equations", () => {
    const text = withoutStyle(html)
      .replace(/<annotation[\s\S]*?<\/annotation>/g, "")
      .replace(/<[^>]+>/g, " ");
    expect(all(text, /(\\(?:frac|mathrm|rho|mu|quad|left)\b.{0,40})/g)).toEqual([]);
    expect(all(text, /(.{0,40}(?:undefined|NaN|\[object))/g)).toEqual([]);
  });

  it("is the same each time", async () => {
    expect((await renderHtml(record, "A4")).html === html).toBe(true);
  });

  it("prints on the paper it was asked for", async () => {
    const paper = (text: string): string[] => all(text, /@page\s*\{\s*size:\s*([^;]+);/g);
    expect(paper(html)).toEqual(["210mm 297mm"]);
    expect(paper((await renderHtml(record, "Letter")).html)).toEqual(["8.5in 11in"]);
  });
});

describe("text that a user typed", () => {
  const EVIL = `</style></title><script>alert("1")</script>'"><img src=x onerror=alert(2)>{{ pkg.hash }}`;
  const evil = (items: readonly Item[]): Item[] =>
    items.map((i): Item => {
      const named = { ...i, title: EVIL };
      switch (named.op) {
        case "given":
        case "assumed": {
          const verify = named.verify && { ...named.verify, how: EVIL, by: EVIL };
          const said = { ...named, because: EVIL, verify };
          return said.form === "number" && said.spread
            ? { ...said, spread: { ...said.spread, says: EVIL } }
            : said;
        }
        case "compare":
        case "check":
          return { ...named, because: EVIL };
        case "caution":
          return { ...named, text: EVIL };
        case "table":
          return {
            ...named,
            caption: EVIL,
            columns: named.columns.map((c) => ({ ...c, head: EVIL })),
          };
        case "conclude":
          return { ...named, parts: named.parts.map((p) => (typeof p === "string" ? EVIL : p)) };
        default:
          return named;
      }
    });
  const { body, run } = record;
  const hostile: StudyRecord = {
    ...record,
    run: { ...run, notebook: { name: EVIL, sha256: EVIL } },
    body: {
      ...body,
      study: {
        ...body.study,
        title: EVIL,
        number: EVIL,
        revision: EVIL,
        purpose: EVIL,
        decision: EVIL,
        prepared: EVIL,
        checked: EVIL,
        approved: EVIL,
        disclaimer: EVIL,
      },
      sections: body.sections.map((s) => ({ ...s, title: EVIL, about: EVIL })),
      items: evil(body.items),
    },
  };

  it("is shown as it was typed, and is never read as markup, style or template", async () => {
    const { html } = await renderHtml(hostile, "A4");
    expect(html.match(/<\/?style\b/gi)).toHaveLength(2);
    expect(html.match(/<\/title>/gi)).toHaveLength(1);
    const markup = withoutStyle(html).replace(/"[^"<>]*"/g, '""');
    expect(all(markup, /(<(?:script|img)\b|<[a-z][^>]*\son[a-z]+\s*=)/gi)).toEqual([]);
    const shown = html.split("&lt;script&gt;alert(&quot;1&quot;)&lt;/script&gt;").length - 1;
    expect(shown).toBeGreaterThan(25);
    expect(html.includes("{{ pkg.hash }}")).toBe(true);
  });
});
