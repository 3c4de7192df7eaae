import { StudyError } from "../errors/index.js";
import references from "./references.json" with { type: "json" };

/** One cited work, in CSL-JSON (a subset of its fields). */
export interface Reference {
  readonly id: string;
  readonly type: string;
  readonly title: string;
  readonly author?:
    | readonly { readonly family: string; readonly given?: string }[]
    | readonly { readonly literal: string }[];
  readonly issued?: { readonly "date-parts": readonly (readonly number[])[] };
  readonly "container-title"?: string;
  readonly publisher?: string;
  readonly edition?: string;
  readonly volume?: string;
  readonly issue?: string;
  readonly page?: string;
  readonly number?: string;
  readonly DOI?: string;
  /** "seen" or "from memory": whether the work itself was read, or is quoted by others. */
  readonly note?: string;
}

const byId = new Map((references as readonly Reference[]).map((r) => [r.id, r]));

/** The work that a source cites. */
export function reference(id: string): Reference {
  const found = byId.get(id);
  if (found) return found;
  throw new StudyError({
    code: "unknown-reference",
    where: id,
    problem: "is cited but is not in the bibliography",
    remedy: "add it to references.json",
  });
}
export const allReferences: readonly Reference[] = [...byId.values()];
