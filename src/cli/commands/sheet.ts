// `sheet`: how one bank is wired, proven and used, on paper.

import { visible } from "../../order/index.ts";
import { refused } from "../../quantity/index.ts";
import { SHEET_FORMATS, sheetOf, sheetText } from "../../sheet/index.ts";
import { chosenFormat } from "../chosenFormat.ts";
import { EXIT } from "../exit.ts";
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
  if (!format.ok || !output.ok || !read.ok)
    return tell(
      ports,
      [format, output, read].flatMap((one) => (one.ok ? [] : one.refusals)),
      flags.json,
    );
  const { input, choices, lost, failed } = read.value;
  const sheet = sheetOf(input);
  const text = format.value === "json" ? toJson(sheet) : sheetText(sheet, format.value, choices.paper);
  const said = [...lost, ...(failed ? ["Checks FAIL: the sheet says which. Do not build this bank."] : [])];
  if (said.length > 0) ports.err(`${said.join("\n")}\n`);
  if (output.value === null) ports.out(text);
  else {
    const written = ports.files.write(output.value, text, flags.force === true);
    if (!written.ok) return tell(ports, written.refusals, flags.json);
    ports.err(`${visible(output.value)}: ${sheet.sections.length} sections written\n`);
  }
  return failed ? EXIT.unsafe : EXIT.done;
}

/** The file to write; null for the output. */
function outputOf(output: string | undefined) {
  if (output === undefined || output === "-") return { ok: true as const, value: null };
  if (output.trim() !== "") return { ok: true as const, value: output };
  const want = "the name of a file; - for the output";
  return refused({ code: "empty", place: { field: "--output" }, read: JSON.stringify(output), want });
}
