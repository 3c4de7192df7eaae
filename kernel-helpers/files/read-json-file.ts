import { closeSync, fstatSync, openSync, readFileSync } from "node:fs";
import { InputError } from "../errors/index.js";
import { jsonFault } from "./json-fault.js";

export interface ReadOptions {
  /** Largest size that is read, in bytes; 256 MiB unless given. */
  readonly largest?: number;
}

/**
 * The content of a JSON file (UTF-8, with or without a byte-order mark); `where` says what it is
 * for: `"record"`.
 *
 * Throws InputError, naming the path: `file-missing`, `is-a-folder`, `cannot-read`, `file-too-large`,
 * `file-empty`, `not-utf-8`, `file-truncated` and `not-json` (both with line and column).
 */
export function readJsonFile(path: string, where: string, options: ReadOptions = {}): unknown {
  const { largest = 256 * 1024 * 1024 } = options;
  const refuse = (code: string, problem: string, remedy: string, cause?: unknown): InputError =>
    new InputError({ code, where: `${where} (${path})`, problem, remedy, cause });

  const bytes = readBytes(path, largest, refuse);
  let text: string;
  try {
    text = new TextDecoder("utf-8", { fatal: true }).decode(bytes);
  } catch (cause) {
    throw refuse("not-utf-8", "is not UTF-8 text", "save it as UTF-8", cause);
  }
  if (text.trim() === "") throw refuse("file-empty", "is empty", "write it again");
  try {
    return JSON.parse(text) as unknown;
  } catch (cause) {
    const fault = jsonFault(text);
    if (!fault) throw cause;
    const place = `line ${fault.line}, column ${fault.column}`;
    throw fault.isCutOff
      ? refuse("file-truncated", `ends in the middle, at ${place}`, "write it again", cause)
      : refuse("not-json", `is not JSON at ${place}`, "correct it there, or write it again", cause);
  }
}

function readBytes(
  path: string,
  largest: number,
  refuse: (code: string, problem: string, remedy: string, cause?: unknown) => InputError,
): Uint8Array {
  let file: number;
  try {
    file = openSync(path, "r");
  } catch (cause) {
    const reason = (cause as NodeJS.ErrnoException).code ?? String(cause);
    if (reason === "ENOENT" || reason === "ENOTDIR")
      throw refuse("file-missing", "does not exist", "check the path", cause);
    throw refuse("cannot-read", `cannot be read (${reason})`, "check its permissions", cause);
  }
  try {
    const stat = fstatSync(file);
    if (stat.isDirectory()) throw refuse("is-a-folder", "is a folder", "give a file");
    if (stat.size > largest)
      throw refuse("file-too-large", `has ${stat.size} bytes`, `at most ${largest} are read`);
    return readFileSync(file);
  } finally {
    closeSync(file);
  }
}
