const TOKEN = /\\[A-Za-z]+|\\.|[A-Za-z0-9]|\s+|./gs;
const OPAQUE = new Set(["\\mathrm", "\\text", "\\operatorname", "\\textrm", "\\mathit"]);
const tokens = (tex: string): string[] => tex.match(TOKEN) ?? [];
const tight = (tex: string): string[] => tokens(tex).filter((t) => !/^\s+$/.test(t));

/**
 * An equation with numbers in place of its symbols. Symbols are matched token by token, the longest
 * first; a subscripted name is not mistaken for its bare letter, nor a letter within an upright word for a symbol.
 */
export function putIn(tex: string, values: ReadonlyMap<string, string>): string {
  const wanted = [...values]
    .map(([symbol, number]) => ({ parts: tight(symbol), number }))
    .filter((w) => w.parts.length > 0)
    .sort((a, b) => b.parts.length - a.parts.length);
  const all = tokens(tex);
  const out: string[] = [];
  for (let i = 0; i < all.length;) {
    const t = all[i] ?? "";
    const hit = wanted.map((w) => ({ w, end: match(all, i, w.parts) })).find(({ end }) => end > 0);
    if (hit && (all[hit.end] ?? "") !== "_") {
      out.push(`{(${hit.w.number})}`);
      i = hit.end;
      continue;
    }
    if (OPAQUE.has(t)) {
      const end = groupEnd(all, i + 1);
      out.push(all.slice(i, end).join(""));
      i = end;
      continue;
    }
    if (all[i + 1] === "_" && /^(\\[A-Za-z]+|[A-Za-z])$/.test(t)) {
      const end = groupEnd(all, i + 2); // a symbol that is not among the values keeps its subscript whole
      out.push(all.slice(i, end).join(""));
      i = end;
      continue;
    }
    out.push(t);
    i += 1;
  }
  return out.join("");
}

/** Index after the match, spaces in the equation skipped; 0 when there is none. */
function match(all: readonly string[], from: number, parts: readonly string[]): number {
  let i = from;
  for (const [k, part] of parts.entries()) {
    while (k > 0 && /^\s+$/.test(all[i] ?? "")) i += 1;
    if (all[i] !== part) return 0;
    i += 1;
  }
  return i;
}

/** Index after a brace group, or after one token. */
function groupEnd(all: readonly string[], from: number): number {
  let i = from;
  while (/^\s+$/.test(all[i] ?? "")) i += 1;
  if (all[i] !== "{") return i + 1;
  let depth = 0;
  for (; i < all.length; i += 1) {
    if (all[i] === "{") depth += 1;
    if (all[i] === "}") depth -= 1;
    if (depth === 0) return i + 1;
  }
  return i;
}
