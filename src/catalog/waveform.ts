// The reader of a recorded current: rows of time and current.

import { accepted, type Read, refused } from "../quantity/index.ts";
import type { Column } from "./column.ts";
import { readTable, record } from "./table.ts";

/** One row of a record: s, A. */
export interface WaveformRow {
  readonly time: number;
  readonly current: number;
}

const either = (dimension: "time" | "current", most: number): Column["type"] => ({
  kind: "quantity",
  dimension,
  least: -most,
  most,
});

const WAVEFORM_COLUMNS: readonly Column[] = [
  { heading: "time", key: "time", type: either("time", 1e9), required: true },
  { heading: "current", key: "current", type: either("current", 1e9), required: true },
];

/** Reads a recorded current. A bad row is a gap in the record, so one refuses it all; order and gaps are judged with the load. */
export function readWaveform(source: string, file: string): Read<readonly WaveformRow[]> {
  const rows: WaveformRow[] = [];
  const table = readTable(source, WAVEFORM_COLUMNS, file, (row) => {
    rows.push(record(WAVEFORM_COLUMNS, row) as unknown as WaveformRow);
  });
  if (!table.ok) return table;
  return table.value.faults.length > 0 ? refused(...table.value.faults) : accepted(rows);
}
