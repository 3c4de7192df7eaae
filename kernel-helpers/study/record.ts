import { createHash } from "node:crypto";
import canonicalize from "canonicalize";
import type { DisplaySystem } from "../units/index.js";
import type { Reference } from "../method/index.js";
import type { Declaration } from "./declared.js";
import type { Item } from "./item.js";

/** What a study is about, and who answers for it (by role). */
export interface StudyFacts {
  readonly id: string;
  readonly title: string;
  /** Number of the package, as the organisation numbers its documents. */
  readonly number: string;
  readonly revision: string;
  readonly purpose: string;
  /** The decision that it supports. */
  readonly decision: string;
  readonly prepared: string;
  readonly checked: string | null;
  readonly approved: string | null;
  readonly display: DisplaySystem;
  /** A sentence shown on the cover, for invented or training data. */
  readonly disclaimer: string | null;
}
export interface SectionFacts {
  readonly id: string;
  readonly title: string;
  readonly about: string | null;
  readonly within: string | null;
}

/** What is hashed and signed: nothing in it depends on when, where or how fast it ran. */
export interface Body {
  readonly study: StudyFacts;
  readonly sections: readonly SectionFacts[];
  readonly items: readonly Item[];
  readonly declared: readonly Declaration[];
  readonly references: readonly Reference[];
}
/** How it was run; beside the body, so that re-running an unchanged study voids nothing. */
export interface Run {
  readonly at: string;
  /** True for a headless run from the first cell to the last; anything else is a draft. */
  readonly clean: boolean;
  readonly stale: readonly string[];
  readonly versions: { readonly [name: string]: string };
  readonly notebook: { readonly name: string; readonly sha256: string } | null;
}
export interface StudyRecord {
  readonly schema: 1;
  readonly body: Body;
  readonly hash: string;
  readonly run: Run;
}

/** SHA-256 of the canonical JSON (RFC 8785) of a body. */
export function bodyHash(body: Body): string {
  const text = canonicalize(body);
  if (text === undefined) throw new Error("a record body is always an object");
  return createHash("sha256").update(text).digest("hex");
}
