import { StillwellError } from "../kernel-helpers/errors/index.js";

/** The code of the error that an act throws, so that a test need not read prose. */
export function codeOf(act: () => unknown): string {
  try {
    act();
  } catch (error) {
    if (error instanceof StillwellError) return error.code;
    throw error;
  }
  return "no error";
}
