// What is said when the fault is ours: the stack, and how to report it.

import { visibleLines } from "../order/index.ts";

/** Text for the error stream; `argv` is repeated so that a report has it. */
export function bugText(error: unknown, argv: readonly string[], version: string): string {
  const stack = error instanceof Error ? (error.stack ?? error.message) : String(error);
  const line = argv.map((word) => (/^[\w./=-]+$/.test(word) ? word : JSON.stringify(word))).join(" ");
  return visibleLines(
    `joulewright ${version}: this is a bug of ours, not a fault of your input.\n${stack}\n\nPlease report it with the lines above, the command line\n  joulewright ${line}\nand, if you can share them, the files it names. Nothing was half-written.\n`,
  );
}
