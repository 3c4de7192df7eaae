import { mkdirSync, writeFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { RenderError } from "../../errors/index.js";

const block = 512;

/**
 * Writes the files and folders of a plain ustar archive under a folder. Links and names that lead out
 * of the folder are refused, since nothing that is unpacked here needs them.
 */
export function untar(archive: Buffer, folder: string): void {
  let at = 0;
  while (at + block <= archive.length) {
    const field = (from: number, length: number): string => {
      const text = archive.toString("latin1", at + from, at + from + length);
      const end = text.indexOf("\0");
      return end < 0 ? text : text.slice(0, end);
    };
    const prefix = field(345, 155);
    const name = prefix ? `${prefix}/${field(0, 100)}` : field(0, 100);
    if (name === "") return;
    const size = parseInt(field(124, 12).trim() || "0", 8);
    const type = field(156, 1) || "0";
    const body = at + block;
    if (!Number.isInteger(size) || body + size > archive.length)
      throw badArchive(name, "is cut short");
    if (name.startsWith("/") || name.includes("\\") || name.split("/").includes(".."))
      throw badArchive(name, "leads out of the folder");
    const to = join(folder, name);
    if (type === "5") mkdirSync(to, { recursive: true });
    else if (type === "0") {
      mkdirSync(dirname(to), { recursive: true });
      writeFileSync(to, archive.subarray(body, body + size));
    } else throw badArchive(name, `is of type "${type}", neither a file nor a folder`);
    at = body + Math.ceil(size / block) * block;
  }
}

const badArchive = (name: string, problem: string): RenderError =>
  new RenderError({ code: "bad-archive", where: `archive entry "${name}"`, problem });
