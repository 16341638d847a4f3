// The measured units that a command was given: read, and refused where it cannot be told which unit is which.

import { type MeasuredUnit, readMeasured } from "../catalog/index.ts";
import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import type { Files } from "./files.ts";
import { tableKind } from "./kind.ts";

export interface MeasuredInput {
  readonly file: string;
  readonly units: readonly MeasuredUnit[];
  /** Rows that were lost; their units cannot be placed. */
  readonly faults: readonly Refusal[];
  readonly notes: readonly Refusal[];
}

/** Reads a measured lot. With `part`, units of another part are left out when some are of this one. */
export function readMeasuredInput(
  path: string | undefined,
  part: string | undefined,
  files: Pick<Files, "read">,
): Read<MeasuredInput> {
  if (path === undefined) {
    const want = "a file of measured units: --measured FILE";
    return refused({ code: "missing-option", place: { field: "--measured" }, read: "nothing", want });
  }
  const file = path === "-" ? "standard input" : path;
  const text = files.read(path);
  if (!text.ok) return text;
  const kind = tableKind(text.value);
  if (kind === "json" || kind === "resistors" || kind === "fuses") {
    const want = "measured units, with the headings serial and capacitance [uF]";
    return refused({ code: "wrong-kind", place: { file }, read: kind, want });
  }
  const read = readMeasured(text.value, file);
  if (!read.ok) return read;
  // Two units of one name: whichever is fitted, its reading may be the other's.
  const twice = read.value.faults.filter((fault) => fault.code === "duplicate-serial");
  if (twice.length > 0) return refused(...twice);
  const { units, faults, notes } = read.value;
  const ofPart = part === undefined ? [] : units.filter((unit) => unit.part === part);
  return accepted({ file, units: ofPart.length > 0 ? ofPart : units, faults, notes });
}
