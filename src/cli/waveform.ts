// A shot as CSV: time, load current and bank voltage, the peak among the rows.

import { type Discharge, traceOf } from "../pulse/index.ts";

/** Evenly spaced rows of a written waveform. */
const ROWS = 1001;
/** Part of the peak below which the current counts as gone, and how many times a half of the course is looked at for it. */
const GONE = 1e-4;
const LOOKS = 64;

/** Time at which the drawing may end: halved while the later half holds no current worth drawing. */
function endOf({ at, duration, peakCurrent, peakTime }: Discharge): number {
  const quiet = (from: number, to: number): boolean =>
    Array.from({ length: LOOKS + 1 }, (_, k) => from + ((to - from) * k) / LOOKS).every(
      (time) => Math.abs(at(time).current) < GONE * peakCurrent,
    );
  let end = duration;
  while (end / 2 > peakTime && quiet(end / 2, end)) end /= 2;
  return end;
}

/** The text of the file, lines ended as CSV has them. */
export function waveformCsv(discharge: Discharge): string {
  const trace = traceOf(discharge, ROWS, endOf(discharge));
  const rows = trace.map(({ time, current, voltage }) => `${time},${current},${voltage}`);
  return `time [s],current [A],voltage [V]\r\n${rows.join("\r\n")}\r\n`;
}
