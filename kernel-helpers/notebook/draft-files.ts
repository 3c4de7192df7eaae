import { join } from "node:path";

const SUFFIX = ".draft.json";

/** The file of a study's draft; an id may hold letters that a file name cannot. */
export const draftFile = (id: string): string => encodeURIComponent(id) + SUFFIX;

/** The study whose draft a file is, or null for another file. */
export const draftId = (file: string): string | null =>
  file.endsWith(SUFFIX) ? decodeURIComponent(file.slice(0, -SUFFIX.length)) : null;

/** Where a headless run keeps its drafts: beside the kernel's sockets, and gone with them. */
export const draftsFolder = (kernelFolder: string): string => join(kernelFolder, "drafts");
