import { Publisher, Reply, Router } from "zeromq";
import { address, type Endpoints } from "../endpoints.js";
import { SendQueue } from "../send-queue.js";
import { fromFrames, newHeader, toFrames, type Content, type WireMessage } from "../wire.js";

export type Channel = "shell" | "control";

export interface ServerParts {
  readonly endpoints: Endpoints;
  /** Answers a request; null where it asks for nothing we know. */
  readonly answer: (request: Request) => Promise<Answer | null>;
}
export interface Request {
  readonly type: string;
  readonly content: Content;
  readonly publish: (type: string, content: Content, metadata?: Content) => void;
}
export interface Answer {
  readonly type: string;
  readonly content: Content;
  /** True when the requests to execute that wait behind this one are not to be run. */
  readonly aborts?: boolean;
  /** Called when the answer has left. */
  readonly afterwards?: () => void;
}

// Requests that were sent before a failure was known may still be on their way.
const ON_THEIR_WAY_MS = 30;

/** The kernel's end of the five sockets: takes requests, sends answers, loses nothing. */
export class Server {
  private readonly publisher = new Publisher({ sendHighWaterMark: 0, linger: 1000 });
  private readonly routers = {
    shell: new Router({ sendHighWaterMark: 0, linger: 1000 }),
    control: new Router({ sendHighWaterMark: 0, linger: 1000 }),
  };
  private readonly stdin = new Router({ linger: 0 });
  private readonly heartbeat = new Reply({ linger: 0 });
  private readonly out = {
    iopub: new SendQueue(this.publisher),
    shell: new SendQueue(this.routers.shell),
    control: new SendQueue(this.routers.control),
  };
  private waiting: WireMessage[] = [];
  private isExecuting = false;
  constructor(private readonly parts: ServerParts) {}

  async listen(): Promise<void> {
    const { endpoints } = this.parts;
    const { shell, control } = this.routers;
    await Promise.all([
      this.publisher.bind(address(endpoints, endpoints.iopub_port)),
      shell.bind(address(endpoints, endpoints.shell_port)),
      control.bind(address(endpoints, endpoints.control_port)),
      this.stdin.bind(address(endpoints, endpoints.stdin_port)),
      this.heartbeat.bind(address(endpoints, endpoints.hb_port)),
    ]);
    void this.receive("shell");
    void this.receive("control");
    void this.beat();
  }

  /** Everything that was to be sent has left when this resolves. */
  async close(): Promise<void> {
    await Promise.all(Object.values(this.out).map((queue) => queue.drained()));
    for (const socket of [
      this.publisher,
      ...Object.values(this.routers),
      this.stdin,
      this.heartbeat,
    ])
      socket.close();
  }

  private async receive(channel: Channel): Promise<void> {
    for await (const frames of this.routers[channel]) {
      const request = fromFrames(frames, this.parts.endpoints.key);
      if (!request) continue;
      if (request.header.msg_type === "execute_request") {
        this.waiting.push(request);
        void this.executeWaiting();
      } else void this.handle(channel, request);
    }
  }

  private async beat(): Promise<void> {
    for await (const frames of this.heartbeat) await this.heartbeat.send(frames);
  }

  /** Cells run one after another; other requests are answered in between. */
  private async executeWaiting(): Promise<void> {
    if (this.isExecuting) return;
    this.isExecuting = true;
    for (let next = this.waiting.shift(); next; next = this.waiting.shift())
      await this.handle("shell", next);
    this.isExecuting = false;
  }

  private async handle(channel: Channel, request: WireMessage): Promise<void> {
    const { msg_type: type } = request.header;
    const publish = this.publisherFor(request);
    publish("status", { execution_state: "busy" });
    const answer = await this.answer({ type, content: request.content, publish });
    let aborted: WireMessage[] = [];
    if (answer?.aborts) {
      // A request that is sent after this answer was read is not among them.
      await new Promise((resolve) => setTimeout(resolve, ON_THEIR_WAY_MS));
      aborted = this.waiting.splice(0);
    }
    if (answer) this.reply(channel, request, answer);
    publish("status", { execution_state: "idle" });
    for (const late of aborted) this.abort(late);
    answer?.afterwards?.();
  }

  /** A request that cannot be answered is told so: a client that waits would wait for ever. */
  private async answer(request: Request): Promise<Answer | null> {
    try {
      return await this.parts.answer(request);
    } catch (error) {
      const [ename, evalue] =
        error instanceof Error ? [error.name, error.message] : ["Error", String(error)];
      const content = { status: "error", ename, evalue, traceback: [] };
      return { type: request.type.replace(/_request$/, "_reply"), content };
    }
  }

  private abort(request: WireMessage): void {
    const publish = this.publisherFor(request);
    publish("status", { execution_state: "busy" });
    this.reply("shell", request, { type: "execute_reply", content: { status: "aborted" } });
    publish("status", { execution_state: "idle" });
  }

  private reply(channel: Channel, request: WireMessage, { type, content }: Answer): void {
    this.out[channel].send(this.frames(request, request.identities, type, content, {}));
  }

  private publisherFor(request: WireMessage): Request["publish"] {
    return (type, content, metadata = {}) =>
      this.out.iopub.send(this.frames(request, [Buffer.from(type)], type, content, metadata));
  }

  private frames(
    request: WireMessage,
    identities: readonly Buffer[],
    type: string,
    content: Content,
    metadata: Content,
  ): (Buffer | string)[] {
    const { header: parent } = request;
    const header = newHeader(type, parent.session);
    return toFrames({ identities, header, parent, metadata, content }, this.parts.endpoints.key);
  }
}
