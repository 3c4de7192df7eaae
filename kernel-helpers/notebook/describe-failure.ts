import type { FailedCell, RunOutcome } from "./run-outcome.js";

/** What a terminal shows of a run that did not come to its end; empty for one that did. */
export function describeFailure(outcome: RunOutcome): string {
  const { failedCell: cell, file, codeCells, status } = outcome;
  if (status === "ok") return "";
  if (!cell) return `${file}: ${sayStatus[status]} before the first cell ran.`;
  const head = `${file}: cell ${cell.index} of ${codeCells} ${sayStatus[status]}`;
  return [`${head}${cell.line === null ? "" : `, at line ${cell.line}`}.`, "", ...sourceLines(cell)]
    .concat("", ...messageLines(cell, status))
    .join("\n");
}

const sayStatus = {
  failed: "failed",
  timeout: "ran too long",
  died: "ended the kernel",
  interrupted: "was interrupted",
};

/** The source with line numbers; the line that failed is marked. */
function sourceLines({ source, line }: FailedCell): string[] {
  const lines = source.trimEnd().split("\n");
  const width = String(lines.length).length;
  return lines.map((text, i) => {
    const mark = i + 1 === line ? ">" : " ";
    return `${mark} ${String(i + 1).padStart(width)} | ${text}`.trimEnd();
  });
}

/** The message once; of what follows it in the traceback only what the source above does not show. */
function messageLines(cell: FailedCell, status: RunOutcome["status"]): string[] {
  if (status !== "failed") return [cell.evalue];
  const [, ...rest] = cell.traceback.flatMap((block) => block.split("\n").slice(0, 1));
  return [`${cell.ename}: ${cell.evalue}`, ...rest.filter((text) => !/^line \d+:$/.test(text))];
}
