import { escapeHtml } from "./escape-html.js";
import { raisedLowered } from "./raised-lowered.js";

const htmlTag = { raised: "sup", lowered: "sub" } as const;

/** Text as HTML in which "10⁻⁵" and "p₀" are set with `<sup>` and `<sub>`; everything is escaped. */
export const typesetHtml = (text: string): string =>
  raisedLowered(text)
    .map((part) => {
      if (part.set === "plain") return escapeHtml(part.text);
      const tag = htmlTag[part.set];
      return `<${tag}>${escapeHtml(part.text)}</${tag}>`;
    })
    .join("");

/** Text as the content of an SVG `<text>`, raised and lowered characters as smaller, shifted spans. */
export const typesetSvg = (text: string): string => raiseInSvg(escapeHtml(text));

/** The same for content that is escaped already. */
export const raiseInSvg = (content: string): string =>
  raisedLowered(content)
    .map((part) =>
      part.set === "plain"
        ? part.text
        : `<tspan baseline-shift="${part.set === "raised" ? "33%" : "-18%"}" font-size="72%">${part.text}</tspan>`,
    )
    .join("");
