import { describe, expect, it } from "vitest";
import { pageCss, pageOfPages } from "../../../kernel-helpers/render/pdf/page-css.js";

const line = { left: "SW-0001 rev. B", right: "Status: draft" };

describe("the page rule", () => {
  it.each([
    ["A4", "size:210mm 297mm"],
    ["Letter", "size:8.5in 11in"],
  ] as const)("names the sheet %s", (size, css) => {
    expect(pageCss({ size, header: line, footer: {} })).toContain(css);
  });
  it("puts each text in its margin box, and an empty one where there is none", () => {
    const css = pageCss({ size: "A4", header: line, footer: { right: pageOfPages } });
    expect(css).toContain('@top-left{content:"SW-0001 rev. B"');
    expect(css).toContain('@top-center{content:""');
    expect(css).toContain('@top-right{content:"Status: draft"');
    expect(css).toContain('@bottom-right{content:"Page " counter(page) " of " counter(pages)');
  });
  it("lets no text out of its string", () => {
    const evil = `"} body{display:none} </style><script>alert(1)</script>\\`;
    const css = pageCss({ size: "A4", header: { left: evil }, footer: { center: evil } });
    expect(css).not.toContain("<");
    expect(css).not.toContain("display:none}");
    const braces = css.replace(/"(?:[^"\\]|\\.)*"/g, "");
    expect(braces.split("{").length).toBe(braces.split("}").length);
    expect(braces).not.toContain("script");
  });
});
