// A shot as CSV: time, load current and bank voltage, the peak among the rows.

import { type Discharge, traceOf } from "../pulse/index.ts";

/** Evenly spaced rows of a written waveform. */
const ROWS = 1001;

/** The text of the file, lines ended as CSV has them. */
export function waveformCsv(discharge: Discharge): string {
  const rows = traceOf(discharge, ROWS).map(({ time, current, voltage }) => `${time},${current},${voltage}`);
  return `time [s],current [A],voltage [V]\r\n${rows.join("\r\n")}\r\n`;
}
