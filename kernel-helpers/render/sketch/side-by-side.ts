import { RenderError } from "../../errors/index.js";
import { drawing, px } from "./sketch-parts.js";

const gap = 6;

/** Two drawings as one image; made with the same `plotTop` and `plotBottom` they share the depth scale. */
export function sideBySide({
  sketch,
  chart,
  label,
}: {
  sketch: string;
  chart: string;
  /** The text of the whole for screen readers. */
  label: string;
}): string {
  const [left, right] = [opened(sketch, "sketch"), opened(chart, "chart")];
  const width = left.width + gap + right.width;
  const height = Math.max(left.height, right.height);
  const content = left.placedAt(0) + right.placedAt(left.width + gap);
  return drawing({ width, height, description: label }, content);
}

interface Opened {
  readonly width: number;
  readonly height: number;
  readonly placedAt: (x: number) => string;
}

/** A drawing whose own role is taken away: the two together are one image. */
function opened(svg: string, where: string): Opened {
  const tag = /^<svg [^>]*>/.exec(svg)?.[0];
  const measure = (name: string): number =>
    Number(new RegExp(` ${name}="([\\d.]+)"`).exec(tag ?? "")?.[1] ?? NaN);
  const [width, height] = [measure("width"), measure("height")];
  if (tag === undefined || Number.isNaN(width) || Number.isNaN(height))
    throw new RenderError({
      code: "bad-drawing",
      where,
      problem: "is not an SVG drawing with a width and a height",
    });
  const plain = tag.replace(/ (?:role|aria-label)="[^"]*"/g, "");
  return {
    width,
    height,
    placedAt: (x) => plain.replace(/^<svg /, `<svg x="${px(x)}" `) + svg.slice(tag.length),
  };
}
