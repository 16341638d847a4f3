// One measured unit, and the reader of a measured lot.

import { accepted, type Read, type Refusal } from "../quantity/index.ts";
import { above, type Column, fromZero, text } from "./column.ts";
import { readTable, record } from "./table.ts";

/** A physical unit with its own readings. F, A, ohm; `uncertainty` is the meter's, relative, where the row has its own. */
export interface MeasuredUnit {
  readonly serial: string;
  readonly capacitance: number;
  readonly leakage?: number;
  readonly esr?: number;
  readonly lot?: string;
  readonly part?: string;
  /** Polarity or size group: units of two groups never share a stage or string. */
  readonly group?: string;
  readonly note?: string;
  readonly uncertainty?: number;
}

export const MEASURED_COLUMNS: readonly Column[] = [
  { heading: "serial", also: ["serial number", "unit"], key: "serial", type: text(120), required: true },
  { heading: "capacitance", key: "capacitance", type: above("capacitance", 1e-13, 1e5), required: true },
  { heading: "leakage", also: ["leakage current"], key: "leakage", type: fromZero("current", 100) },
  { heading: "esr", key: "esr", type: above("resistance", 1e-7, 1e6) },
  { heading: "lot", key: "lot", type: text(120) },
  { heading: "part", key: "part", type: text(120) },
  { heading: "group", also: ["polarity", "size"], key: "group", type: text(120) },
  { heading: "note", also: ["notes"], key: "note", type: text(1000) },
  { heading: "uncertainty", key: "uncertainty", type: above("fraction", 1e-9, 0.5) },
];

export interface MeasuredLot {
  readonly units: readonly MeasuredUnit[];
  readonly faults: readonly Refusal[];
  readonly notes: readonly Refusal[];
}

/** Reads a measured lot. A serial that stands twice is a fault of its second row. */
export function readMeasured(source: string, file: string): Read<MeasuredLot> {
  const units: MeasuredUnit[] = [];
  const faults: Refusal[] = [];
  const seen = new Map<string, number>();
  const table = readTable(source, MEASURED_COLUMNS, file, (row) => {
    const { line } = row;
    const unit = record(MEASURED_COLUMNS, row) as unknown as MeasuredUnit;
    const first = seen.get(unit.serial);
    if (first !== undefined) {
      const want = `each serial once; line ${first} has it already`;
      faults.push({
        code: "duplicate-serial",
        place: { file, line, field: "serial" },
        read: JSON.stringify(unit.serial),
        want,
      });
      return;
    }
    seen.set(unit.serial, line);
    units.push(unit);
  });
  if (!table.ok) return table;
  return accepted({ units, faults: [...table.value.faults, ...faults], notes: table.value.notes });
}
