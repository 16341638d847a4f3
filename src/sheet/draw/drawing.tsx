/** @jsxImportSource preact */
// The sheet of every drawing: one viewBox, a title and a description that a screen reader tells, text that fits its room.
//
// One unit of a viewBox is one point when the drawing is printed at its full width, which both A4 and Letter have room for at
// margins of 15 mm. So no letter is smaller than 7 pt, and nothing here knows the paper.

import type { ComponentChildren } from "preact";
import { visible } from "../../order/index.ts";

/** Width of every full drawing, and the most height that leaves room for a heading and a caption on Letter; points. */
export const PAGE = { width: 510, height: 640 } as const;
/** Sizes of letters, points. */
export const SIZES = { small: 7, plain: 7.5, heading: 9 } as const;
export const LINE_HEIGHT = 1.28;

/** A drawing with the words that stand under it. */
export interface Figure {
  readonly id: string;
  readonly caption: string;
  readonly drawing: preact.VNode;
}

/** Coordinates to a tenth of a point: finer is not seen. */
export const at = (value: number): number => Math.round(value * 10) / 10 + 0;

export interface DrawingProps {
  readonly id: string;
  readonly title: string;
  /** What is to be seen, for those who do not see it. */
  readonly description: string;
  readonly width?: number;
  readonly height: number;
  readonly children?: ComponentChildren;
}

export function Drawing({ id, title, description, width = PAGE.width, height, children }: DrawingProps) {
  return (
    <svg
      xmlns="http://www.w3.org/2000/svg"
      id={id}
      role="img"
      aria-labelledby={`${id}-title ${id}-desc`}
      viewBox={`0 0 ${at(width)} ${at(height)}`}
      fill="none"
      stroke="#000"
      stroke-width="0.8"
      font-family="sans-serif"
      font-size={SIZES.plain}
    >
      <title id={`${id}-title`}>{visible(title)}</title>
      <desc id={`${id}-desc`}>{visible(description)}</desc>
      {children}
    </svg>
  );
}
