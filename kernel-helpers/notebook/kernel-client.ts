import { randomUUID } from "node:crypto";
import { NotebookError } from "../errors/index.js";
import { CellOutputs, errorIn, type CellOutput, type Displays } from "./cell-outputs.js";
import { Channels } from "./channels.js";
import { KernelProcess, type KernelProcessParts } from "./kernel-process.js";
import type { Content, WireMessage } from "./wire.js";

export interface KernelStartParts extends KernelProcessParts {
  readonly startTimeoutMs: number;
}

export interface ExecuteParts {
  /** After this the cell is interrupted, and after the grace the kernel is killed; null: no limit. */
  readonly timeoutMs: number | null;
  readonly graceMs?: number;
  readonly signal?: AbortSignal;
}

/** The error that ended a cell; `line` is 1-based in the cell's source, where it is known. */
export interface CellError {
  readonly ename: string;
  readonly evalue: string;
  readonly traceback: readonly string[];
  readonly line: number | null;
}

export interface CellResult {
  readonly status: "ok" | "failed" | "timeout" | "interrupted" | "died" | "aborted";
  readonly executionCount: number | null;
  readonly outputs: CellOutput[];
  readonly error: CellError | null;
  readonly ms: number;
}

const GRACE_MS = 2000;
const STOP_MS = 1500;

/** Starts a kernel, runs code in it and ends it; speaks the Jupyter protocol over zeromq. */
export class KernelClient {
  private readonly displays: Displays = new Map();
  private stopping: Promise<void> | null = null;

  /** Resolves when the kernel answers; whatever was started is gone again if it does not. */
  static async start(parts: KernelStartParts): Promise<KernelClient> {
    const kernel = await KernelProcess.start(parts);
    let channels: Channels | null = null;
    try {
      channels = await Channels.open(kernel.endpoints);
      const client = new KernelClient(kernel, channels);
      await client.waitForAnswer(parts.startTimeoutMs);
      return client;
    } catch (error) {
      channels?.close();
      kernel.destroy();
      throw error;
    }
  }

  private constructor(
    private readonly kernel: KernelProcess,
    private readonly channels: Channels,
  ) {}

  get pid(): number | undefined {
    return this.kernel.pid;
  }
  /** Where its sockets lie; removed by `stop`. */
  get folder(): string {
    return this.kernel.folder;
  }
  /** What the kernel wrote last outside the protocol, such as why it broke off. */
  get lastWords(): string {
    return this.kernel.lastWords;
  }
  /** How the kernel ended, or null while it runs. */
  get ended(): string | null {
    return this.kernel.ended;
  }

  execute(code: string, parts: ExecuteParts): Promise<CellResult> {
    const began = performance.now();
    const outputs = new CellOutputs(this.displays);
    const content = {
      code,
      silent: false,
      store_history: true,
      user_expressions: {},
      allow_stdin: false,
      stop_on_error: true,
    };
    return new Promise((resolve) => {
      // The id exists before the request leaves: a quick kernel answers before a send resolves.
      const id = randomUUID();
      let reply: Content | null = null;
      let error: CellError | null = null;
      let isIdle = false;
      let cut: "timeout" | "interrupted" | null = null;
      const timers: NodeJS.Timeout[] = [];
      const finish = (status: CellResult["status"]): void => {
        stopListening();
        stopWatching();
        parts.signal?.removeEventListener("abort", abort);
        timers.forEach(clearTimeout);
        const count = reply?.["execution_count"];
        resolve({
          status: cut ?? status,
          executionCount: typeof count === "number" ? count : null,
          outputs: outputs.list,
          error,
          ms: performance.now() - began,
        });
      };
      const cutOff = (why: "timeout" | "interrupted"): void => {
        if (cut) return;
        cut = why;
        this.interrupt();
        timers.push(setTimeout(() => this.kernel.kill(), parts.graceMs ?? GRACE_MS));
      };
      const abort = (): void => cutOff("interrupted");
      const stopListening = this.channels.listen((channel, message) => {
        if (message.parent?.msg_id !== id) return;
        const { msg_type } = message.header;
        if (channel === "iopub") {
          outputs.take(message);
          if (msg_type === "error") error = { ...errorIn(message.content), line: lineIn(message) };
          if (msg_type === "status" && message.content["execution_state"] === "idle") isIdle = true;
        } else if (msg_type === "execute_reply") reply = message.content;
        if (isIdle && reply) finish(statusOf(reply));
      });
      const stopWatching = this.kernel.onEnd(() => finish("died"));
      if (this.kernel.ended !== null) {
        finish("died");
        return;
      }
      if (parts.signal?.aborted) {
        finish("interrupted");
        return;
      }
      parts.signal?.addEventListener("abort", abort);
      if (parts.timeoutMs !== null)
        timers.push(setTimeout(() => cutOff("timeout"), parts.timeoutMs));
      this.channels.send("shell", "execute_request", content, id);
    });
  }

