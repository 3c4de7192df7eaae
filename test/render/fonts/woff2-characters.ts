import { readFileSync } from "node:fs";
import { brotliDecompressSync } from "node:zlib";

// The tags that WOFF2 numbers (W3C recommendation, §4.1), as far as the one sought here.
const CMAP = 0;
const GLYF = 10;
const LOCA = 11;
const ANY = 63;

/** The characters that a WOFF2 font has glyphs for, read from its cmap table. */
export function woff2Characters(file: string): ReadonlySet<number> {
  const font = readFileSync(file);
  const tables = font.readUInt16BE(12);
  let at = 48;
  const number = (): number => {
    for (let value = 0; ;) {
      const byte = font.readUInt8(at++);
      value = value * 128 + (byte & 127);
      if (byte < 128) return value;
    }
  };
  let offset = 0;
  let cmap: Buffer | null = null;
  const spans: { isCmap: boolean; from: number; length: number }[] = [];
  for (let i = 0; i < tables; i++) {
    const flags = font.readUInt8(at++);
    const tag = flags & 63;
    const isCmap = tag === ANY ? font.toString("latin1", at, (at += 4)) === "cmap" : tag === CMAP;
    const original = number();
    const isPlain = tag === GLYF || tag === LOCA ? flags >> 6 === 3 : flags >> 6 === 0;
    const length = isPlain ? original : number();
    spans.push({ isCmap, from: offset, length });
    offset += length;
  }
  const body = brotliDecompressSync(font.subarray(at, at + font.readUInt32BE(20)));
  for (const s of spans) if (s.isCmap) cmap = body.subarray(s.from, s.from + s.length);
  if (!cmap) throw new Error(`${file} has no cmap`);
  const found = new Set<number>();
  for (let i = 0; i < cmap.readUInt16BE(2); i++) {
    const table = cmap.subarray(cmap.readUInt32BE(8 + 8 * i));
    const format = table.readUInt16BE(0);
    if (format === 4) readSegments(table, found);
    if (format === 12) readGroups(table, found);
  }
  return found;
}

function readSegments(table: Buffer, found: Set<number>): void {
  const count = table.readUInt16BE(6) / 2;
  for (let k = 0; k < count; k++) {
    const end = table.readUInt16BE(14 + 2 * k);
    const start = table.readUInt16BE(16 + 2 * count + 2 * k);
    const delta = table.readInt16BE(16 + 4 * count + 2 * k);
    const place = 16 + 6 * count + 2 * k;
    const range = table.readUInt16BE(place);
    for (let c = start; c <= end && c < 0xffff; c++) {
      const glyph =
        range === 0 ? (c + delta) & 0xffff : table.readUInt16BE(place + range + 2 * (c - start));
      if (glyph !== 0) found.add(c);
    }
  }
}

function readGroups(table: Buffer, found: Set<number>): void {
  for (let k = 0; k < table.readUInt32BE(12); k++) {
    const end = table.readUInt32BE(20 + 12 * k);
    for (let c = table.readUInt32BE(16 + 12 * k); c <= end; c++) found.add(c);
  }
}
