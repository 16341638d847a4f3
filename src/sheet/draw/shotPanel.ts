// One panel of the discharge chart as ink: a quantity over time, its zero, and one marked point with its words.

import { type Dimension, formatQuantity } from "../../quantity/index.ts";
import { axesInk } from "./axes.ts";
import { SIZES } from "./drawing.tsx";
import { across, down, type Ink } from "./ink.ts";
import { linePath } from "./paths.ts";
import { linearScale, type TimeScale } from "./scales.ts";
import { textWidth } from "./textWidth.ts";

export const LEFT = 56;
export const RIGHT = 486;
export const HEIGHT = 130;

interface Point {
  readonly time: number;
  readonly value: number;
}

export interface Panel {
  readonly top: number;
  readonly time: TimeScale;
  readonly dimension: Dimension;
  readonly title: string;
  readonly points: readonly Point[];
  readonly mark: (Point & { readonly words: string }) | null;
  /** Whether the mark's words stand under it. */
  readonly under: boolean;
}

/** A mark's words stay inside the panel, whichever end the mark is near. */
function wordsX(x: number, text: string): number {
  const half = textWidth(text, SIZES.small) / 2;
  return Math.min(Math.max(x, LEFT + half + 4), RIGHT - half);
}

export function panelInk({ top, time, dimension, title, points, mark, under }: Panel): readonly Ink[] {
  const values = [0, ...points.map(({ value }) => value), ...(mark === null ? [] : [mark.value])];
  const bottom = top + HEIGHT;
  const [least, most] = [Math.min(...values), Math.max(...values)];
  // Room for the words of a mark that stands at the very top or bottom.
  const air = (most - least) * 0.12;
  const scale = linearScale({
    low: under && mark !== null ? least - air : least,
    high: !under && mark !== null ? most + air : most,
    from: bottom,
    to: top,
  });
  const spot = mark === null ? null : { x: time.place(mark.time), y: scale.place(mark.value) };
  return [
    axesInk({
      left: LEFT,
      right: RIGHT,
      top,
      bottom,
      horizontal: {
        scale: time,
        ticks: time.ticks(6),
        words: time.words,
        title: "Time since the switch closed",
      },
      vertical: {
        scale,
        ticks: scale.ticks(5),
        words: (value) => formatQuantity(value, dimension, { digits: 3 }),
        title,
      },
    }),
    {
      wires: [across(LEFT, RIGHT, scale.place(0))],
      curves: [
        {
          role: dimension,
          d: linePath(points.map((point) => ({ x: time.place(point.time), y: scale.place(point.value) }))),
          width: 1.4,
        },
      ],
    },
    spot === null || mark === null
      ? {}
      : {
          dashes: [down(spot.x, spot.y, scale.place(0))],
          points: [spot],
          words: [
            {
              x: wordsX(spot.x, mark.words),
              y: under ? spot.y + 11 : spot.y - 5,
              text: mark.words,
              anchor: "middle",
              size: SIZES.small,
              bold: true,
            },
          ],
        },
  ];
}
