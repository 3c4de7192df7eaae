import { describe, expect, it } from "vitest";
import { fontConfiguration } from "../../../kernel-helpers/render/browser/font-configuration.js";

describe("the font configuration", () => {
  it("names the unpacked fonts first, then the system's, with every path escaped", () => {
    const xml = fontConfiguration({ fonts: "/home/a&b/<fonts>", cache: "/c" });
    const dirs = [...xml.matchAll(/<dir>(.*)<\/dir>/g)].map((m) => m[1]);
    expect(dirs).toEqual([
      "/home/a&amp;b/&lt;fonts&gt;",
      "/usr/share/fonts",
      "/usr/local/share/fonts",
    ]);
    expect(xml).toContain("<cachedir>/c</cachedir>");
  });
});
