// Where everything of a bank stands in its drawing: columns of units, rows of stages, and what stands in one cell.
//
// Rows run from the positive end at the top (stage n) down to the negative end (stage 1): stage 1, and place 1 of a string,
// stand at the negative end.

import type { SchematicProps } from "./schematicProps.ts";
import type { Slot } from "./slots.ts";
import { SPAN } from "./symbols.ts";

/** What a cell holds besides its unit. */
export interface CellShape {
  readonly tied: boolean;
  /** In series with the unit, from its positive end. */
  readonly inSeries: readonly ("fuse" | "isolating")[];
  readonly balance: boolean;
  readonly clamps: boolean;
  /** A fuse at the head of each string. */
  readonly stringFuse: boolean;
  readonly polarised: boolean;
}

export function cellShape({ ties, fuse, isolating, balance, clamps, unit }: SchematicProps): CellShape {
  return {
    tied: ties === "cross-tied",
    inSeries: [
      ...(fuse?.at === "unit" ? (["fuse"] as const) : []),
      ...(isolating !== null ? (["isolating"] as const) : []),
    ],
    balance: balance !== null,
    clamps: clamps.positions,
    stringFuse: fuse?.at === "string",
    polarised: unit.polarised !== false,
  };
}

/** Points. */
export const UNIT_WIDTH = 42;
const BESIDE_WIDTH = 14;
const NAMED_WIDTH = 34;
const FOLD_WIDTH = UNIT_WIDTH;
const FOLD_HEIGHT = 30;
const CELL_AIR = 10;
const HEAD = 22;
/** Of the potentials' names, left of a cross-tied bank. */
const NAMES = 44;

/** Room of the resistor, then of the diode, that stand once beside a stage (cross-tied: with its name), or beside each unit. */
export function besides({ tied, balance, clamps }: CellShape): { readonly balance: number; readonly clamp: number } {
  return { balance: balance ? (tied ? NAMED_WIDTH : BESIDE_WIDTH) : 0, clamp: clamps ? BESIDE_WIDTH : 0 };
}
const besideWidth = (shape: CellShape): number => besides(shape).balance + besides(shape).clamp;

/** Width of one column of units, and of what stands left of all columns. */
export const columnWidth = (shape: CellShape): number => UNIT_WIDTH + (shape.tied ? 0 : besideWidth(shape));
export const leftWidth = (shape: CellShape): number => (shape.tied ? NAMES + besideWidth(shape) : 4);
export const cellHeight = ({ inSeries }: CellShape): number => SPAN * (1 + inSeries.length) + CELL_AIR;

/** How many columns fit a width, the fold counted as one. */
export const columnsIn = (shape: CellShape, width: number): number =>
  Math.floor((width - leftWidth(shape)) / Math.max(columnWidth(shape), FOLD_WIDTH));

export interface Track {
  readonly slot: Slot;
  readonly from: number;
  readonly size: number;
}

export interface BlockPlan {
  readonly shape: CellShape;
  /** Left edge, and where the ties begin. */
  readonly left: number;
  readonly ties: number;
  readonly right: number;
  readonly top: number;
  /** Top node of the first row, under the string fuses. */
  readonly body: number;
  readonly bottom: number;
  readonly columns: readonly Track[];
  /** From the top down: the highest stage first. */
  readonly rows: readonly Track[];
}

function tracks(slots: readonly Slot[], start: number, one: number, fold: number): readonly Track[] {
  let from = start;
  return slots.map((slot) => {
    const size = slot.kind === "fold" ? fold : one;
    from += size;
    return { slot, from: from - size, size };
  });
}

export const endOf = ({ from, size }: Pick<Track, "from" | "size">): number => from + size;
const lastEnd = (list: readonly Track[], start: number): number => list.reduce((sum, { size }) => sum + size, start);

export function blockPlan(given: {
  readonly shape: CellShape;
  readonly columns: readonly Slot[];
  /** From 1 up, as numbered. */
  readonly rows: readonly Slot[];
  /** Whether the positive end is among the rows: string fuses stand there. */
  readonly head: boolean;
  readonly x: number;
  readonly y: number;
}): BlockPlan {
  const { shape, x, y } = given;
  const start = x + leftWidth(shape);
  const body = y + (shape.stringFuse && given.head ? HEAD : 0);
  const columns = tracks(given.columns, start, columnWidth(shape), FOLD_WIDTH);
  const rows = tracks([...given.rows].reverse(), body, cellHeight(shape), FOLD_HEIGHT);
  return {
    shape,
    left: x,
    ties: x + (shape.tied ? NAMES : leftWidth(shape)),
    right: lastEnd(columns, start),
    top: y,
    body,
    bottom: lastEnd(rows, body),
    columns,
    rows,
  };
}
