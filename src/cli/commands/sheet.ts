// `sheet`: how one bank is wired, proven and used, on paper.

import { SHEET_FORMATS, sheetOf, sheetText } from "../../sheet/index.ts";
import { chosenFormat } from "../chosenFormat.ts";
import { outputOf, writePaper } from "../paperOutput.ts";
import type { Ports } from "../ports.ts";
import type { SheetFlags } from "../sheetFlags.ts";
import { sheetInput } from "../sheetInput.ts";
import { tell } from "../tell.ts";
import { toJson } from "../toJson.ts";

/** To the output, or whole to a file; the exit status. */
export function sheetCommand(brief: string | undefined, flags: SheetFlags, ports: Ports): number {
  const format = chosenFormat(flags, [...SHEET_FORMATS, "json"] as const, "html");
  const output = outputOf(flags.output);
  const read = sheetInput(brief, flags, ports);
  if (!format.ok || !output.ok || !read.ok) {
    const refusals = [format, output, read].flatMap((one) => (one.ok ? [] : one.refusals));
    return tell(ports, refusals, flags.json);
  }
  const sheet = sheetOf(read.value.input);
  const text = format.value === "json" ? toJson(sheet) : sheetText(sheet, format.value, read.value.choices.paper);
  return writePaper(
    { text, what: `${sheet.sections.length} sections`, output: output.value },
    read.value,
    flags,
    ports,
  );
}
