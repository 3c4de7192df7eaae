import { createRequire } from "node:module";
import { dirname, join, relative } from "node:path";
import type ts from "@tslab/typescript-for-tslab";
import type { Diagnostic } from "../compiler-words.js";
import type { KnownType } from "../known-type.js";
import { awaitsInLoop, earlierNames } from "./earlier-names.js";
import { lastExpressionType } from "./last-expression-type.js";
import { SourcePositions } from "./source-positions.js";
import { typeResolution } from "./type-resolution.js";

export interface EngineParts {
  /** The folder of our package. */
  readonly root: string;
  /** The folder that cells run in. */
  readonly cwd: string;
  /** Takes what a cell shows through tslab's own `display`. */
  readonly onDisplay: (content: { readonly [name: string]: unknown }, isUpdate: boolean) => void;
}

/** What came of the code of a cell. */
export type Ran =
  | { readonly outcome: "ran"; readonly last: { value: unknown; known: KnownType | null } | null }
  | { readonly outcome: "refused"; readonly diagnostics: readonly Diagnostic[] }
  | { readonly outcome: "threw"; readonly thrown: unknown };

/** Compiles and runs cells; each sees the declarations of those before it. */
export interface Engine {
  readonly typescriptVersion: string;
  readonly positions: SourcePositions;
  run(source: string, cell: number): Promise<Ran>;
  complete(source: string, at: number): { start: number; end: number; candidates: string[] };
  inspect(source: string, at: number): string | null;
  isComplete(source: string): { completed: boolean; indent?: string };
  /** Ends the wait of a cell that awaits; a cell that computes is ended by SIGINT itself. */
  interrupt(): void;
  /** True for a line of a stack that lies in tslab or its compiler. */
  isOwnFrame(line: string): boolean;
  close(): void;
}

const load = createRequire(import.meta.url);

/**
 * The one place that knows the insides of tslab (pinned). What is not open to settings is reached
 * by handing tslab a compiler with some of its functions replaced, before tslab first loads it.
 */
