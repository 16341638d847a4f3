// Values set by hand over those of a catalogue: read, held against the columns, and laid over the parts; the catalogue itself stays as it is.

import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import { CAPACITOR_COLUMNS, type Capacitor, type ValueState } from "./capacitor.ts";
import { readCell } from "./cell.ts";
import type { Column } from "./column.ts";
import { assumedLeakage, RULES } from "./states.ts";

/** Text by heading by part. */
export type Overrides = Readonly<Record<string, Readonly<Record<string, string>>>>;

/** Names, words, what other values follow from, and plates are the catalogue's alone. */
const FIXED: readonly string[] = [
  "part",
  "maker",
  "technology",
  "currency",
  "note",
  "measured",
  "assumed",
  "plateArea",
  "gap",
  "permittivity",
  "plates",
  "breakdownField",
];

/** The columns whose values can be set by hand. */
export const OVERRIDABLE: readonly Column[] = CAPACITOR_COLUMNS.filter(({ key }) => !FIXED.includes(key));

const BY_HAND: ValueState = { state: "assumed", rule: RULES.hand };

const columnOf = (heading: string): Column | undefined =>
  OVERRIDABLE.find((column) => column.heading === heading || column.also?.includes(heading));

/** A part with some of its values set by hand; refused whole when one cannot be read or contradicts another. */
export function overridden(unit: Capacitor, texts: Readonly<Record<string, string>>): Read<Capacitor> {
  const refusals: Refusal[] = [];
  const changes: Record<string, unknown> = {};
  const states: Record<string, ValueState> = { ...unit.states };
  for (const [heading, text] of Object.entries(texts)) {
    const place = { field: `${unit.part}, ${heading}` };
    const column = columnOf(heading);
    if (column === undefined) {
      const want = "a heading whose value can be set by hand, such as leakage";
      refusals.push({ code: "unknown-column-name", place, read: JSON.stringify(heading), want });
      continue;
    }
    const read = readCell(text.trim(), column.type, {
      bare: null,
      decimalComma: "never",
      currency: unit.currency ?? "",
    });
    if (read.ok) {
      changes[column.key] = read.value;
      states[column.key] = BY_HAND;
    } else refusals.push(...read.refusals.map((refusal) => ({ ...refusal, place })));
  }
  if (refusals.length > 0) return refused(...refusals);
  const next = { ...unit, ...changes, states } as Capacitor;
  const { surgeVoltage, voltage } = next;
  if (surgeVoltage !== undefined && surgeVoltage < voltage) {
    const place = { field: `${unit.part}, surge voltage` };
    const want = "a surge voltage at least the rated voltage";
    return refused({ code: "contradiction", place, read: `${surgeVoltage} V below ${voltage} V`, want });
  }
  return accepted(withAssumedLeakage(next));
}

/** An assumed leakage follows from capacitance and voltage, and from there being no other figure. */
function withAssumedLeakage(unit: Capacitor): Capacitor {
  const state = unit.states.leakage;
  if (state?.state !== "assumed" || state.rule !== RULES.leakage) return unit;
  return { ...unit, leakage: assumedLeakage(unit.capacitance, unit.voltage) };
}

export interface Overridden {
  readonly parts: readonly Capacitor[];
  /** What could not be laid over; those parts keep the catalogue's values. */
  readonly faults: readonly Refusal[];
  /** Values that hold. */
  readonly count: number;
}

/** Lays values set by hand over the parts of one catalogue. `file` is where they stand. */
export function withOverrides(parts: readonly Capacitor[], overrides: Overrides, file: string): Overridden {
  const faults: Refusal[] = [];
  let count = 0;
  const left = new Map(Object.entries(overrides).filter(([, texts]) => Object.keys(texts).length > 0));
  if (left.size === 0) return { parts, faults, count };
  const laid = parts.map((unit) => {
    const texts = left.get(unit.part);
    if (texts === undefined) return unit;
    left.delete(unit.part);
    const read = overridden(unit, texts);
    if (!read.ok) {
      faults.push(...read.refusals.map((refusal) => ({ ...refusal, place: { file, ...refusal.place } })));
      return unit;
    }
    count += Object.keys(texts).length;
    return read.value;
  });
  for (const part of left.keys()) {
    const want = "a part of the catalogue beside it";
    faults.push({ code: "unknown-part", place: { file, field: part }, read: JSON.stringify(part), want });
  }
  return { parts: laid, faults, count };
}

/** Values set by hand from parsed JSON, `{ "parts": { part: { heading: text } } }`. */
export function readOverrides(json: unknown, file: string): Read<Overrides> {
  const isObject = (value: unknown): value is Record<string, unknown> =>
    typeof value === "object" && value !== null && !Array.isArray(value);
  const no = (field: string, want: string): Read<never> =>
    refused({ code: "bad-value", place: { file, field }, read: "something else", want });
  const parts = isObject(json) ? json.parts : undefined;
  if (!isObject(parts)) return no("parts", "an object of parts, each an object of headings and texts");
  const found: Record<string, Record<string, string>> = Object.create(null) as Record<string, Record<string, string>>;
  for (const [part, texts] of Object.entries(parts)) {
    if (!isObject(texts)) return no(part, "an object of headings and texts");
    const own: Record<string, string> = {};
    for (const [heading, text] of Object.entries(texts)) {
      if (typeof text !== "string") return no(`${part}, ${heading}`, 'a text such as "12 uA"');
      own[heading] = text;
    }
    found[part] = own;
  }
  return accepted({ ...found });
}
