import { SourceMap, type SourceMapPayload } from "node:module";
import { basename, join } from "node:path";
import type ts from "@tslab/typescript-for-tslab";
import type { SourcePlace } from "../thrown-words.js";

interface Compiled {
  /** The maps of the two steps of the compilation, the last step first. */
  readonly maps: readonly SourceMapPayload[];
  readonly lines: number;
  /** The cell's number, or the name of a module beside the notebook. */
  readonly of: number | string;
}

const INLINE_MAP = /\n\/\/# sourceMappingURL=data:application\/json[^,]*,(\S+)\s*$/;
const CELL = "__tslab__.ts";
const cellScript = (cell: number): string => `stillwell-cell-${cell}`;

/** Where in the sources of cells, and of modules beside the notebook, the running code comes from. */
export class SourcePositions {
  private readonly scripts = new Map<string, Compiled>();
  constructor(private readonly cwd: string) {}

  /** Compiles to CommonJS as tslab asks, names a cell's script after its cell, keeps both maps. */
  transpile(
    compiler: typeof ts,
    javascript: string,
    options: ts.TranspileOptions,
    cell: number,
  ): ts.TranspileOutput {
    const encoded = INLINE_MAP.exec(javascript)?.[1] ?? "";
    const output = compiler.transpileModule(javascript.replace(INLINE_MAP, ""), {
      ...options,
      compilerOptions: { ...options.compilerOptions, sourceMap: true },
    });
    const code = output.outputText.replace(/\n\/\/# sourceMappingURL=.*\s*$/, "\n");
    const first = parse(Buffer.from(encoded, "base64").toString());
    const last = parse(output.sourceMapText ?? "");
    if (!first || !last) return { ...output, outputText: code };
    const source = first.sources[0] ?? "";
    const isCell = basename(source) === CELL;
    const script = isCell
      ? cellScript(cell)
      : join(this.cwd, source.replace(/^\.\.\//, "").replace(/\.[jt]sx?$/, ".js"));
    this.scripts.set(script, {
      maps: [last, first],
      lines: code.split("\n").length,
      of: isCell ? cell : source.replace(/^\.\.\//, ""),
    });
    return { ...output, outputText: isCell ? `${code}\n//# sourceURL=${script}` : code };
  }

  /** The place in a source of a place in the running code; null for other scripts and for glue. */
  readonly locate = (frame: {
    readonly script: string;
    readonly line: number;
    readonly column: number;
  }): SourcePlace | null => {
    const compiled = this.scripts.get(frame.script);
    // Past a cell's last line stands the call of the function that tslab makes of it.
    if (!compiled || frame.line > compiled.lines) return null;
    // The first line is glue in every cell, so what tslab puts before it moves no column.
    let [line, column] = [frame.line - 1, frame.column - 1];
    for (const map of compiled.maps) {
      const entry = new SourceMap(map).findEntry(line, column);
      if (!("originalLine" in entry)) return null;
      [line, column] = [entry.originalLine, entry.originalColumn];
    }
    if (typeof compiled.of === "string")
      return { cell: null, file: compiled.of, line: line + 1, column: column + 1 };
    // tslab puts one line of its own before a cell, so that line 0 is not the analyst's.
    return line < 1 ? null : { cell: compiled.of, file: null, line, column: column + 1 };
  };

  /** True for a script that is a cell, also at places that are glue. */
  isCell(frame: string): boolean {
    return frame.includes(cellScript(0).slice(0, -1));
  }
}

function parse(json: string): SourceMapPayload | null {
  try {
    return JSON.parse(json) as SourceMapPayload;
  } catch {
    return null;
  }
}
