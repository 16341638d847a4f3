// What happens when the output cannot be written: a reader that went away is no trouble, a full disk is.

import { EXIT } from "./exit.ts";

export interface OutputTrouble {
  /** Exit status. */
  readonly status: number;
  /** Said on the error stream; empty for nothing. */
  readonly words: string;
}

/** EPIPE (`| head`) ends quietly with 0; anything else says what the system said and ends with 1. */
export function outputTrouble(error: { readonly code?: string | undefined; readonly message: string }): OutputTrouble {
  if (error.code === "EPIPE") return { status: EXIT.done, words: "" };
  const what = error.code === "ENOSPC" ? "the disk is full" : error.message;
  return { status: EXIT.unsafe, words: `joulewright: the output is not complete: ${what}\n` };
}
