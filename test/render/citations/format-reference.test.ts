import { describe, expect, it } from "vitest";
import { allReferences, type Reference } from "../../../kernel-helpers/method/index.js";
import { formatReference } from "../../../kernel-helpers/render/citations/format-reference.js";

const nbsp = "\u00a0";
const person = (given: string, family: string): { family: string; given: string } => ({
  family,
  given,
});
const base = { id: "x", issued: { "date-parts": [[1999]] } } as const;
const plain = (r: Reference): string => formatReference(r).replaceAll(nbsp, " ");

describe("a reference", () => {
  it("to an article names journal, volume, issue and pages", () => {
    const text = plain({
      ...base,
      type: "article-journal",
      title: "Flow through <packed> columns",
      author: [person("Anna Maria", "Berg")],
      "container-title": "Journal of Columns",
      volume: "48",
      issue: "2",
      page: "89-94",
      DOI: "10.1000/ab(c)<1>",
    });
    expect(text).toBe(
      "A. M. Berg, “Flow through &lt;packed&gt; columns,” <i>Journal of Columns</i>, vol. 48, no. 2, " +
        'pp. 89–94, 1999, <a href="https://doi.org/10.1000/ab(c)%3C1%3E">doi:10.1000/ab(c)&lt;1&gt;</a>.',
    );
  });
  it("to a book sets its title in italics and counts its edition", () => {
    const book: Reference = {
      ...base,
      type: "book",
      title: "Flows",
      author: [person("J.-P.", "Roy"), person("Li", "Wu"), person("O.", "van Es")],
      edition: "2",
      publisher: "Press",
    };
    expect(plain(book)).toBe(
      "J.-P. Roy, L. Wu, and O. van Es, <i>Flows</i>, 2nd ed., Press, 1999.",
    );
    expect(plain({ ...book, edition: "11" })).toContain("11th ed.");
    expect(plain({ ...book, edition: "revised" })).toContain("revised ed.");
  });
  it("to a chapter names the book it is in", () => {
    expect(
      plain({ ...base, type: "chapter", title: "Wells", "container-title": "Flows", page: "7" }),
    ).toBe("“Wells,” in <i>Flows</i>, p. 7, 1999.");
  });
  it("to a report names its number and who issued it", () => {
    expect(
      plain({
        ...base,
        type: "report",
        title: "Tests",
        author: [{ literal: "Institute of Flows" }],
        number: "IF-7",
        publisher: "The Institute",
      }),
    ).toBe("Institute of Flows, <i>Tests</i>, report IF-7, The Institute, 1999.");
  });
  it("to a standard begins with its designation", () => {
    expect(
      plain({ ...base, type: "standard", title: "Pipes", number: "ST 1:1999", publisher: "Body" }),
    ).toBe("ST 1:1999, <i>Pipes</i>, Body, 1999.");
  });
  it("to software names its version", () => {
    expect(plain({ ...base, type: "software", title: "props", number: "1.2" })).toBe(
      "<i>props</i>, software, version 1.2, 1999.",
    );
  });
  it("leaves out what is not known", () => {
    expect(plain({ id: "x", type: "article-journal", title: "T" })).toBe("“T.”");
    expect(plain({ id: "x", type: "no such type", title: "T" })).toBe("<i>T</i>.");
    expect(plain({ id: "x", type: "chapter", title: "T", author: [] })).toBe("“T.”");
  });
  it("names the first of more than six authors", () => {
    const author = Array.from({ length: 7 }, (_, i) => person("A.", `Name${i}`));
    expect(plain({ ...base, type: "book", title: "T", author })).toMatch(/^A\. Name0 et al\., /);
    expect(plain({ ...base, type: "book", title: "T", author: author.slice(0, 2) })).toMatch(
      /^A\. Name0 and A\. Name1, /,
    );
  });
  it("in the bibliography is always one clean line", () => {
    expect(allReferences.length).toBeGreaterThan(0);
    for (const r of allReferences) {
      const text = plain(r);
      expect(text).toMatch(/[.”]$/);
      expect(text).not.toMatch(/undefined|null|, ,|,,|\.\.$|<i><\/i>/);
    }
  });
});
