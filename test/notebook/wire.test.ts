import { describe, expect, it } from "vitest";
import { fromFrames, newHeader, toFrames } from "../../kernel-helpers/notebook/wire.js";

const message = {
  identities: [Buffer.from("client-1")],
  header: newHeader("status", "session-1"),
  parent: newHeader("execute_request", "session-1", "request-1"),
  metadata: { line: 3 },
  content: { text: "µ and \u202f" },
};
const buffers = (frames: readonly (Buffer | string)[]): Buffer[] =>
  frames.map((f) => Buffer.from(f));

describe("a message of the protocol", () => {
  it("comes back from its frames", () => {
    const back = fromFrames(buffers(toFrames(message, "key")), "key");
    expect(back).toMatchObject({ ...message, header: { ...message.header } });
    expect(back?.parent?.msg_id).toBe("request-1");
  });
  it("has no parent when its parent header is empty", () => {
    const frames = buffers(toFrames({ ...message, parent: null }, "key"));
    expect(fromFrames(frames, "key")?.parent).toBeNull();
  });
  it("is refused when it was signed with another key or changed on the way", () => {
    const frames = buffers(toFrames(message, "key"));
    expect(fromFrames(frames, "other")).toBeNull();
    expect(fromFrames([...frames.slice(0, -1), Buffer.from("{}")], "key")).toBeNull();
  });
  it("is refused when frames are missing or hold no JSON", () => {
    const frames = buffers(toFrames(message, ""));
    expect(fromFrames(frames, "")).not.toBeNull();
    expect(fromFrames(frames.slice(0, -1), "")).toBeNull();
    expect(fromFrames(frames.slice(1, 2), "")).toBeNull();
    expect(fromFrames([], "")).toBeNull();
    expect(fromFrames([...frames.slice(0, -1), Buffer.from("{")], "")).toBeNull();
  });
});
