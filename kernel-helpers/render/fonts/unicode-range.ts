import { RenderError } from "../../errors/index.js";

/** Whether any of the characters lies in a CSS unicode-range such as `U+0370-0377,U+2113`. */
export function touchesRange(characters: ReadonlySet<number>, range: string): boolean {
  const spans = range.split(",").map((part): readonly [number, number] => {
    const match = /^\s*U\+([0-9a-f]+)(?:-([0-9a-f]+))?\s*$/i.exec(part);
    if (!match)
      throw new RenderError({
        code: "bad-unicode-range",
        where: "font",
        problem: `"${part}" is not a range of characters`,
        expected: "such as U+0370-0377",
      });
    const first = parseInt(match[1] ?? "", 16);
    return [first, match[2] === undefined ? first : parseInt(match[2], 16)];
  });
  for (const c of characters) if (spans.some(([a, b]) => c >= a && c <= b)) return true;
  return false;
}
