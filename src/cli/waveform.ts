// A shot as CSV: time, load current and bank voltage with the band of the sampled courses, the peak among the rows.

import { type Discharge, traceOf } from "../pulse/index.ts";
import type { ShotReport } from "../search/index.ts";

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

/** Times [s] of so many even rows, the peak's own among them. */
export function waveformTimes(discharge: Discharge, rows: number): readonly number[] {
  return traceOf(discharge, rows, endOf(discharge)).map(({ time }) => time);
}

/** The text of the file, lines ended as CSV has them; with a band, the lowest and highest of the sampled currents and voltages beside them, which is no bound. */
export function waveformCsv({ discharge, band }: Pick<ShotReport, "discharge" | "band">): string {
  const ends =
    band === null
      ? ""
      : ",current lowest sampled [A],current highest sampled [A],voltage lowest sampled [V],voltage highest sampled [V]";
  const rows = waveformTimes(discharge, ROWS).map((time) => {
    const { current, voltage } = discharge.at(time);
    if (band === null) return `${time},${current},${voltage}`;
    const { current: amperes, voltage: volts } = band.at(time);
    return [time, current, voltage, amperes.low, amperes.high, volts.low, volts.high].join(",");
  });
  return `time [s],current [A],voltage [V]${ends}\r\n${rows.join("\r\n")}\r\n`;
}
