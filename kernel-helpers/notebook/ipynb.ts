import { z } from "zod";
import { NotebookError } from "../errors/index.js";
import type { CellOutput } from "./cell-outputs.js";

const text = z.union([z.string(), z.array(z.string())]);
const cell = z.looseObject({
  cell_type: z.enum(["code", "markdown", "raw"]),
  source: text,
});
const language = z.looseObject({ name: z.string().optional(), language: z.string().optional() });
const notebook = z.looseObject({
  nbformat: z.literal(4),
  nbformat_minor: z.number(),
  metadata: z.looseObject({
    kernelspec: language.optional(),
    language_info: language.optional(),
  }),
  cells: z.array(cell),
});

/** A Jupyter notebook of format 4; fields that are not named here are kept as they are. */
export type Ipynb = z.infer<typeof notebook>;
export type IpynbCell = z.infer<typeof cell>;

/** Reads a notebook's text; `file` is named in what is said of it. Refuses one of another language. */
export function parseIpynb(json: string, file: string): Ipynb {
  let found: unknown;
  try {
    found = JSON.parse(json);
  } catch (cause) {
    throw new NotebookError({
      code: "not-a-notebook",
      where: file,
      problem: "is not JSON",
      expected: "a Jupyter notebook (.ipynb)",
      cause,
    });
  }
  refuseOtherFormats(found, file);
  const parsed = notebook.safeParse(found);
  if (!parsed.success) {
    const [issue] = parsed.error.issues;
    throw new NotebookError({
      code: "not-a-notebook",
      where: [file, ...(issue?.path.map(String) ?? [])].join(" › "),
      problem: `does not fit a notebook of format 4 (${issue?.message ?? "unknown"})`,
      expected: "a Jupyter notebook (.ipynb) of format 4, with metadata and a list of cells",
    });
  }
  refuseOtherLanguages(parsed.data, file);
  return parsed.data;
}

function refuseOtherFormats(found: unknown, file: string): void {
  if (typeof found !== "object" || found === null || !("nbformat" in found)) return;
  if (found.nbformat === 4) return;
  throw new NotebookError({
    code: "wrong-format",
    where: file,
    problem: `is a notebook of format ${JSON.stringify(found.nbformat)}`,
    expected: "format 4",
    remedy: "save it again with a present-day notebook program",
  });
}

const SPOKEN = /^(typescript|tslab)$/i;

function refuseOtherLanguages({ metadata }: Ipynb, file: string): void {
  const { kernelspec, language_info } = metadata;
  // A notebook that was never run may name its kernel only.
  const named = language_info?.name ?? kernelspec?.language ?? foreignKernel(kernelspec?.name);
  if (named === undefined || SPOKEN.test(named)) return;
  throw new NotebookError({
    code: "not-typescript",
    where: file,
    problem: `is a ${named} notebook`,
    expected: "a TypeScript notebook",
    remedy: "choose the Stillwell kernel for it",
  });
}

const foreignKernel = (name: string | undefined): string | undefined =>
  /^(python|ir$|julia)/i.exec(name ?? "")?.[0].toLowerCase();

/** Text as one string: a notebook may hold it as a list of lines. */
export const sourceOf = ({ source }: IpynbCell): string =>
  typeof source === "string" ? source : source.join("");

/** A notebook as text, with its texts in lines, so that versions can be compared. */
export const printIpynb = (nb: Ipynb): string => `${JSON.stringify(nb, null, 1)}\n`;

/** Outputs as a notebook file holds them: texts as lists of lines. */
export function storedOutputs(outputs: readonly CellOutput[]): unknown[] {
  return outputs.map((output) => {
    if (output.output_type === "stream") return { ...output, text: lines(output.text) };
    if (output.output_type === "error") return output;
    const data = Object.entries(output.data).map(([mime, x]) => [
      mime,
      typeof x === "string" && isTextual(mime) ? lines(x) : x,
    ]);
    return { ...output, data: Object.fromEntries(data) as unknown };
  });
}

const isTextual = (mime: string): boolean => mime.startsWith("text/") || mime.endsWith("+xml");
const lines = (whole: string): string[] => whole.split(/(?<=\n)/);
