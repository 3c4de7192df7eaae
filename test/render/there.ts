/** A value that a test relies on; fails where it is missing rather than further on. */
export function there<T>(value: T | undefined | null): T {
  if (value === undefined || value === null)
    throw new Error("a value that the test needs is missing");
  return value;
}
