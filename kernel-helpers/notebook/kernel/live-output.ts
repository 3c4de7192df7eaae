import type { Content } from "../wire.js";

export type Publish = (type: string, content: Content, metadata?: Content) => void;

const JOIN_MS = 20;
const JOIN_LENGTH = 65_536;

/**
 * What a cell puts out while it runs. Neighbouring writes to one stream leave as one message; any
 * other message first lets what was written before it go.
 */
export class LiveOutput {
  private held: { name: string; text: string } | null = null;
  private timer: NodeJS.Timeout | null = null;
  private to: Publish | null = null;

  /** From now on output belongs to this cell, also what earlier cells still put out. */
  belongTo(publish: Publish): void {
    this.flush();
    this.to = publish;
  }

  write(name: "stdout" | "stderr", text: string): void {
    if (text === "") return;
    if (this.held?.name !== name) this.flush();
    if (this.held) this.held.text += text;
    else this.held = { name, text };
    if (this.held.text.length >= JOIN_LENGTH) this.flush();
    else this.timer ??= setTimeout(() => this.flush(), JOIN_MS);
  }

  publish(type: string, content: Content, metadata?: Content): void {
    this.flush();
    this.to?.(type, content, metadata);
  }

  flush(): void {
    if (this.timer) clearTimeout(this.timer);
    this.timer = null;
    const held = this.held;
    this.held = null;
    if (held) this.to?.("stream", held);
  }

  /** Takes over what the process writes to its standard streams. */
  takeOver(): void {
    for (const name of ["stdout", "stderr"] as const) {
      const decoder = new TextDecoder();
      const write = (
        chunk: string | Uint8Array,
        encoding?: BufferEncoding | (() => void),
        done?: () => void,
      ): boolean => {
        this.write(
          name,
          typeof chunk === "string" ? chunk : decoder.decode(chunk, { stream: true }),
        );
        const told = typeof encoding === "function" ? encoding : done;
        if (told) queueMicrotask(told);
        return true;
      };
      process[name].write = write;
    }
  }
}
