// The catalogues that a command was given: parts, resistor families, and what was lost while reading.

import {
  type Capacitor,
  DEFAULT_FAMILY,
  type Overrides,
  type ResistorFamily,
  readCapacitors,
  readResistors,
} from "../catalog/index.ts";
import { accepted, nearestWord, type Read, type Refusal, refused } from "../quantity/index.ts";
import type { Files } from "./files.ts";
import { tableKind } from "./kind.ts";
import { laidOver } from "./overrides.ts";

/** What was read from one file. */
export interface Source {
  readonly file: string;
  readonly kind: "capacitors" | "resistors";
  readonly read: number;
  readonly faults: readonly Refusal[];
  readonly notes: readonly Refusal[];
  /** What is set by hand beside it; absent for resistors. */
  readonly overrides?: Overrides;
}

export interface Stock {
  readonly parts: readonly Capacitor[];
  readonly families: readonly ResistorFamily[];
  readonly sources: readonly Source[];
}

const nameOf = (path: string): string => (path === "-" ? "standard input" : path);

const WANTED: Readonly<Record<string, string>> = {
  resistors: "a capacitor catalogue; this one has resistors: give it with --resistors",
  fuses: "a capacitor catalogue; this one has fuses",
  "measured units": "a capacitor catalogue; this one has measured units",
  json: "a capacitor catalogue; this one is JSON: put a brief before --catalog",
};

function readParts(path: string, files: Files): Read<Source & { readonly parts: readonly Capacitor[] }> {
  const file = nameOf(path);
  const text = files.read(path);
  if (!text.ok) return text;
  const kind = tableKind(text.value);
  if (kind !== "capacitors")
    return refused({ code: "wrong-kind", place: { file }, read: kind, want: WANTED[kind] as string });
  const catalogue = readCapacitors(text.value, file);
  if (!catalogue.ok) return catalogue;
  const laid = laidOver(path, catalogue.value.parts, files);
  if (!laid.ok) return laid;
  const { parts, overrides } = laid.value;
  const faults = [...catalogue.value.faults, ...laid.value.faults];
  const notes = [...catalogue.value.notes, ...laid.value.notes];
  const own = Object.keys(overrides).length > 0 ? { overrides } : {};
  return accepted({ file, kind: "capacitors", read: parts.length, faults, notes, parts, ...own });
}

/** Reads the catalogues. A part that an earlier file has already is lost, and told. Refuses a file that cannot be read, and no part at all. */
export function readStock(
  given: { readonly catalog?: readonly string[] | undefined; readonly resistors?: string | undefined },
  files: Files,
): Read<Stock> {
  if (given.catalog === undefined || given.catalog.length === 0) {
    const want = "one capacitor catalogue or more: --catalog FILE...";
    return refused({ code: "missing-option", place: { field: "--catalog" }, read: "nothing", want });
  }
  const parts: Capacitor[] = [];
  const sources: Source[] = [];
  const owner = new Map<string, string>();
  const refusals: Refusal[] = [];
  for (const path of given.catalog) {
    const read = readParts(path, files);
    if (!read.ok) {
      refusals.push(...read.refusals);
      continue;
    }
    const { parts: found, ...source } = read.value;
    const doubles: Refusal[] = [];
    for (const part of found) {
      const first = owner.get(part.part);
      if (first === undefined) {
        owner.set(part.part, `${part.file}:${part.line}`);
        parts.push(part);
        continue;
      }
      const place = { file: part.file, line: part.line, field: "part" };
      const want = `a name of its own for each part; ${first} has it already`;
      doubles.push({ code: "duplicate-part", place, read: JSON.stringify(part.part), want });
    }
    sources.push({ ...source, read: source.read - doubles.length, faults: [...source.faults, ...doubles] });
  }
  const resistors = given.resistors === undefined ? null : readFamilies(given.resistors, files);
  if (resistors !== null && !resistors.ok) refusals.push(...resistors.refusals);
  if (refusals.length > 0) return refused(...refusals);
  if (parts.length === 0) {
    // The notes too: a heading that was passed over may be why.
    const faults = sources.flatMap((source) => [...source.faults, ...source.notes]);
    const place = { file: given.catalog.map(nameOf).join(", ") };
    return refused(...faults, { code: "no-parts", place, read: "no good row", want: "at least one good row" });
  }
  const families = resistors?.ok ? resistors.value.families : [DEFAULT_FAMILY];
  return accepted({ parts, families, sources: resistors?.ok ? [...sources, resistors.value.source] : sources });
}

function readFamilies(
  path: string,
  files: Files,
): Read<{ readonly families: readonly ResistorFamily[]; readonly source: Source }> {
  const file = nameOf(path);
  const text = files.read(path);
  if (!text.ok) return text;
  const kind = tableKind(text.value);
  if (kind !== "resistors") {
    const want = "a resistor catalogue, with the headings family, tolerance [%], power [W], voltage [V]";
    return refused({ code: "wrong-kind", place: { file }, read: kind, want });
  }
  const read = readResistors(text.value, file);
  if (!read.ok) return read;
  const { families, faults, notes } = read.value;
  if (families.length === 0)
    return refused(...faults, ...notes, {
      code: "no-parts",
      place: { file },
      read: "no good row",
      want: "at least one good row",
    });
  return accepted({ families, source: { file, kind: "resistors", read: families.length, faults, notes } });
}

/** One part by its name; a near one is named when there is none. */
export function findPart(
  name: string,
  parts: readonly Capacitor[],
  place: { readonly field: string },
): Read<Capacitor> {
  const part = parts.find((one) => one.part === name);
  if (part !== undefined) return accepted(part);
  const near = nearestWord(
    name,
    parts.map((one) => one.part),
  );
  const want =
    near === null
      ? parts.length === 1
        ? `${JSON.stringify(parts[0]?.part)}, the only part of the catalogues`
        : `one of the ${parts.length} parts of the catalogues`
      : `perhaps ${JSON.stringify(near)}`;
  return refused({ code: "unknown-part", place, read: JSON.stringify(name), want });
}
