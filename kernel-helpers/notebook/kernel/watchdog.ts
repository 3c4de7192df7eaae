import { Worker } from "node:worker_threads";

// A thread of its own: a cell that computes for ever blocks every timer of the main thread.
const watch = `
const { workerData: { starter, folder } } = require("node:worker_threads");
setInterval(() => {
  if (process.ppid === starter) return;
  if (folder) {
    require("node:fs").rmSync(folder, { recursive: true, force: true });
    try { process.kill(-process.pid, "SIGKILL"); } catch {}
  }
  process.kill(process.pid, "SIGKILL");
}, 1000);
`;

/**
 * Ends this kernel when the process that started it is gone. `folder`, given when the starter was
 * our client, is removed, and the process group with all that the cells started ends too.
 */
export function endWithStarter(folder: string | null): void {
  const worker = new Worker(watch, { eval: true, workerData: { starter: process.ppid, folder } });
  worker.unref();
}
