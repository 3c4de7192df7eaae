import { randomBytes } from "node:crypto";
import { createServer, type Server } from "node:net";
import { join } from "node:path";

/** A Jupyter connection file. */
export interface Endpoints {
  readonly transport: "ipc" | "tcp";
  readonly ip: string;
  readonly key: string;
  readonly signature_scheme: "hmac-sha256";
  readonly shell_port: number;
  readonly iopub_port: number;
  readonly stdin_port: number;
  readonly control_port: number;
  readonly hb_port: number;
}

// A socket's path is cut at 103 bytes on macOS and 107 on Linux; "-5" is still to be added.
const LONGEST_PATH = 100;

/**
 * Where a kernel and its client meet: sockets in the folder, which nobody else can open, or ports
 * on the loopback address where the system has no such sockets.
 */
export async function newEndpoints(
  folder: string,
  wanted: Endpoints["transport"] = "ipc",
): Promise<Endpoints> {
  const base = join(folder, "k");
  const onFiles =
    wanted === "ipc" && process.platform !== "win32" && Buffer.byteLength(base) < LONGEST_PATH;
  const [shell, iopub, stdin, control, hb] = onFiles
    ? ([1, 2, 3, 4, 5] as const)
    : await freePorts();
  return {
    transport: onFiles ? "ipc" : "tcp",
    ip: onFiles ? base : "127.0.0.1",
    key: randomBytes(32).toString("hex"),
    signature_scheme: "hmac-sha256",
    shell_port: shell,
    iopub_port: iopub,
    stdin_port: stdin,
    control_port: control,
    hb_port: hb,
  };
}

/** The address of one of the five sockets; with `ipc` the port ends the file's name. */
export const address = ({ transport, ip }: Endpoints, port: number): string =>
  transport === "ipc" ? `ipc://${ip}-${port}` : `tcp://${ip}:${port}`;

async function freePorts(): Promise<[number, number, number, number, number]> {
  // All are held until all are known, so that no port is given out twice.
  const [a, b, c, d, e] = await Promise.all([hold(), hold(), hold(), hold(), hold()]);
  for (const { server } of [a, b, c, d, e]) server.close();
  return [a.port, b.port, c.port, d.port, e.port];
}

const hold = (): Promise<{ server: Server; port: number }> =>
  new Promise((resolve, reject) => {
    const server = createServer();
    server.once("error", reject);
    server.listen(0, "127.0.0.1", () => {
      const at = server.address();
      resolve({ server, port: at !== null && typeof at === "object" ? at.port : 0 });
    });
  });
