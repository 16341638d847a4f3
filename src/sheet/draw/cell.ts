// One position of the bank in a schematic: fuse and isolating resistor in series, the unit, and its name.

import { type CellShape, columnWidth, UNIT_WIDTH } from "./blockPlan.ts";
import { SIZES } from "./drawing.tsx";
import { down, type Ink, type Line } from "./ink.ts";
import { SPAN, type SymbolName } from "./symbols.ts";

const NAMES = { fuse: "fuse", isolating: "resistor" } as const;
/** From the right edge of what stands beside a unit to its current's path. */
const AXIS = 7;

export interface CellPlace {
  readonly shape: CellShape;
  readonly x: number;
  readonly y: number;
  readonly height: number;
}

export const axisOf = (shape: CellShape, x: number): number => x + columnWidth(shape) - UNIT_WIDTH + AXIS;

/** Where the unit of a cell begins, under what is in series with it. */
export function unitTop({ shape, y, height }: CellPlace): number {
  const chain = SPAN * (1 + shape.inSeries.length);
  return y + (height - chain) / 2 + chain - SPAN;
}

export function cellInk(place: CellPlace, name: string): Ink {
  const { shape, y, height } = place;
  const axis = axisOf(shape, place.x);
  const top = unitTop(place);
  const first = top - SPAN * shape.inSeries.length;
  const middle = top + SPAN / 2;
  return {
    wires: [down(axis, y, first), down(axis, top + SPAN, y + height)],
    marks: [
      ...shape.inSeries.map((role, index) => ({
        role,
        name: NAMES[role],
        x: axis,
        y: first + SPAN * index,
        way: "down" as const,
      })),
      { role: "unit", name: "capacitor", x: axis, y: top, way: "down" },
      ...(shape.polarised
        ? [{ role: "plus", name: "plus", x: axis - 4.6, y: middle - 4.8, way: "right" } as const]
        : []),
    ],
    words: [{ x: axis + 7, y: middle + 2.5, text: name, size: SIZES.small }],
  };
}

/** A symbol between two heights, in the middle of its wires. A diode goes up: its cathode is at the positive end. */
export function between(given: {
  readonly role: string;
  readonly name: SymbolName;
  readonly x: number;
  readonly top: number;
  readonly bottom: number;
}): Ink {
  const { role, name, x, top, bottom } = given;
  const from = (top + bottom - SPAN) / 2;
  const wires: readonly Line[] = [down(x, top, from), down(x, from + SPAN, bottom)];
  const up = name === "diode";
  return { wires, marks: [{ role, name, x, y: up ? from + SPAN : from, way: up ? "up" : "down" }] };
}
