// `labels`: what is stuck on the units, stages, strings and spares of one bank.

import { labelsOf, labelsToHtml } from "../../sheet/index.ts";
import { chosenFormat } from "../chosenFormat.ts";
import { outputOf, writePaper } from "../paperOutput.ts";
import type { Ports } from "../ports.ts";
import type { SheetFlags } from "../sheetFlags.ts";
import { sheetInput } from "../sheetInput.ts";
import { tell } from "../tell.ts";
import { toJson } from "../toJson.ts";

/** To the output, or whole to a file; the exit status. */
export function labelsCommand(brief: string | undefined, flags: SheetFlags, ports: Ports): number {
  const format = chosenFormat(flags, ["html", "json"] as const, "html");
  const output = outputOf(flags.output);
  const read = sheetInput(brief, flags, ports, false);
  if (!format.ok || !output.ok || !read.ok) {
    const refusals = [format, output, read].flatMap((one) => (one.ok ? [] : one.refusals));
    return tell(ports, refusals, flags.json);
  }
  const labels = labelsOf(read.value.input);
  const text = format.value === "json" ? toJson(labels) : labelsToHtml(labels, read.value.choices.paper);
  const failing = "Checks FAIL: the check command says which. Do not build this bank.";
  return writePaper(
    { text, what: `${labels.labels.length} labels`, output: output.value, failing },
    read.value,
    flags,
    ports,
  );
}
