import { expect, it } from "vitest";
import { SendQueue } from "../../kernel-helpers/notebook/send-queue.js";

/** Refuses a send while one is pending, as a zeromq socket does. */
function oneAtATime() {
  const sent: string[] = [];
  let isBusy = false;
  return {
    sent,
    async send(frames: (Buffer | string)[]): Promise<void> {
      if (isBusy) throw new Error("EBUSY");
      isBusy = true;
      await new Promise(setImmediate);
      isBusy = false;
      sent.push(String(frames[0]));
    },
    close: () => undefined,
  };
}

it("everything handed over is sent, in order, before the queue has drained", async () => {
  const socket = oneAtATime();
  const queue = new SendQueue(socket);
  const all = Array.from({ length: 50 }, (_, i) => `m${i}`);
  for (const m of all) queue.send([m]);
  await queue.drained();
  expect(socket.sent).toEqual(all);
});

it("a send that fails does not stop those behind it", async () => {
  const sent: string[] = [];
  const queue = new SendQueue({
    send: ([frame]) => {
      if (frame === "bad") return Promise.reject(new Error("closed"));
      sent.push(String(frame));
      return Promise.resolve();
    },
    close: () => undefined,
  });
  for (const m of ["a", "bad", "b"]) queue.send([m]);
  await queue.drained();
  expect(sent).toEqual(["a", "b"]);
});
