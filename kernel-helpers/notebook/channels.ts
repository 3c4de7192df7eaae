import { randomUUID } from "node:crypto";
import type { Dealer, Subscriber } from "zeromq";
import { address, type Endpoints } from "./endpoints.js";
import { SendQueue } from "./send-queue.js";
import { fromFrames, newHeader, toFrames, type Content, type WireMessage } from "./wire.js";

export type Channel = "shell" | "control" | "iopub";
export type ChannelListener = (channel: Channel, message: WireMessage) => void;

interface Sockets {
  readonly shell: Dealer;
  readonly control: Dealer;
  readonly iopub: Subscriber;
}

/** The client's end of the three sockets of a kernel that it uses. */
export class Channels {
  private readonly session = randomUUID();
  private readonly listeners = new Set<ChannelListener>();
  private readonly queues: { readonly shell: SendQueue; readonly control: SendQueue };

  static async open(endpoints: Endpoints): Promise<Channels> {
    const { Dealer, Subscriber } = await import("zeromq");
    // No limit on what waits: a full queue would drop messages. Nothing outlives a close.
    const options = {
      linger: 0,
      sendHighWaterMark: 0,
      receiveHighWaterMark: 0,
      reconnectInterval: 20,
    };
    return new Channels(endpoints, {
      shell: new Dealer(options),
      control: new Dealer(options),
      iopub: new Subscriber({ linger: 0, receiveHighWaterMark: 0, reconnectInterval: 20 }),
    });
  }

  private constructor(
    private readonly endpoints: Endpoints,
    private readonly sockets: Sockets,
  ) {
    const { shell, control, iopub } = sockets;
    this.queues = { shell: new SendQueue(shell), control: new SendQueue(control) };
    shell.connect(address(endpoints, endpoints.shell_port));
    control.connect(address(endpoints, endpoints.control_port));
    iopub.connect(address(endpoints, endpoints.iopub_port));
    iopub.subscribe();
    void this.receive("shell", shell);
    void this.receive("control", control);
    void this.receive("iopub", iopub);
  }

  listen(listener: ChannelListener): () => void {
    this.listeners.add(listener);
    return () => void this.listeners.delete(listener);
  }

  /** `id` is made by the caller, who must know it before a quick kernel answers. */
  send(to: "shell" | "control", type: string, content: Content, id: string = randomUUID()): void {
    const header = newHeader(type, this.session, id);
    const message = { identities: [], header, parent: null, metadata: {}, content };
    this.queues[to].send(toFrames(message, this.endpoints.key));
  }

  close(): void {
    for (const socket of Object.values(this.sockets) as (Dealer | Subscriber)[]) socket.close();
  }

  private async receive(channel: Channel, socket: Dealer | Subscriber): Promise<void> {
    try {
      for await (const frames of socket) {
        const message = fromFrames(frames, this.endpoints.key);
        if (message) for (const listener of [...this.listeners]) listener(channel, message);
      }
    } catch (error) {
      if (!socket.closed) throw error;
    }
  }
}
