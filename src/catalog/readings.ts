// Voltages and currents read from a bank that stands charged, one reading a row.

import { accepted, type Read, type Refusal } from "../quantity/index.ts";
import { above, type Column, fromZero, text } from "./column.ts";
import { readTable, record } from "./table.ts";

export interface Reading {
  /** s after the charge ended. */
  readonly time: number;
  /** V that the bank was charged to. */
  readonly bank: number;
  /** Stage (cross-tied), or place in the string, from 1; absent in a row that only reads the whole bank. */
  readonly stage?: number;
  /** String, from 1. */
  readonly string?: number;
  /** A unit by its serial, in place of stage and string. */
  readonly serial?: string;
  /** V across the stage or unit, with the meter's sign. */
  readonly voltage?: number;
  /** V across the whole bank, A from the charger. */
  readonly total?: number;
  readonly current?: number;
  readonly line: number;
}

const MOST_VOLTS = 1e7;
const place = { kind: "whole", least: 1, most: 1e6 } as const;

export const READING_COLUMNS: readonly Column[] = [
  { heading: "time", also: ["after", "hold"], key: "time", type: fromZero("time", 1e9) },
  {
    heading: "charge voltage",
    also: ["bank", "bank voltage", "charged to"],
    key: "bank",
    type: above("voltage", 1e-3, MOST_VOLTS),
    required: true,
  },
  { heading: "stage", also: ["place", "position"], key: "stage", type: place },
  { heading: "string", key: "string", type: place },
  { heading: "serial", also: ["unit", "serial number"], key: "serial", type: text(120) },
  {
    heading: "voltage",
    also: ["reading"],
    key: "voltage",
    type: { kind: "quantity", dimension: "voltage", least: -MOST_VOLTS, most: MOST_VOLTS },
  },
  { heading: "total", also: ["total voltage"], key: "total", type: fromZero("voltage", MOST_VOLTS) },
  { heading: "current", key: "current", type: fromZero("current", 1e6) },
  { heading: "note", also: ["notes"], key: "note", type: text(1000) },
];

export interface Readings {
  readonly readings: readonly Reading[];
  readonly faults: readonly Refusal[];
  readonly notes: readonly Refusal[];
}

/** Reads a list of readings; a row without a time was read as soon as the charge ended. */
export function readReadings(source: string, file: string): Read<Readings> {
  const readings: Reading[] = [];
  const table = readTable(source, READING_COLUMNS, file, (row) => {
    const { time = 0, ...rest } = record(READING_COLUMNS, row) as unknown as Reading;
    readings.push({ ...rest, time, line: row.line });
  });
  if (!table.ok) return table;
  return accepted({ readings, faults: table.value.faults, notes: table.value.notes });
}
