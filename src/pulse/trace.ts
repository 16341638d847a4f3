// Samples of a shot for drawing: evenly spaced, with the peak itself among them.
import type { Shot } from "./shot.ts";

/** One row of a drawing: s, A, V. */
export interface TraceRow {
  readonly time: number;
  readonly current: number;
  readonly voltage: number;
}

/** What of a shot a trace needs. */
export type Traced = Pick<Shot, "at" | "duration" | "peakTime">;

/**
 * `count` (at least 2) evenly spaced rows from 0 to `until` [s] (default the whole shot), and one more at the peak when it
 * falls between two of them.
 */
export function traceOf(shot: Traced, count: number, until: number = shot.duration): readonly TraceRow[] {
  const rows = Math.max(2, Math.floor(count));
  const times = Array.from({ length: rows }, (_, index) => (until * index) / (rows - 1));
  if (shot.peakTime < until && !times.includes(shot.peakTime)) times.push(shot.peakTime);
  return times.sort((a, b) => a - b).map((time) => ({ time, ...shot.at(time) }));
}
