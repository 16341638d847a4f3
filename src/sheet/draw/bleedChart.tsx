/** @jsxImportSource preact */
// The voltage of the bank falling through each of its paths, on a log scale, with what each path takes to each threshold.

import { formatQuantity } from "../../quantity/index.ts";
import { axesInk } from "./axes.ts";
import { type BleedCurve, drawable, timeAt } from "./bleedCurves.ts";
import { type Bleeding, bleedScales, curveInk, FRAME, letterOf, styleOf, thresholdInk, volts } from "./bleedInk.ts";
import { Drawing, type Figure } from "./drawing.tsx";
import type { Ink } from "./ink.ts";
import { Inked } from "./inked.tsx";
import { linesInk } from "./lines.ts";
import type { LimitLine } from "./voltageBars.ts";

export interface BleedChartProps extends Bleeding {
  /** Starts every id inside the drawing: letters, digits, hyphens. */
  readonly id: string;
  readonly title: string;
}

const KEY = 14;

/** "60 V after 412 s"; what is not reached is said. */
export function timesWords({ points }: BleedCurve, thresholds: readonly LimitLine[]): string {
  if (drawable(points).length === 0) return "not known";
  const one = ({ value }: LimitLine): string => {
    const when = timeAt(points, value);
    return when === null
      ? `not down to ${volts(value)} in the time told`
      : `${volts(value)} after ${formatQuantity(when, "time", { digits: 3, rounding: "up" })}`;
  };
  return thresholds.map(one).join(", ");
}

/** The chart as one figure; none when there is no line to draw. */
export function bleedFigures(props: BleedChartProps): readonly Figure[] {
  const { id, title, curves, thresholds } = props;
  if (curves.every(({ points }) => drawable(points).length === 0)) return [];
  const scales = bleedScales(props);
  const key = curves.map((curve, index) => `${letterOf(index)}: ${curve.words}; ${timesWords(curve, thresholds)}`);
  const keyed = curves.reduce<{ readonly inks: readonly Ink[]; readonly top: number }>(
    ({ inks, top }, _, index) => {
      const { ink, bottom } = linesInk([key[index]!], top, 42);
      const sample = { role: "key", d: `M8 ${(top + 5).toFixed(1)}h34`, ...styleOf(index) };
      return { inks: [...inks, ink, { curves: [sample] }], top: bottom - 7 };
    },
    { inks: [], top: FRAME.bottom + 26 },
  );
  return [
    {
      id,
      caption: `Bleed-down: ${title}`,
      drawing: (
        <Drawing
          id={id}
          title={`Bleed-down of ${title}`}
          description={`Voltage over time on a log scale. ${key.join(". ")}.`}
          height={keyed.top + KEY}
        >
          <Inked
            inks={[
              axesInk({
                ...FRAME,
                horizontal: {
                  scale: scales.time,
                  ticks: scales.time.ticks(6),
                  words: scales.time.words,
                  title: "Time since charging stopped",
                },
                vertical: {
                  scale: scales.voltage,
                  ticks: scales.voltage.ticks(9),
                  words: volts,
                  title: "Voltage, log scale",
                },
              }),
              thresholdInk(thresholds, curves, scales),
              ...curves.map((curve, index) => curveInk(curve, index, { ...scales, count: curves.length })),
              ...keyed.inks,
            ]}
          />
        </Drawing>
      ),
    },
  ];
}
