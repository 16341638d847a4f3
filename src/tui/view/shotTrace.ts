// Current and voltage of a shot over time, the peak current and the most reversed voltage marked.
import type { Discharge } from "../../pulse/index.ts";
import type { ShotReport } from "../../search/index.ts";
import { chartRows } from "../chart.ts";
import type { Row } from "../row.ts";
import type { State } from "../state.ts";
import { shown } from "../values.ts";
import type { Room } from "./page.ts";
import { dotted } from "./sharingCourse.ts";
import { paragraph } from "./words.ts";

export interface ShotDrawn {
  readonly state: State;
  /** Of a chart. */
  readonly size: Room;
}

/** Below this part of the peak nothing is seen any more. */
const QUIET = 0.02;
/** A ringing shot is drawn to so many times its first peak: about four periods. */
const RINGS = 16;
const LOOKED_AT = 400;
const SOUGHT_AT = 1000;

/** s that are drawn: until the current has died down, and of a long ringing its first periods. */
export function drawnSeconds({ at, duration, peakCurrent, peakTime, reversal }: Discharge): number {
  const most = reversal > QUIET && peakTime > 0 ? Math.min(duration, RINGS * peakTime) : duration;
  for (let step = LOOKED_AT; step > 0; step -= 1) {
    const time = (most * step) / LOOKED_AT;
    if (Math.abs(at(time).current) > QUIET * peakCurrent) return Math.min(most, time * 1.05);
  }
  return most;
}

/** Where the voltage is lowest: its depth is the shot's own reversal, its time is looked for finely, whatever the width. */
function lowestOf(
  { at, reversal }: Discharge,
  { voltage, until }: { readonly voltage: number; readonly until: number },
) {
  let time = 0;
  for (let step = 1; step <= SOUGHT_AT; step += 1) {
    const next = (until * step) / SOUGHT_AT;
    if (at(next).voltage < at(time).voltage) time = next;
  }
  return { time, voltage: -reversal * voltage };
}

export function traceRows({ discharge, voltage, band }: ShotReport, { state, size }: ShotDrawn): readonly Row[] {
  const { peakTime, at, duration } = discharge;
  const until = drawnSeconds(discharge);
  const count = size.columns * 2;
  const times = Array.from({ length: count }, (_, index) => (until * index) / (count - 1));
  const samples = times.map((time) => ({ time, ...at(time) }));
  const ends = band === null ? [] : times.map(band.at);
  const edges = (key: "current" | "voltage") =>
    (["low", "high"] as const).map((end) => ({
      points: dotted(
        ends.map((one) => ({ x: one.time, y: one[key][end] })),
        size.columns,
      ),
      joined: false,
      glyph: ".",
    }));
  const peak = { x: peakTime, y: at(peakTime).current };
  const lowest = lowestOf(discharge, { voltage, until });
  const range = (values: readonly number[]) => {
    const [low, high] = [Math.min(0, ...values), Math.max(0, ...values)];
    return { low: low * 1.05, high: high > low ? high * 1.05 : low + 1 };
  };
  const amperes = range([
    ...samples.map(({ current }) => current),
    ...ends.flatMap(({ current }) => [current.low, current.high]),
    peak.y,
  ]);
  const volts = range([
    ...samples.map((one) => one.voltage),
    ...ends.flatMap((one) => [one.voltage.low, one.voltage.high]),
    voltage,
    lowest.voltage,
  ]);
  const under = ["0", "time", shown(until, "time")] as const;
  const zero = (low: number) => (low < 0 ? [{ y: 0, words: "0" }] : []);
  const common = { ...size, x: { low: 0, high: until > 0 ? until : 1 }, ascii: state.look.ascii };
  const reversed = lowest.voltage < 0;
  const marks = [
    `P peak ${shown(peak.y, "current")} after ${shown(peakTime, "time")}.`,
    reversed
      ? `R most reversed ${shown(lowest.voltage, "voltage")} after ${shown(lowest.time, "time")}.`
      : "The voltage does not reverse.",
    ...(band === null
      ? []
      : [`Dots: lowest and highest of both among ${band.courses} sampled shots of all that spreads, not a bound.`]),
    ...(until < duration ? [`Drawn to ${shown(until, "time")}; it is over after ${shown(duration, "time")}.`] : []),
  ];
  return [
    ...chartRows({
      ...common,
      y: amperes,
      curves: [
        { points: samples.map(({ time: x, current: y }) => ({ x, y })), joined: true, glyph: "*" },
        ...edges("current"),
      ],
      levels: zero(amperes.low),
      marks: [{ at: peak, letter: "P" }],
      top: shown(amperes.high, "current"),
      bottom: shown(amperes.low, "current"),
      under: [under[0], "current, time", under[2]],
    }),
    ...chartRows({
      ...common,
      y: volts,
      curves: [
        { points: samples.map(({ time: x, voltage: y }) => ({ x, y })), joined: true, glyph: "*" },
        ...edges("voltage"),
      ],
      levels: zero(volts.low),
      marks: reversed ? [{ at: { x: lowest.time, y: lowest.voltage }, letter: "R" }] : [],
      top: shown(volts.high, "voltage"),
      bottom: shown(volts.low, "voltage"),
      under: [under[0], "voltage of the bank, time", under[2]],
    }),
    ...paragraph(marks.join(" "), size.columns),
  ];
}
