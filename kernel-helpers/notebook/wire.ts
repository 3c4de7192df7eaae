import { createHmac, randomUUID, timingSafeEqual } from "node:crypto";

/** A JSON object whose fields are not known until they are read. */
export interface Content {
  readonly [name: string]: unknown;
}
export interface Header {
  readonly msg_id: string;
  readonly msg_type: string;
  readonly session: string;
}
/** One message of the Jupyter protocol 5.3, as both the kernel and the client see it. */
export interface WireMessage {
  /** Routing frames before the delimiter; a reply carries those of its request. */
  readonly identities: readonly Buffer[];
  readonly header: Header;
  /** Header of the request that this message answers. */
  readonly parent: Header | null;
  readonly metadata: Content;
  readonly content: Content;
}

const DELIMITER = Buffer.from("<IDS|MSG>");

export const protocolVersion = "5.3";

export const newHeader = (
  msg_type: string,
  session: string,
  msg_id: string = randomUUID(),
): Header => ({
  msg_id,
  msg_type,
  session,
});

/** Frames of a message: identities, delimiter, signature, header, parent, metadata, content. */
export function toFrames(message: WireMessage, key: string): (Buffer | string)[] {
  const header = {
    ...message.header,
    username: "stillwell",
    date: new Date().toISOString(),
    version: protocolVersion,
  };
  const parts = [header, message.parent ?? {}, message.metadata, message.content].map((part) =>
    JSON.stringify(part),
  );
  return [...message.identities, DELIMITER, sign(parts, key), ...parts];
}

/** The message in the frames, or null when they are not one or its signature is another's. */
export function fromFrames(frames: readonly Buffer[], key: string): WireMessage | null {
  const at = frames.findIndex((frame) => frame.equals(DELIMITER));
  const signature = frames[at + 1];
  const parts = frames.slice(at + 2, at + 6);
  if (at < 0 || !signature || parts.length < 4) return null;
  const expected = Buffer.from(sign(parts, key));
  if (signature.length !== expected.length || !timingSafeEqual(signature, expected)) return null;
  const [header, parent, metadata, content] = parts.map(toObject);
  if (!header || !isHeader(header) || !parent || !metadata || !content) return null;
  return {
    identities: frames.slice(0, at),
    header,
    parent: isHeader(parent) ? parent : null,
    metadata,
    content,
  };
}

function sign(parts: readonly (Buffer | string)[], key: string): string {
  if (key === "") return "";
  const hmac = createHmac("sha256", key);
  for (const part of parts) hmac.update(part);
  return hmac.digest("hex");
}

const isHeader = (x: Content): x is Content & Header =>
  typeof x["msg_id"] === "string" &&
  typeof x["msg_type"] === "string" &&
  typeof x["session"] === "string";

function toObject(frame: Buffer): Content | null {
  try {
    const x: unknown = JSON.parse(frame.toString());
    return typeof x === "object" && x !== null ? (x as Content) : null;
  } catch {
    return null;
  }
}
