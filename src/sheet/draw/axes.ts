// The frame of a chart: two axes with ticks, faint lines across at the ticks, and what each axis tells.

import { SIZES } from "./drawing.tsx";
import { across, down, type Ink } from "./ink.ts";
import type { Scale } from "./scales.ts";

export interface Axis {
  readonly scale: Scale;
  readonly ticks: readonly number[];
  readonly words: (value: number) => string;
  /** "Voltage, log scale". */
  readonly title: string;
}

export interface Frame {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

export interface AxesGiven extends Frame {
  readonly horizontal: Axis;
  readonly vertical: Axis;
}

const TICK = 3;

/** The title of the upright axis stands above it, that of the level one below its right end: no text is turned. */
export function axesInk({ left, right, top, bottom, horizontal, vertical }: AxesGiven): Ink {
  const small = { size: SIZES.small } as const;
  const columns = horizontal.ticks.map((tick) => ({ tick, x: horizontal.scale.place(tick) }));
  const rows = vertical.ticks.map((tick) => ({ tick, y: vertical.scale.place(tick) }));
  const grid = rows.map(({ y }) => `M${left} ${y.toFixed(1)}H${right}`).join("");
  return {
    wires: [
      down(left, top, bottom),
      across(left, right, bottom),
      ...columns.map(({ x }) => down(x, bottom, bottom + TICK)),
      ...rows.map(({ y }) => across(left - TICK, left, y)),
    ],
    curves: [{ role: "grid", d: grid, width: 0.2 }],
    words: [
      { x: left, y: top - 6, text: vertical.title, ...small },
      { x: right, y: bottom + 22, text: horizontal.title, anchor: "end", ...small },
      ...columns.map(({ tick, x }) => ({
        x,
        y: bottom + 11.5,
        text: horizontal.words(tick),
        anchor: "middle" as const,
        ...small,
      })),
      ...rows.map(({ tick, y }) => ({
        x: left - 5,
        y: y + 2.5,
        text: vertical.words(tick),
        anchor: "end" as const,
        ...small,
      })),
    ],
  };
}

/** Heights of labels moved apart so that none covers another, in the order of the heights given, each as near as it may be. */
export function apart(heights: readonly number[], least: number): readonly number[] {
  const order = heights.map((y, index) => ({ y, index })).sort((a, b) => a.y - b.y);
  const out = [...heights];
  let last = Number.NEGATIVE_INFINITY;
  for (const { y, index } of order) {
    last = Math.max(y, last + least);
    out[index] = last;
  }
  return out;
}
