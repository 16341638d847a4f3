// A table of any known kind to rows that can be told: its headings say which reader it gets.

import {
  type Capacitor,
  RESISTOR_COLUMNS,
  readCapacitors,
  readFuses,
  readMeasured,
  readResistors,
} from "../catalog/index.ts";
import { accepted, type Dimension, formatQuantity, type Read, type Refusal, refused } from "../quantity/index.ts";
import { type TableKind, tableKind } from "./kind.ts";
import type { Laid } from "./overrides.ts";
import { capacitorValues, purchaseValues, type ValueWords, valueText } from "./valueWords.ts";

export interface ToldRow {
  readonly name: string;
  readonly line?: number;
  readonly values: readonly ValueWords[];
  /** Terms of purchase, of what is bought. */
  readonly purchase?: readonly ValueWords[];
}

export interface ToldTable {
  readonly kind: TableKind;
  readonly count: number;
  /** One row, told when asked for: a million rows are never told at once. */
  readonly row: (index: number) => ToldRow;
  readonly faults: readonly Refusal[];
  readonly notes: readonly Refusal[];
}

type Facts = readonly (readonly [heading: string, key: string, dimension: Dimension])[];

const FUSE_FACTS: Facts = [
  ["current", "current", "current"],
  ["voltage", "voltage", "voltage"],
  ["melting action", "melting", "action"],
  ["clearing action", "clearing", "action"],
];
const MEASURED_FACTS: Facts = [
  ["capacitance", "capacitance", "capacitance"],
  ["leakage", "leakage", "current"],
  ["esr", "esr", "resistance"],
  ["uncertainty", "uncertainty", "fraction"],
];

const told = (row: object, facts: Facts, state: "datasheet" | "measured"): readonly ValueWords[] =>
  facts.map(([heading, key, dimension]) => {
    const value = (row as Readonly<Record<string, number | undefined>>)[key];
    const text = formatQuantity(value, dimension, { digits: 6 });
    return value === undefined
      ? { heading, key, text, state: "unknown" as const }
      : { heading, key, value, text, state };
  });

/** Lays what is set by hand over the parts of a capacitor catalogue. */
export type Lay = (parts: readonly Capacitor[]) => Read<Laid>;

/** Reads by kind. Refuses what holds no table, with every place. */
export function readAnyTable(text: string, file: string, lay?: Lay): Read<ToldTable> {
  const kind = tableKind(text);
  switch (kind) {
    case "json": {
      const want = "a table in CSV; a brief is read by plan";
      return refused({ code: "wrong-kind", place: { file }, read: "JSON", want });
    }
    case "capacitors": {
      const read = readCapacitors(text, file);
      if (!read.ok) return read;
      const laid = lay?.(read.value.parts);
      if (laid !== undefined && !laid.ok) return laid;
      const parts = laid?.value.parts ?? read.value.parts;
      const faults = [...read.value.faults, ...(laid?.value.faults ?? [])];
      const notes = [...read.value.notes, ...(laid?.value.notes ?? [])];
      const row = (i: number): ToldRow => {
        const unit = parts[i] as (typeof parts)[number];
        return { name: unit.part, line: unit.line, values: capacitorValues(unit), purchase: purchaseValues(unit) };
      };
      return accepted({ kind, count: parts.length, row, faults, notes });
    }
    case "resistors": {
      const read = readResistors(text, file);
      if (!read.ok) return read;
      const { families, faults, notes } = read.value;
      const row = (i: number): ToldRow => {
        const family = families[i] as (typeof families)[number];
        const values = RESISTOR_COLUMNS.slice(1, 8).map((column): ValueWords => {
          const value = family[column.key as keyof typeof family];
          const plain = column.key === "tolerance" ? { low: family.tolerance, high: family.tolerance } : value;
          const state = value === undefined ? "unknown" : "datasheet";
          return { heading: column.heading, key: column.key, value: plain, text: valueText(plain, column), state };
        });
        return { name: family.family, values, purchase: purchaseValues(family) };
      };
      return accepted({ kind, count: families.length, row, faults, notes });
    }
    case "fuses": {
      const read = readFuses(text, file);
      if (!read.ok) return read;
      const { fuses, faults, notes } = read.value;
      const row = (i: number): ToldRow => {
        const fuse = fuses[i] as (typeof fuses)[number];
        return { name: fuse.fuse, values: told(fuse, FUSE_FACTS, "datasheet") };
      };
      return accepted({ kind, count: fuses.length, row, faults, notes });
    }
    case "measured units": {
      const read = readMeasured(text, file);
      if (!read.ok) return read;
      const { units, faults, notes } = read.value;
      const row = (i: number): ToldRow => {
        const unit = units[i] as (typeof units)[number];
        return { name: unit.serial, values: told(unit, MEASURED_FACTS, "measured") };
      };
      return accepted({ kind, count: units.length, row, faults, notes });
    }
  }
}