export function createEngine({ root, cwd, onDisplay }: EngineParts): Engine {
  const tslabFolder = dirname(load.resolve("tslab/package.json"));
  const fromTslab = createRequire(join(tslabFolder, "package.json"));
  const compilerFile = fromTslab.resolve("@tslab/typescript-for-tslab");
  const compiler = fromTslab(compilerFile) as typeof ts;
  const types = typeResolution({ compiler, root, cwd });
  const positions = new SourcePositions(cwd);

  let cell = 0;
  let known: KnownType | null = null;
  let raised: readonly ts.Diagnostic[] = [];
  let hasLoopAwait = false;

  const replaced = {
    createWatchCompilerHost(
      files: string[],
      options: ts.CompilerOptions,
      system: ts.System,
      ...rest: [undefined, ts.DiagnosticReporter, ts.WatchStatusReporter]
    ) {
      const host = compiler.createWatchCompilerHost(files, types.options(options), system, ...rest);
      return Object.assign(host, types.resolver(host));
    },
    createWatchProgram(host: ts.WatchCompilerHostOfFilesAndCompilerOptions<ts.BuilderProgram>) {
      const tell = host.afterProgramCreate?.bind(host);
      host.afterProgramCreate = (builder) => {
        const emit = builder.emit.bind(builder);
        builder.emit = (file, write, token, onlyTypes, custom) => {
          const earlier = builder.getSourceFiles().find((f) => f.fileName.endsWith(EARLIER));
          const checker = builder.getProgram().getTypeChecker();
          const before = earlier ? [earlierNames({ compiler, checker, earlier })] : [];
          return emit(file, write, token, onlyTypes, { ...custom, before });
        };
        tell?.(builder);
      };
      return compiler.createWatchProgram(host);
    },
    // The last look at the checked cell, before its tree is rewritten for output.
    getPreEmitDiagnosticsOfFiles(program: ts.Program, files: ts.SourceFile[]) {
      const [file] = files;
      raised = compiler.getPreEmitDiagnosticsOfFiles(program, files);
      known = file ? lastExpressionType(compiler, program.getTypeChecker(), file) : null;
      hasLoopAwait = file !== undefined && awaitsInLoop(compiler, file);
      return raised;
    },
    transpileModule(javascript: string, options: ts.TranspileOptions) {
      return positions.transpile(compiler, javascript, options, cell);
    },
  };
  // The compiler's exports are getters, so the whole object is replaced.
  const cached = fromTslab.cache[compilerFile];
  if (cached)
    cached.exports = Object.defineProperties(
      {},
      {
        ...Object.getOwnPropertyDescriptors(compiler),
        ...Object.getOwnPropertyDescriptors(replaced),
      },
    );

  const inside = <T>(file: string): T => load(join(tslabFolder, "dist", file)) as T;
  const { createConverter, isCompleteCode } =
    inside<typeof import("tslab/dist/converter.js")>("converter.js");
  const { createExecutor } = inside<typeof import("tslab/dist/executor.js")>("executor.js");
  const { printQuickInfo } = inside<typeof import("tslab/dist/inspect.js")>("inspect.js");
  Object.assign(inside<object>("jupyter.js"), {
    lastWriteDisplayData: (content: { readonly [name: string]: unknown }, isUpdate?: boolean) =>
      onDisplay(content, isUpdate === true),
  });

  let refused: readonly Diagnostic[] = [];
  let thrown: { readonly value: unknown } | null = null;
  let last: { value: unknown; known: KnownType | null } | null = null;

  const converter = createConverter({ isJS: false, isBrowser: false });
  const node: typeof converter = {
    ...converter,
    convert(declared, source) {
      known = null;
      raised = [];
      const converted = converter.convert(declared, source);
      refused = converted.diagnostics.length > 0 ? chains(compiler, raised, converted, cwd) : [];
      return hasLoopAwait ? { ...converted, hasToplevelAwait: true } : converted;
    },
  };
  const executor = createExecutor(
    cwd,
    { node, browser: node, close: () => converter.close() },
    {
      log: (value: unknown) => void (last = { value, known }),
      // Called once per link of each diagnostic with a format, which `refused` tells better, or
      // with what a cell threw.
      error(what: unknown, ...rest: unknown[]) {
        if (what !== LINK_FORMAT) thrown = { value: what };
        else if (refused.length === 0) refused = [asDiagnostic(rest)];
      },
    },
  );

  return {
    typescriptVersion: compiler.version,
    positions,
    async run(source, number) {
      [cell, refused, thrown, last] = [number, [], null, null];
      try {
        await executor.execute(source);
      } catch (value) {
        return { outcome: "threw", thrown: value };
      }
      // Assigned by the callbacks above, which the compiler's flow analysis does not follow.
      const told = thrown as { readonly value: unknown } | null;
      if (told) return { outcome: "threw", thrown: told.value };
      if (refused.length > 0) return { outcome: "refused", diagnostics: refused };
      return { outcome: "ran", last };
    },
    complete: (source, at) => executor.complete(source, at),
    inspect(source, at) {
      const info = executor.inspect(source, at) as ts.QuickInfo | undefined;
      return info ? printQuickInfo(info) : null;
    },
    isComplete: isCompleteCode,
    interrupt: () => executor.interrupt(),
    isOwnFrame: (line) =>
      positions.isCell(line) || line.includes(tslabFolder) || line.includes(dirname(compilerFile)),
    close: () => executor.close(),
  };
}

/** The file in which tslab keeps the declarations of earlier cells. */
const EARLIER = "__prev__.d.ts";
/** "Expected 2 arguments, but got 1." */
const TOO_FEW = 2554;
const LINK_FORMAT = "%s%d:%d - %s";

function asDiagnostic([file, line, column, message]: readonly unknown[]): Diagnostic {
  return {
    file: String(file).trim() || null,
    line: Number(line),
    column: Number(column),
    code: 0,
    chain: [String(message)],
  };
}

/** The compiler's diagnostics that tslab holds against the cell, each with its whole chain. */
function chains(
  compiler: typeof ts,
  raised: readonly ts.Diagnostic[],
  converted: { readonly diagnostics: readonly { code: number; messageText: string }[] },
  cwd: string,
): Diagnostic[] {
  const held = new Set(converted.diagnostics.map((d) => `${d.code} ${d.messageText}`));
  return raised.flatMap((d): Diagnostic[] => {
    const chain = links(d.messageText);
    if (!d.file || d.start === undefined || !held.has(`${d.code} ${chain[0] ?? ""}`)) return [];
    const { line, character } = compiler.getLineAndCharacterOfPosition(d.file, d.start);
    const isCell = d.file.fileName.endsWith("__tslab__.ts");
    // Which argument is missing stands in a note beside the message.
    const notes = d.code === TOO_FEW ? (d.relatedInformation ?? []) : [];
    return [
      {
        file: isCell ? null : relative(cwd, d.file.fileName),
        // tslab puts one line of its own before the cell.
        line: isCell ? line : line + 1,
        column: character + 1,
        code: d.code,
        chain: [...chain, ...notes.flatMap((note) => links(note.messageText))],
      },
    ];
  });
}

const links = (message: string | ts.DiagnosticMessageChain): string[] =>
  typeof message === "string"
    ? [message]
    : [message.messageText, ...(message.next ?? []).flatMap(links)];
