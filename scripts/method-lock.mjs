/** Id → revision and hash, as committed. */
export const lockOf = (declared) =>
  Object.fromEntries(declared.map(({ id, revision, hash }) => [id, { revision, hash }]));

/**
 * What keeps the sources from matching the lock, one line each. A changed computation under an
 * unchanged revision is the fault that the lock exists for: a record stores revisions, and a replay
 * would blame the record.
 */
export function lockFaults(declared, lock) {
  const ids = new Set(declared.map((d) => d.id));
  const gone = Object.keys(lock)
    .filter((id) => !ids.has(id))
    .map((id) => ({ id, code: "gone", says: `${id} is in the lock but is no longer declared` }));
  return [...gone, ...declared.flatMap((d) => faultOf(d, lock[d.id]))];
}

function faultOf({ id, revision, hash, where }, locked) {
  const fault = (code, says) => [{ id, code, says: `${id} (${where}) ${says}` }];
  if (!locked) return fault("new", "is not in the lock");
  if (revision < locked.revision)
    return fault("lowered", `has revision ${revision}, below the locked ${locked.revision}`);
  if (revision > locked.revision) return fault("raised", `has a new revision, ${revision}`);
  if (hash === locked.hash) return [];
  return fault(
    "changed",
    `computes otherwise than before under the same revision ${revision}: raise the revision and add a line under "Numbers that changed" in CHANGELOG.md`,
  );
}
