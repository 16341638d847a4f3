// What holds: a flag beats the brief file, which beats the defaults. Decided here and nowhere else.

import { readWaveform } from "../catalog/index.ts";
import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import { type Brief, readBrief } from "../search/index.ts";
import { attributeOf, BRIEF_FLAGS } from "./briefFlags.ts";
import type { Files } from "./files.ts";
import { type JsonText, readJson } from "./jsonText.ts";

export type Flags = Readonly<Record<string, unknown>>;

export interface Settings {
  readonly brief: Brief;
  /** Paths of the keys that were given, by file or flag; the rest are defaults. */
  readonly given: ReadonlySet<string>;
  readonly file: string | null;
  /** Flags that were given. */
  readonly flags: readonly string[];
}

export type Nest = Record<string, unknown>;

/** Puts a value at a path, copying what it changes. */
function withValue(target: Nest, path: readonly string[], value: unknown): Nest {
  const [key = "", ...rest] = path;
  const below = target[key];
  const inner = typeof below === "object" && below !== null && !Array.isArray(below) ? (below as Nest) : {};
  return { ...target, [key]: rest.length === 0 ? value : withValue(inner, rest, value) };
}

/** "USD=0.92" entries to a record; a wrong one is refused. */
function readExchange(entries: readonly string[]): Read<Readonly<Record<string, number>>> {
  const rates: Record<string, number> = {};
  for (const entry of entries) {
    const match = /^([A-Z]{3})=(\d+(?:\.\d+)?)$/.exec(entry);
    if (match === null || Number(match[2]) <= 0) {
      const want = "a currency code, =, and what one of it is worth, such as USD=0.92";
      return refused({ code: "bad-value", place: { field: "--exchange" }, read: JSON.stringify(entry), want });
    }
    rates[match[1] as string] = Number(match[2]);
  }
  return accepted(rates);
}

/** The input with the file of a recorded current read in its place. */
export function withRecord(input: Nest, files: Pick<Files, "read">): Read<Nest> {
  const load = input.load as Nest | undefined;
  const path = typeof load === "object" && load !== null ? load.recorded : undefined;
  if (typeof path !== "string") return accepted(input);
  const text = files.read(path);
  if (!text.ok) return text;
  const rows = readWaveform(text.value, path === "-" ? "standard input" : path);
  if (!rows.ok) return rows;
  return accepted({ ...input, load: { ...load, recorded: rows.value.map(({ time, current }) => [time, current]) } });
}

/** Joins the brief file (if any) and the flags, and reads the brief. Every refusal names its file, line and column, or its flag. `fill` puts in what the command needs and the user left out. */
export function settle(
  file: string | undefined,
  flags: Flags,
  files: Files,
  fill: (input: Nest) => Nest = (input) => input,
): Read<Settings> {
  let input: unknown = {};
  let placeOf: JsonText["placeOf"] = () => undefined;
  const name = file === "-" ? "standard input" : file;
  if (file !== undefined) {
    const text = files.read(file);
    if (!text.ok) return text;
    const json = readJson(text.value, name as string);
    if (!json.ok) return json;
    input = json.value.value;
    placeOf = json.value.placeOf;
    if (typeof input !== "object" || input === null || Array.isArray(input))
      return readBrief(input, name) as Read<never>;
  }
  const used: string[] = [];
  const byKey = new Map<string, string>();
  for (const { flag, key } of BRIEF_FLAGS) {
    let value = flags[attributeOf(flag)];
    if (value === undefined) continue;
    if (key === "exchange") {
      const rates = readExchange(value as readonly string[]);
      if (!rates.ok) return rates;
      value = rates.value;
    }
    input = withValue(input as Nest, key.split("."), value);
    used.push(flag);
    byKey.set(key, flag);
  }
  const record = withRecord(input as Nest, files);
  if (!record.ok) return record;
  const brief = readBrief(fill(record.value));
  if (!brief.ok) return refused(...brief.refusals.map((refusal) => placed(refusal, { name, placeOf, byKey })));
  return accepted({ brief: brief.value, given: keysOf(input as Nest), file: name ?? null, flags: used });
}

/** Puts a refusal where its value came from. A missing value is wanted as a flag or a key. */
function placed(
  refusal: Refusal,
  from: {
    readonly name: string | undefined;
    readonly placeOf: JsonText["placeOf"];
    readonly byKey: ReadonlyMap<string, string>;
  },
): Refusal {
  const field = refusal.place.field ?? "";
  const flag = from.byKey.get(field);
  if (flag !== undefined) return { ...refusal, place: { field: flag } };
  if (from.name === undefined) {
    const known = BRIEF_FLAGS.find((one) => one.key === field);
    return known === undefined ? refusal : { ...refusal, place: { field: known.flag } };
  }
  const place = from.placeOf(field) ?? { file: from.name };
  return { ...refusal, place: field === "" ? place : { ...place, field } };
}

function keysOf(input: Nest, path = ""): ReadonlySet<string> {
  const keys = new Set<string>();
  for (const [key, value] of Object.entries(input)) {
    const full = path === "" ? key : `${path}.${key}`;
    keys.add(full);
    if (typeof value === "object" && value !== null) for (const inner of keysOf(value as Nest, full)) keys.add(inner);
  }
  return keys;
}
