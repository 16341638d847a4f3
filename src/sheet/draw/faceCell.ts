// One position on the bank face: number, polarity, the higher of its potentials, and the serial or a line to write it on.

import { SIZES } from "./drawing.tsx";
import type { Ink, Spot } from "./ink.ts";

/** Points: most width and height of a cell, and the air in which bars and stick points stand. */
export const CELL = { mostWidth: 92, height: 43, air: 12 } as const;
/** From a cell's right edge to its terminals. */
export const TERMINAL = 9;

export interface FaceCell extends Spot {
  readonly role: "cell" | "spare";
  readonly width: number;
  readonly name: string;
  readonly serial: string | null;
  /** Words at the unit's terminals; empty: none. */
  readonly ends: readonly [positive: string, negative: string];
  readonly potential: string;
}

const SERIAL_LINES = 2;

/** Words on the left, the two terminals on the right. */
export function faceCell({ role, x, y, width, name, serial, ends, potential }: FaceCell): Ink {
  const small = { size: SIZES.small } as const;
  const ruled = { x: x + 3, y: y + 35, toX: x + width - 18, toY: y + 35 };
  const serialWords = { x: x + 3, y: y + 28.5, text: serial ?? "", room: width - 11, lines: SERIAL_LINES, ...small };
  return {
    boxes: [{ role, x, y, width, height: CELL.height }],
    wires: serial === null ? [ruled] : [],
    words: [
      { x: x + 3, y: y + 9.5, text: name, size: SIZES.heading, bold: true, room: width - 14 },
      { x: x + width - 3, y: y + 8, text: ends[0], anchor: "end" as const, ...small },
      { x: x + width - 3, y: y + CELL.height - 2, text: ends[1], anchor: "end" as const, ...small },
      { x: x + 3, y: y + 19, text: potential, room: width - 6, ...small },
      serialWords,
    ].filter(({ text }) => text !== ""),
  };
}
