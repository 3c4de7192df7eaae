import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { RenderError } from "../../errors/index.js";

const cache = new Map<string, string>();

/** A file of one of the packages that ship fonts, read once per process. */
export function packageFile(path: string, encoding: "utf8" | "base64"): string {
  const key = `${encoding} ${path}`;
  const known = cache.get(key);
  if (known !== undefined) return known;
  try {
    const text = readFileSync(createRequire(import.meta.url).resolve(path), encoding);
    cache.set(key, text);
    return text;
  } catch (error) {
    throw new RenderError({
      code: "missing-font",
      where: path,
      problem: "cannot be read",
      remedy: "install the packages again: npm ci",
      cause: error,
    });
  }
}

/** An `@font-face` rule that holds its font itself. */
export function fontFace({
  family,
  weight,
  style,
  file,
  range,
}: {
  family: string;
  weight: 400 | 600 | 700;
  style: "normal" | "italic";
  file: string;
  range?: string;
}): string {
  const data = packageFile(file, "base64");
  return `@font-face{font-family:${family};font-style:${style};font-weight:${weight};src:url(data:font/woff2;base64,${data}) format("woff2")${range ? `;unicode-range:${range}` : ""}}`;
}
