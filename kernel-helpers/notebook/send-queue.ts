/** The part of a zeromq socket that is written to. */
export interface Writable {
  send(frames: (Buffer | string)[]): Promise<void>;
  close(): void;
}

/**
 * Sends one after another. A zeromq socket refuses a send while an earlier one is pending, so a
 * send that is not waited for is lost without an error.
 */
export class SendQueue {
  private tail: Promise<void> = Promise.resolve();
  constructor(private readonly socket: Writable) {}

  send(frames: (Buffer | string)[]): void {
    this.tail = this.tail.then(() => this.socket.send(frames)).catch(ignoreClosed);
  }
  /** Settles when everything handed over so far has left. */
  async drained(): Promise<void> {
    let tail;
    while (tail !== this.tail) await (tail = this.tail);
  }
}

// A socket is closed while sends wait only when the other side is gone; nobody is left to tell.
const ignoreClosed = (): void => undefined;
