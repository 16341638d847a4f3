// Lines of the bleed-down chart as ink: scales, one style and one letter to a line, thresholds with their crossings.

import { formatQuantity, power } from "../../quantity/index.ts";
import { apart } from "./axes.ts";
import { type BleedCurve, cutAt, drawable, timeAt, until } from "./bleedCurves.ts";
import { SIZES } from "./drawing.tsx";
import { across, type Ink } from "./ink.ts";
import { linePath } from "./paths.ts";
import { logScale, type Scale, type TimeScale, timeScale } from "./scales.ts";
import type { LimitLine } from "./voltageBars.ts";

export interface Bleeding {
  readonly curves: readonly BleedCurve[];
  readonly thresholds: readonly LimitLine[];
}

export const FRAME = { left: 54, right: 486, top: 22, bottom: 262 } as const;
const STYLES = [
  { dash: undefined, width: 1.4 },
  { dash: "7 3", width: 1.2 },
  { dash: "2 2", width: 1.2 },
  { dash: "9 3 2 3", width: 1.2 },
  { dash: "1 4", width: 2 },
  { dash: "14 3", width: 0.7 },
] as const;
/** Each letter stands at a height of its own along its line, so that none covers another. */
const LETTERS = "ABCDEFGHIJKLMNOPQRSTUVWXYZ";

export const styleOf = (index: number) => STYLES[index % STYLES.length]!;
export const letterOf = (index: number): string => LETTERS[index % LETTERS.length]!;
export const volts = (value: number): string => formatQuantity(value, "voltage", { digits: 3 });

export interface BleedScales {
  readonly time: TimeScale;
  readonly voltage: Scale;
}

/** Down to well below the lowest threshold, and as long as the slowest line takes that gets there. */
export function bleedScales({ curves, thresholds }: Bleeding): BleedScales {
  const all = curves.flatMap(({ points }) => drawable(points));
  const levels = thresholds.map(({ value }) => value).filter((value) => value > 0);
  const high = Math.max(...all.map(({ voltage }) => voltage), ...levels, 1e-3) * 1.15;
  const lowest = levels.length > 0 ? Math.min(...levels) : Math.min(...all.map(({ voltage }) => voltage), high / 10);
  const low = Math.min(lowest / 2, high / 4);
  const ends = curves.flatMap(({ points }) => cutAt(points, low).slice(-1));
  const down = ends.filter(({ voltage }) => voltage <= low * (1 + 1e-9));
  const longest = Math.max(...(down.length > 0 ? down : ends).map(({ time }) => time), 0);
  return {
    time: timeScale(longest > 0 ? longest : 1, FRAME.left, FRAME.right),
    voltage: logScale({ low, high, from: FRAME.bottom, to: FRAME.top }),
  };
}

export function curveInk({ points }: BleedCurve, index: number, of: BleedScales & { readonly count: number }): Ink {
  const { time, voltage, count } = of;
  const shown = until(cutAt(points, voltage.low), time.high);
  const spots = shown.map((point) => ({ x: time.place(point.time), y: voltage.place(point.voltage) }));
  const first = shown[0];
  if (first === undefined) return {};
  const last = shown.at(-1)!;
  // Where the line has fallen by its own share of its height; a level line has none, and takes its share of the time.
  const level = first.voltage * power(last.voltage / first.voltage, (index + 1) / (count + 1));
  const when = last.voltage < first.voltage ? timeAt(shown, level) : (last.time * (index + 1)) / (count + 1);
  return {
    curves: [{ role: "curve", d: linePath(spots), ...styleOf(index) }],
    plates: [{ x: time.place(when ?? 0), y: voltage.place(level), text: letterOf(index), room: 20 }],
  };
}

export function thresholdInk(
  thresholds: readonly LimitLine[],
  curves: readonly BleedCurve[],
  { time, voltage }: BleedScales,
): Ink {
  const shown = thresholds.filter(({ value }) => value > 0);
  const heights = shown.map(({ value }) => voltage.place(value));
  const labels = apart(
    heights.map((y) => y - 3),
    8.5,
  );
  const crossings = shown.flatMap(({ value }) =>
    curves.flatMap(({ points }) => {
      const when = timeAt(points, value);
      return when === null || when > time.high ? [] : [{ x: time.place(when), y: voltage.place(value) }];
    }),
  );
  return {
    dashes: heights.map((y) => across(FRAME.left, FRAME.right, y)),
    points: crossings,
    words: shown.map(({ words, value }, index) => ({
      x: FRAME.right,
      y: labels[index]!,
      text: `${words} ${volts(value)}`,
      anchor: "end",
      size: SIZES.small,
      room: 300,
    })),
  };
}
