// Refusals to the error stream, and with --json also to the output as data.

import type { Refusal } from "../quantity/index.ts";
import { EXIT } from "./exit.ts";
import { withWords } from "./inputNotes.ts";
import type { Ports } from "./ports.ts";
import { toJson } from "./toJson.ts";
import { refusalWords } from "./words.ts";

/** Tells why nothing was done; the exit status of wrong use. */
export function tell(ports: Ports, refusals: readonly Refusal[], json = false): number {
  if (json) ports.out(toJson({ refusals: refusals.map(withWords) }));
  ports.err(`${refusals.map(refusalWords).join("\n")}\n`);
  return EXIT.wrongUse;
}
