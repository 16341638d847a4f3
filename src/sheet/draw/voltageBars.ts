// Voltages in each state as bars against limits, as ink: even share open, worst hatched, what is over a limit in words.

import { formatQuantity } from "../../quantity/index.ts";
import { axesInk } from "./axes.ts";
import { SIZES } from "./drawing.tsx";
import { down, type Ink } from "./ink.ts";
import { linearScale, type Scale } from "./scales.ts";
import { BLANK } from "./valueWords.ts";

/** One state of the bank and the voltage that one unit or stage may then see, V; null: not known. */
export interface VoltageBar {
  readonly words: string;
  /** With even sharing; left out: the state has no such value. */
  readonly nominal?: number | null;
  readonly worst: number | null;
}

/** A line across a chart, with its words. */
export interface LimitLine {
  readonly words: string;
  readonly value: number;
}

const AREA = { left: 122, right: 388 } as const;
const ROW = 25;
const BAR = 8;
const LABEL_STEP = 9.5;

export const worstWords = (volts: number | null): string =>
  volts === null ? `worst: ${BLANK} V` : `worst ${formatQuantity(volts, "voltage", { rounding: "up" })}`;
export function nominalWords(volts: number | null | undefined): string {
  if (volts === undefined) return "";
  return volts === null ? `even: ${BLANK} V` : `even ${formatQuantity(volts, "voltage")}`;
}
export const limitWords = ({ words, value }: LimitLine): string =>
  `${words} ${formatQuantity(value, "voltage", { rounding: "down" })}`;

/** Slanted lines inside a rectangle: told apart from an open one in any print. */
export function hatch(x: number, y: number, width: number, height: number): string {
  const parts: string[] = [];
  for (let start = 4; start < width + height; start += 4) {
    const [from, to] = [Math.min(start, width), Math.max(0, start - height)];
    if (from > to)
      parts.push(
        `M${(x + from).toFixed(1)} ${(y + start - from).toFixed(1)}L${(x + to).toFixed(1)} ${(y + start - to).toFixed(1)}`,
      );
  }
  return parts.join("");
}

/** The highest limit that the voltage is over; null: none. */
function overWords(volts: number | null, limits: readonly LimitLine[]): string | null {
  const over = volts === null ? [] : limits.filter(({ value }) => volts > value * (1 + 1e-9));
  const highest = over.toSorted((a, b) => b.value - a.value)[0];
  return highest === undefined ? null : `over ${highest.words}`;
}

function barInk(
  bar: VoltageBar,
  y: number,
  { scale, limits }: { readonly scale: Scale; readonly limits: readonly LimitLine[] },
): Ink {
  const zero = scale.place(0);
  const from = (volts: number): number => Math.min(zero, scale.place(volts));
  const width = (volts: number): number => Math.abs(scale.place(volts) - zero);
  const over = overWords(bar.worst, limits);
  const small = { size: SIZES.small } as const;
  return {
    boxes: [
      ...(bar.nominal == null
        ? []
        : [{ role: "nominal", x: from(bar.nominal), y, width: width(bar.nominal), height: BAR }]),
      ...(bar.worst === null
        ? []
        : [{ role: "worst", x: from(bar.worst), y: y + BAR, width: width(bar.worst), height: BAR }]),
    ],
    curves:
      bar.worst === null
        ? []
        : [{ role: "hatch", d: hatch(from(bar.worst), y + BAR, width(bar.worst), BAR), width: 0.5 }],
    words: [
      { x: AREA.left - 6, y: y + 7, text: bar.words, anchor: "end", room: AREA.left - 10, lines: 2, ...small },
      ...(bar.nominal === undefined
        ? []
        : [{ x: AREA.right + 10, y: y + 6.5, text: nominalWords(bar.nominal), ...small }]),
      {
        x: AREA.right + 10,
        y: y + 15.5,
        text: `${worstWords(bar.worst)}${over === null ? "" : ", "}`,
        bold: over !== null,
        ...small,
      },
      ...(over === null ? [] : [{ x: AREA.right + 10, y: y + 24, text: over, bold: true, room: 108, ...small }]),
    ],
  };
}

export interface VoltagePlot {
  readonly inks: readonly Ink[];
  readonly bottom: number;
}

/** Bars from the top down, limits as upright lines across all of them. */
export function voltagePlot(bars: readonly VoltageBar[], limits: readonly LimitLine[]): VoltagePlot {
  const known = [
    ...bars.flatMap(({ nominal, worst }) => [nominal ?? 0, worst ?? 0]),
    ...limits.map(({ value }) => value),
  ];
  const scale = linearScale({
    low: Math.min(0, ...known),
    high: Math.max(0, ...known),
    from: AREA.left,
    to: AREA.right,
  });
  const top = 14 + limits.length * LABEL_STEP;
  const bottom = top + 6 + bars.length * (ROW + 6);
  const frame = { ...AREA, top, bottom };
  const none = linearScale({ low: 0, high: 1, from: bottom, to: top });
  // The highest limit's words stand highest, so that no line crosses the words of another.
  const ordered = limits.toSorted((a, b) => b.value - a.value);
  return {
    bottom: bottom + 26,
    inks: [
      axesInk({
        ...frame,
        horizontal: {
          scale,
          ticks: scale.ticks(5),
          words: (value) => formatQuantity(value, "voltage", { digits: 3 }),
          title: "Voltage of one unit or stage",
        },
        vertical: { scale: none, ticks: [], words: () => "", title: "" },
      }),
      ...bars.map((bar, index) => barInk(bar, top + 4 + index * (ROW + 6), { scale, limits })),
      ...ordered.map((limit, index): Ink => {
        const y = 10 + index * LABEL_STEP;
        const x = scale.place(limit.value);
        return {
          rails: [down(x, y + 2, bottom)],
          words: [{ x: x - 3, y, text: limitWords(limit), anchor: "end", size: SIZES.small, room: x - 8 }],
        };
      }),
    ],
  };
}
