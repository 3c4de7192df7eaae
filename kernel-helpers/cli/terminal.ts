/** Where a command writes: results on one stream, progress on another. */
export interface Terminal {
  readonly out: (line: string) => void;
  readonly err: (line: string) => void;
  /** One line of progress: rewritten in place on a terminal, a line each elsewhere. */
  readonly progress: (line: string) => void;
  /** Ends a rewritten line. */
  readonly settle: () => void;
}

export function processTerminal(): Terminal {
  const live = process.stderr.isTTY;
  let width = 0;
  const settle = (): void => {
    if (width > 0) process.stderr.write("\n");
    width = 0;
  };
  return {
    out: (line) => {
      settle();
      process.stdout.write(`${line}\n`);
    },
    err: (line) => {
      settle();
      process.stderr.write(`${line}\n`);
    },
    progress: (line) => {
      if (!live) {
        process.stderr.write(`${line}\n`);
        return;
      }
      const text = line.slice(0, Math.max(process.stderr.columns - 1, 20));
      process.stderr.write(`\r${text.padEnd(width)}`);
      width = text.length;
    },
    settle,
  };
}
