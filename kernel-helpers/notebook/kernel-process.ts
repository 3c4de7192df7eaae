import { spawn, type ChildProcess } from "node:child_process";
import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { atEveryEnd } from "./clean-up.js";
import { newEndpoints, type Endpoints } from "./endpoints.js";

export interface KernelProcessParts {
  /** What starts the kernel; `{connection_file}` stands for the path of the connection file. */
  readonly argv: readonly string[];
  /** The folder that the cells run in. */
  readonly cwd: string;
  /** Variables added to this process's own, given the kernel's temporary folder. */
  readonly env?: (folder: string) => NodeJS.ProcessEnv;
  /** Sockets in the folder (`ipc`, where the system has them) or on the loopback address. */
  readonly transport?: Endpoints["transport"];
}

const ON_WINDOWS = process.platform === "win32";
const TAIL = 4000;

/** A kernel with the folder its sockets lie in. Both are gone at every end of this process. */
export class KernelProcess {
  /** Why the kernel is no longer there, or null while it is. */
  ended: string | null = null;
  /** The last it wrote outside the protocol: why it could not start. */
  lastWords = "";
  private readonly listeners = new Set<() => void>();
  private readonly letOff: () => void;

  static async start(parts: KernelProcessParts): Promise<KernelProcess> {
    // mkdtemp gives mode 0700: nobody else can open the sockets.
    const folder = mkdtempSync(join(tmpdir(), "stillwell-"));
    try {
      const endpoints = await newEndpoints(folder, parts.transport);
      const file = join(folder, "connection.json");
      writeFileSync(file, JSON.stringify(endpoints), { mode: 0o600 });
      const [command = "", ...args] = parts.argv.map((a) => a.replace("{connection_file}", file));
      // A process group of its own: a Ctrl-C meant for us does not reach it, and whatever the cells
      // started ends with it.
      const child = spawn(command, args, {
        cwd: parts.cwd,
        env: { ...process.env, STILLWELL_KERNEL_FOLDER: folder, ...parts.env?.(folder) },
        stdio: ["ignore", "pipe", "pipe"],
        detached: !ON_WINDOWS,
        windowsHide: true,
      });
      return new KernelProcess(child, folder, endpoints);
    } catch (error) {
      rmSync(folder, { recursive: true, force: true });
      throw error;
    }
  }

  private constructor(
    private readonly child: ChildProcess,
    readonly folder: string,
    readonly endpoints: Endpoints,
  ) {
    this.letOff = atEveryEnd(() => this.destroy());
    const hear = (bytes: Buffer): void => {
      this.lastWords = (this.lastWords + bytes.toString()).slice(-TAIL);
    };
    child.stdout?.on("data", hear);
    child.stderr?.on("data", hear);
    child.on("error", (error) => this.end(error.message));
    child.on("exit", (code, signal) =>
      this.end(signal ? `was ended by ${signal}` : `ended with exit code ${code ?? "unknown"}`),
    );
  }

  get pid(): number | undefined {
    return this.child.pid;
  }

  /** Calls back once when the kernel ends; returns the function that takes it back. */
  onEnd(listener: () => void): () => void {
    this.listeners.add(listener);
    return () => void this.listeners.delete(listener);
  }

  interrupt(): void {
    this.child.kill("SIGINT");
  }

  /** Ends the kernel and everything its cells started. */
  kill(): void {
    this.child.kill("SIGKILL");
    if (ON_WINDOWS || this.child.pid === undefined) return;
    try {
      process.kill(-this.child.pid, "SIGKILL");
    } catch {
      // The group is empty already.
    }
  }

  /** Ends it and removes its folder, at once. */
  destroy(): void {
    this.letOff();
    this.kill();
    this.child.stdout?.destroy();
    this.child.stderr?.destroy();
    rmSync(this.folder, { recursive: true, force: true, maxRetries: 3 });
  }

  private end(why: string): void {
    if (this.ended !== null) return;
    this.ended = why;
    for (const listener of [...this.listeners]) listener();
  }
}
