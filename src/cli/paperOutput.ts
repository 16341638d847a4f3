// Where a paper goes: to the output, or whole to a file, with what was lost and what fails told beside it.

import { visible } from "../order/index.ts";
import { accepted, type Read, refused } from "../quantity/index.ts";
import { EXIT } from "./exit.ts";
import type { Ports } from "./ports.ts";
import type { SheetFlags } from "./sheetFlags.ts";
import type { ReadSheet } from "./sheetInput.ts";
import { tell } from "./tell.ts";

/** The file to write; null for the output. Refused: a blank name. */
export function outputOf(output: string | undefined): Read<string | null> {
  if (output === undefined || output === "-") return accepted(null);
  if (output.trim() !== "") return accepted(output);
  const want = "the name of a file; - for the output";
  return refused({ code: "empty", place: { field: "--output" }, read: JSON.stringify(output), want });
}

/** Said of a bank that fails by a sheet that tells how. */
const FAILING = "Checks FAIL: the sheet says which. Do not build this bank.";

/** Writes a paper; the exit status. `what` says what was written: "20 sections". */
export function writePaper(
  paper: { readonly text: string; readonly what: string; readonly output: string | null; readonly failing?: string },
  { lost, failed }: Pick<ReadSheet, "lost" | "failed">,
  flags: SheetFlags,
  ports: Ports,
): number {
  const { text, what, output, failing = FAILING } = paper;
  const said = [...lost, ...(failed ? [failing] : [])];
  if (said.length > 0) ports.err(`${said.join("\n")}\n`);
  if (output === null) ports.out(text);
  else {
    const written = ports.files.write(output, text, flags.force === true);
    if (!written.ok) return tell(ports, written.refusals, flags.json);
    ports.err(`${visible(output)}: ${what} written\n`);
  }
  return failed ? EXIT.unsafe : EXIT.done;
}
