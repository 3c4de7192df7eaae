const signals = ["SIGINT", "SIGTERM", "SIGHUP"] as const;
const duties = new Set<() => void>();

/**
 * Does the work when this process ends, however it ends short of SIGKILL, unless it was let off
 * before. The work must be synchronous. Returns the function that lets it off.
 */
export function atEveryEnd(work: () => void): () => void {
  if (duties.size === 0) {
    process.on("exit", doAll);
    for (const signal of signals) process.on(signal, onSignal);
  }
  duties.add(work);
  return () => {
    if (!duties.delete(work) || duties.size > 0) return;
    process.off("exit", doAll);
    for (const signal of signals) process.off(signal, onSignal);
  };
}

function doAll(): void {
  for (const work of duties) work();
  duties.clear();
}

function onSignal(signal: NodeJS.Signals): void {
  // Another listener decides what the signal means; if it ends the process, "exit" follows.
  if (process.listenerCount(signal) > 1) return;
  doAll();
  process.off(signal, onSignal);
  process.kill(process.pid, signal);
}
