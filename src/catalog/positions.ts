// A list of which unit stands where: the builder's own, or one that was written by a placing; also a list of pins.

import { accepted, type Read, type Refusal } from "../quantity/index.ts";
import { type Column, text } from "./column.ts";
import { readTable, record } from "./table.ts";

export interface ListedUnit {
  readonly serial: string;
  /** Stage (cross-tied) or string, from 1; absent for a spare. */
  readonly group?: number;
  /** Place within it, from 1, where the list says. */
  readonly place?: number;
  readonly line: number;
}

const COLUMNS: readonly Column[] = [
  { heading: "serial", also: ["serial number", "unit"], key: "serial", type: text(120), required: true },
  { heading: "stage", also: ["string", "group"], key: "group", type: { kind: "whole", least: 1, most: 1e6 } },
  { heading: "place", key: "place", type: { kind: "whole", least: 1, most: 1e6 } },
  // What a written list holds besides; the measured file is what counts for it.
  ...["use", "lot", "part", "note", "capacitance", "leakage", "esr", "share", "voltage"].map(
    (heading): Column => ({ heading, key: heading, type: text(1000) }),
  ),
];

export interface UnitList {
  readonly units: readonly ListedUnit[];
  readonly faults: readonly Refusal[];
  readonly notes: readonly Refusal[];
}

/** Reads a list of positions. Any row that cannot be read is among the faults. */
export function readPositions(source: string, file: string): Read<UnitList> {
  const units: ListedUnit[] = [];
  const table = readTable(source, COLUMNS, file, (row) => {
    const { serial, group, place } = record(COLUMNS, row) as unknown as ListedUnit;
    units.push({
      serial,
      ...(group === undefined ? {} : { group }),
      ...(place === undefined ? {} : { place }),
      line: row.line,
    });
  });
  if (!table.ok) return table;
  return accepted({ units, faults: table.value.faults, notes: table.value.notes });
}
