import { randomBytes } from "node:crypto";
import {
  closeSync,
  fchmodSync,
  fsyncSync,
  openSync,
  realpathSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from "node:fs";
import { basename, dirname, join } from "node:path";
import { InputError } from "../errors/index.js";

/**
 * Writes a file whole or not at all: into a new file beside it, flushed to disk, then renamed over
 * it. A reader sees the old content or the new, and a failure leaves the old one and no rest behind.
 * A link is followed, and the permissions of a file that is replaced are kept.
 *
 * Throws InputError: `is-a-folder`, `no-folder` (the one to write in does not exist), `cannot-write`.
 */
export function writeFileAtomic(path: string, data: string | Uint8Array): void {
  const target = followed(path);
  const before = statSync(target, { throwIfNoEntry: false });
  if (before?.isDirectory()) {
    throw new InputError({
      code: "is-a-folder",
      where: path,
      problem: "is a folder",
      expected: "the path of a file",
    });
  }
  const folder = dirname(target);
  if (!statSync(folder, { throwIfNoEntry: false })?.isDirectory()) {
    throw new InputError({
      code: "no-folder",
      where: path,
      problem: `there is no folder ${folder}`,
      remedy: "make the folder first",
    });
  }
  const draft = join(folder, `.${basename(target)}.${randomBytes(6).toString("hex")}.tmp`);
  try {
    const file = openSync(draft, "wx");
    try {
      if (before) fchmodSync(file, before.mode & 0o7777);
      writeFileSync(file, data);
      fsyncSync(file);
    } finally {
      closeSync(file);
    }
    renameSync(draft, target);
  } catch (cause) {
    rmSync(draft, { force: true });
    throw new InputError({
      code: "cannot-write",
      where: path,
      problem: `cannot be written (${reason(cause)})`,
      remedy: "check the permissions and the free space of the folder",
      cause,
    });
  }
  flushFolder(folder);
}

const followed = (path: string): string => {
  try {
    return realpathSync(path);
  } catch {
    return path;
  }
};

// The rename itself reaches the disk with its folder; where folders cannot be flushed (Windows) the
// system sees to it.
function flushFolder(folder: string): void {
  try {
    const handle = openSync(folder, "r");
    try {
      fsyncSync(handle);
    } finally {
      closeSync(handle);
    }
  } catch {
    return;
  }
}

const reason = (cause: unknown): string =>
  cause instanceof Error ? ((cause as NodeJS.ErrnoException).code ?? cause.message) : String(cause);
