import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { cssString } from "../../../kernel-helpers/render/pdf/css-string.js";
import { there } from "../there.js";

/** The value of a CSS string token, by the rules of the CSS syntax module (§4.3.5, §4.3.7). */
function parsed(token: string): string {
  expect(token.startsWith('"') && token.endsWith('"')).toBe(true);
  const body = token.slice(1, -1);
  let value = "";
  for (let i = 0; i < body.length; i++) {
    const c = there(body[i]);
    if (c === '"' || c === "\n") throw new Error("the string ends early");
    if (c !== "\\") {
      value += c;
      continue;
    }
    const hex = /^[0-9a-fA-F]{1,6}/.exec(body.slice(i + 1))?.[0];
    if (hex === undefined) throw new Error("an escape without a number");
    value += String.fromCodePoint(parseInt(hex, 16));
    i += hex.length;
    if (/\s/.test(body[i + 1] ?? "")) i++;
  }
  return value;
}

describe("a CSS string", () => {
  it("keeps plain text as it is", () => {
    expect(cssString("SW-0001 rev. B (draft), 5 %")).toBe('"SW-0001 rev. B (draft), 5 %"');
  });
  it.each([
    ['a "quoted" word', '"a \\22 quoted\\22  word"'],
    ["a\\b", '"a\\5c b"'],
    ["a\nb", '"a\\a b"'],
    ["</style><script>", '"\\3c \\2f style\\3e \\3c script\\3e "'],
    ["*/ } @import url(x)", '"\\2a \\2f  \\7d  \\40 import url(x)"'],
  ])("escapes %j", (text, css) => {
    expect(cssString(text)).toBe(css);
  });
  it("replaces what CSS cannot hold", () => {
    expect(cssString("a\u0000b\ud800c")).toBe('"a\ufffdb\ufffdc"');
  });
  it("is read back as the same text, and holds nothing that could end it or the style element", () => {
    fc.assert(
      fc.property(fc.string({ unit: "binary" }), (text) => {
        const css = cssString(text);
        expect(css.slice(1, -1)).not.toMatch(/["<>\n\r]/);
        const kept = text.replace(/\r\n?/g, "\n").replaceAll("\0", "\ufffd");
        expect(parsed(css)).toBe(kept);
      }),
    );
  });
});