  /** Asks the kernel for something that is answered at once: `complete`, `inspect`, `kernel_info`. */
  request(what: string, content: Content, timeoutMs: number): Promise<Content> {
    return new Promise((resolve, reject) => {
      const id = randomUUID();
      const end = (): void => {
        stopListening();
        stopWatching();
        clearTimeout(timer);
      };
      const refuse = (problem: string): void => {
        end();
        reject(new NotebookError({ code: "no-answer", where: what, problem }));
      };
      const timer = setTimeout(
        () => refuse(`the kernel did not answer within ${timeoutMs} ms`),
        timeoutMs,
      );
      const stopWatching = this.kernel.onEnd(() => refuse(`the kernel ${this.kernel.ended ?? ""}`));
      const stopListening = this.channels.listen((channel, message) => {
        if (channel === "iopub" || message.parent?.msg_id !== id) return;
        end();
        resolve(message.content);
      });
      if (this.kernel.ended !== null) refuse(`the kernel ${this.kernel.ended}`);
      else this.channels.send("shell", `${what}_request`, content, id);
    });
  }

  interrupt(): void {
    // Windows has no signal that a process can catch.
    if (process.platform === "win32") this.channels.send("control", "interrupt_request", {});
    else this.kernel.interrupt();
  }

  /** Asks the kernel to end, ends it if it does not, and removes its folder. */
  stop(): Promise<void> {
    return (this.stopping ??= this.end());
  }

  private async end(): Promise<void> {
    if (this.kernel.ended === null) {
      this.channels.send("control", "shutdown_request", { restart: false });
      await new Promise<void>((resolve) => {
        const timer = setTimeout(() => this.kernel.kill(), STOP_MS);
        this.kernel.onEnd(() => {
          clearTimeout(timer);
          resolve();
        });
      });
    }
    this.channels.close();
    this.kernel.destroy();
  }

  private async waitForAnswer(limitMs: number): Promise<void> {
    let hasReplied = false;
    let hasPublished = false;
    await new Promise<void>((resolve, reject) => {
      // A subscriber can join late, so the question is repeated until both channels are heard.
      const ask = (): void => this.channels.send("shell", "kernel_info_request", {});
      const again = setInterval(() => hasReplied && ask(), 50);
      const end = (): void => {
        stopListening();
        stopWatching();
        clearInterval(again);
        clearTimeout(timer);
      };
      const refuse = (problem: string): void => {
        end();
        reject(
          new NotebookError({
            code: "kernel-did-not-start",
            where: "kernel",
            problem: `${problem}${this.kernel.lastWords ? `: ${this.kernel.lastWords.trim()}` : ""}`,
          }),
        );
      };
      const timer = setTimeout(() => refuse(`did not answer within ${limitMs} ms`), limitMs);
      const stopWatching = this.kernel.onEnd(() => refuse(this.kernel.ended ?? "ended"));
      const stopListening = this.channels.listen((channel, { header }) => {
        if (channel === "shell" && header.msg_type === "kernel_info_reply") hasReplied = true;
        if (channel === "iopub" && header.msg_type === "status") hasPublished = true;
        if (!hasReplied || !hasPublished) return;
        end();
        resolve();
      });
      if (this.kernel.ended !== null) refuse(this.kernel.ended);
      else ask();
    });
  }
}

const statusOf = (reply: Content): CellResult["status"] =>
  reply["status"] === "ok" ? "ok" : reply["status"] === "error" ? "failed" : "aborted";

function lineIn({ metadata }: WireMessage): number | null {
  const line = metadata["line"];
  return typeof line === "number" ? line : null;
}
