import { fontStacks } from "../fonts/font-stacks.js";
import { escapeHtml } from "../lettering/escape-html.js";
import { typesetSvg } from "../lettering/typeset.js";

/** Coordinates to 0.01 px: the last digits of longer ones differ between engines. */
export const px = (n: number): string => String(Math.round(n * 100) / 100 + 0);

export type Attributes = Readonly<Record<string, string | number>>;

/** One SVG element; numbers are rounded, text is escaped. */
export const element = (name: string, attributes: Attributes, content = ""): string => {
  const list = Object.entries(attributes)
    .map(([key, value]) => ` ${key}="${typeof value === "number" ? px(value) : escapeHtml(value)}"`)
    .join("");
  return content === "" ? `<${name}${list}/>` : `<${name}${list}>${content}</${name}>`;
};

export const line = (
  { x1, y1, x2, y2 }: { x1: number; y1: number; x2: number; y2: number },
  attributes: Attributes,
): string => element("line", { x1, y1, x2, y2, ...attributes });

/** Open or (closed by "Z") joined points. */
export const path = (
  points: readonly (readonly [number, number])[],
  attributes: Attributes,
  end: "" | "Z" = "",
): string =>
  element("path", {
    d: `M${points.map(([x, y]) => `${px(x)},${px(y)}`).join("L")}${end}`,
    ...attributes,
  });

/** A line of text; `y` is its middle. */
export const label = (
  { text, x, y }: { text: string; x: number; y: number },
  attributes: Attributes,
): string => element("text", { x, y: y + 3.4, ...attributes }, typesetSvg(text));

/** A whole drawing: one image with a text for screen readers. */
export const drawing = (
  { width, height, description }: { width: number; height: number; description: string },
  content: string,
): string =>
  element(
    "svg",
    {
      role: "img",
      "aria-label": description,
      style: "overflow:visible",
      xmlns: "http://www.w3.org/2000/svg",
      width,
      height,
      viewBox: `0 0 ${px(width)} ${px(height)}`,
      "font-family": fontStacks.sans,
      "font-size": 10,
    },
    content,
  );
