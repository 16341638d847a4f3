// Values to places on paper and round ticks, by d3-scale: chosen for its ticks, which are round on linear and log scales alike.

import { scaleLinear, scaleLog } from "d3-scale";
import { formatQuantity, roundTo, tenTo } from "../../quantity/index.ts";

export interface Scale {
  /** Place of a value, points. */
  readonly place: (value: number) => number;
  /** Round values within the scale, about as many as asked. */
  readonly ticks: (count: number) => readonly number[];
  /** Values at the two ends, after rounding outwards. */
  readonly low: number;
  readonly high: number;
}

export interface Extent {
  readonly low: number;
  readonly high: number;
  /** Places of the two ends, points. */
  readonly from: number;
  readonly to: number;
}

/** A scale whose ends are round values. Range: finite; low may equal high, which is widened. */
export function linearScale({ low, high, from, to }: Extent): Scale {
  const scale = scaleLinear([low, low < high ? high : low + (Math.abs(low) || 1)], [from, to]).nice();
  const [first = low, last = high] = scale.domain();
  return { place: scale, ticks: (count) => scale.ticks(count), low: first, high: last };
}

/** A logarithmic scale between just the values given. Range: 0 < low < high. */
export function logScale({ low, high, from, to }: Extent): Scale {
  const scale = scaleLog([low, high], [from, to]);
  return { place: scale, ticks: (count) => thinned(scale.ticks(), count), low, high };
}

/** Of the ticks of a log scale those that begin with 1, then with 1, 2 and 5, as room allows. */
function thinned(ticks: readonly number[], count: number): readonly number[] {
  const begins = (digits: readonly number[]) =>
    ticks.filter((tick) => digits.includes(Math.round(tick / tenTo(Math.floor(Math.log10(tick) + 1e-9)))));
  if (ticks.length <= count) return ticks;
  const some = begins([1, 2, 5]);
  return some.length <= count ? some : begins([1]);
}

export interface TimeScale extends Scale {
  /** A tick in the one unit of the whole axis: an axis in s, min and h at once has no round ticks. */
  readonly words: (seconds: number) => string;
}

const TIME_UNITS = [
  { below: 1, unit: null, seconds: 1 },
  { below: 600, unit: "s", seconds: 1 },
  { below: 7200, unit: "min", seconds: 60 },
  { below: 172800, unit: "h", seconds: 3600 },
  { below: Number.POSITIVE_INFINITY, unit: "d", seconds: 86400 },
] as const;

/** Seconds from 0 to `high` with round ticks in the unit that formatted times of that size have. Range: finite, > 0. */
export function timeScale(high: number, from: number, to: number): TimeScale {
  const { unit, seconds } = TIME_UNITS.find(({ below }) => high < below)!;
  const scale = linearScale({ low: 0, high: high / seconds, from, to });
  return {
    place: (value) => scale.place(value / seconds),
    ticks: (count) => scale.ticks(count).map((tick) => tick * seconds),
    low: 0,
    high: scale.high * seconds,
    words: (value) =>
      unit === null ? formatQuantity(value, "time", { digits: 3 }) : `${roundTo(value / seconds, 6)} ${unit}`,
  };
}
