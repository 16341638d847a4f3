// Values set by hand are kept in a file of their own beside the catalogue: where it is, reading it, and writing it.

import { type Capacitor, type Overrides, readOverrides, withOverrides } from "../catalog/index.ts";
import { accepted, type Read, type Refusal } from "../quantity/index.ts";
import type { Files } from "./files.ts";
import { readJson } from "./jsonText.ts";

/** The file beside a catalogue; null for standard input, which has no place. */
export const overridesPath = (catalogue: string): string | null =>
  catalogue === "-" ? null : `${catalogue}.overrides.json`;

/** What is set by hand for one catalogue; empty where there is no such file. One that cannot be read is refused: it may say what keeps a bank safe. */
export function overridesOf(catalogue: string, files: Pick<Files, "read">): Read<Overrides> {
  const path = overridesPath(catalogue);
  if (path === null) return accepted({});
  const text = files.read(path);
  if (!text.ok) return text.refusals.every(({ code }) => code === "no-such-file") ? accepted({}) : text;
  const json = readJson(text.value, path);
  return json.ok ? readOverrides(json.value.value, path) : json;
}

export interface Laid {
  readonly parts: readonly Capacitor[];
  readonly faults: readonly Refusal[];
  /** Says that values were set by hand, and where. */
  readonly notes: readonly Refusal[];
}

/** The parts of a catalogue with what is set by hand laid over them. */
export function laidOver(
  catalogue: string,
  parts: readonly Capacitor[],
  files: Pick<Files, "read">,
): Read<Laid & { readonly overrides: Overrides }> {
  const overrides = overridesOf(catalogue, files);
  if (!overrides.ok) return overrides;
  const file = overridesPath(catalogue) ?? "";
  const laid = withOverrides(parts, overrides.value, file);
  const read = `${laid.count} ${laid.count === 1 ? "value" : "values"} set by hand`;
  const want = "nothing else; they hold in place of the catalogue's";
  const notes = laid.count === 0 ? [] : [{ code: "set-by-hand", place: { file }, read, want }];
  return accepted({ parts: laid.parts, faults: laid.faults, notes, overrides: overrides.value });
}

/** Writes what is set by hand for one catalogue; the catalogue itself is never touched. */
export function saveOverrides(catalogue: string, overrides: Overrides, files: Pick<Files, "write">): Read<string> {
  const path = overridesPath(catalogue);
  if (path === null) {
    const want = "a catalogue in a file: standard input has no place beside it";
    return { ok: false, refusals: [{ code: "bad-path", place: { file: "standard input" }, read: "-", want }] };
  }
  return files.write(path, `${JSON.stringify({ version: 1, parts: overrides }, null, 2)}\n`, true);
}
