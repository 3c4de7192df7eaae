import { SourceMap, type SourceMapPayload } from "node:module";
import type ts from "@tslab/typescript-for-tslab";
import type { CellPlace } from "../thrown-words.js";

const NAME = /^stillwell-cell-(\d+)$/;
const INLINE_MAP = /\n\/\/# sourceMappingURL=data:application\/json[^,]*,(\S+)\s*$/;

/** Where in the cells' sources the lines of the running code come from. */
export class SourcePositions {
  /** Per cell the maps of the two steps of its compilation, the last step first. */
  private readonly cells = new Map<number, { maps: readonly SourceMapPayload[]; lines: number }>();

  /** Compiles to CommonJS as tslab asks, names the script after its cell, and keeps both maps. */
  transpile(
    compiler: typeof ts,
    javascript: string,
    options: ts.TranspileOptions,
    cell: number,
  ): ts.TranspileOutput {
    const first = INLINE_MAP.exec(javascript)?.[1];
    const output = compiler.transpileModule(javascript.replace(INLINE_MAP, ""), {
      ...options,
      compilerOptions: { ...options.compilerOptions, sourceMap: true },
    });
    const code = output.outputText.replace(/\n\/\/# sourceMappingURL=.*\s*$/, "\n");
    const map = first === undefined ? null : parse(Buffer.from(first, "base64").toString());
    const next = parse(output.sourceMapText ?? "");
    // Modules beside the notebook go the same way; they keep their own names.
    if (!map || !next || !map.sources[0]?.endsWith("__tslab__.ts"))
      return { ...output, outputText: code };
    this.cells.set(cell, { maps: [next, map], lines: code.split("\n").length });
    return { ...output, outputText: `${code}\n//# sourceURL=stillwell-cell-${cell}` };
  }

  /** The place in a cell of a place in the running code; null for other scripts and for glue. */
  locate = (frame: { script: string; line: number; column: number }): CellPlace | null => {
    const cell = Number(NAME.exec(frame.script)?.[1]);
    const compiled = this.cells.get(cell);
    // Past its last line stands the call of the function that tslab makes of a cell.
    if (!compiled || frame.line > compiled.lines) return null;
    // The first line is glue in every cell, so what tslab puts before it moves no column.
    let [line, column] = [frame.line - 1, frame.column - 1];
    for (const step of compiled.maps) {
      const entry = new SourceMap(step).findEntry(line, column);
      if (!("originalLine" in entry)) return null;
      [line, column] = [entry.originalLine, entry.originalColumn];
    }
    // tslab puts one line of its own before the cell, so that line 0 is not the analyst's.
    return line < 1 ? null : { cell, line, column: column + 1 };
  };
}

function parse(json: string): SourceMapPayload | null {
  try {
    return JSON.parse(json) as SourceMapPayload;
  } catch {
    return null;
  }
}
