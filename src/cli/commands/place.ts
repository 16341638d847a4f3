// `place`: measured units into positions, as text, as data, or as a list to wire from.

import { visible } from "../../order/index.ts";
import type { Refusal } from "../../quantity/index.ts";
import { endingOf, strangeEnding } from "../chosenFormat.ts";
import { EXIT } from "../exit.ts";
import { faultLines } from "../inputNotes.ts";
import { placeCsv } from "../placeCsv.ts";
import { type Placed, placedBank } from "../placed.ts";
import type { PlaceFlags } from "../placeFlags.ts";
import { placeJson } from "../placeJson.ts";
import { placeText } from "../placeText.ts";
import type { Ports } from "../ports.ts";
import { tell } from "../tell.ts";
import { refusalWords } from "../words.ts";

const FORMATS = ["text", "csv", "json"] as const;
type Format = (typeof FORMATS)[number];

export function placeCommand(brief: string | undefined, flags: PlaceFlags, ports: Ports): number {
  const format = readFormat(flags);
  const placed = placedBank(brief, flags, ports);
  if (!placed.ok || typeof format !== "string") {
    const faults = [...(typeof format === "string" ? [] : [format]), ...(placed.ok ? [] : placed.refusals)];
    return tell(ports, faults, flags.json);
  }
  const { input, findings, positions } = placed.value;
  const lost = input.measured.faults.map((fault) => `Not placed, ${refusalWords(fault)}`);
  const said = [...(input.stock === null ? [] : faultLines(input.stock)), ...lost];
  if (said.length > 0) ports.err(`${said.join("\n")}\n`);
  const text = written(placed.value, format, ports.columns);
  if (flags.output === undefined || flags.output === "-") ports.out(text);
  else {
    const done = ports.files.write(flags.output, text, flags.force === true);
    if (!done.ok) return tell(ports, done.refusals, flags.json);
    ports.err(`${visible(flags.output)}: ${positions.length} units written\n`);
    // The list went to the file; the reader still wants to know how good it is.
    ports.out(flags.json ? placeJson(placed.value) : placeText(placed.value, ports.columns));
  }
  return findings.some((finding) => finding.verdict === "fail") ? EXIT.unsafe : EXIT.done;
}

function written(placed: Placed, format: Format, width: number): string {
  if (format === "json") return placeJson(placed);
  if (format === "csv") return placeCsv(placed.positions, placed.placing.ties, placed.input.bank.voltage);
  return placeText(placed, width);
}

/** The format named, else JSON with --json on the output, else that of the file's ending, else text. */
function readFormat({ format, json, output }: PlaceFlags): Format | Refusal {
  const toFile = output !== undefined && output !== "-";
  const ending = toFile ? endingOf(output) : null;
  if (format === undefined && ending !== null && !FORMATS.some((one) => (one === "text" ? "txt" : one) === ending))
    return strangeEnding(output, ["csv", "json", "txt"]);
  const wanted =
    format?.toLowerCase() ??
    FORMATS.find((one) => (one === "text" ? "txt" : one) === ending) ??
    (toFile ? "csv" : json ? "json" : "text");
  const found = FORMATS.find((one) => one === wanted);
  if (found !== undefined) return found;
  const want = `one of ${FORMATS.join(", ")}`;
  return { code: "bad-choice", place: { field: "--format" }, read: JSON.stringify(wanted), want };
}
