// The bank drawn unit by unit, cut into pieces that fit a page each, with what stands at each cut.

import { blockPlan, type CellShape, cellHeight, cellShape, columnsIn } from "./blockPlan.ts";
import { PAGE } from "./drawing.tsx";
import type { Ink } from "./ink.ts";
import type { SchematicProps } from "./schematicProps.ts";
import { piecesOf, slotsBetween } from "./slots.ts";
import { stringBlock } from "./stringBlock.ts";
import { type NodeWords, tiedBlock } from "./tiedBlock.ts";

/** Points round the units of a piece. */
const EDGE = 12;

export interface BankPiece {
  readonly inks: readonly Ink[];
  readonly height: number;
  /** "stages 1 to 20, places 1 to 10". */
  readonly words: string;
  readonly units: number;
}

const rangeWords = (thing: string, from: number, to: number): string =>
  from === to ? `${thing} ${from}` : `${thing}s ${from} to ${to}`;

/** What belongs to a stage as a whole is drawn once, in the piece with its first units. */
const shapeAt = (shape: CellShape, firstColumn: number): CellShape =>
  shape.tied && firstColumn > 1 ? { ...shape, balance: false, clamps: false } : shape;

export function bankPieces(props: SchematicProps, nodeWords: NodeWords): readonly BankPiece[] {
  const { series, parallel } = props;
  const shape = cellShape(props);
  const mostColumns = columnsIn(shape, PAGE.width - EDGE);
  const mostRows = Math.floor((PAGE.height - 3 * EDGE - 22) / cellHeight(shape));
  const rows = piecesOf(series, mostRows).toReversed();
  return rows.flatMap(([low, high]) =>
    piecesOf(parallel, mostColumns).map(([from, to]): BankPiece => {
      const plan = blockPlan({
        shape: shapeAt(shape, from),
        columns: slotsBetween(from, to),
        rows: slotsBetween(low, high),
        head: high === series,
        x: EDGE / 2,
        y: EDGE,
      });
      const given = { plan, nodeWords, goesOn: to < parallel };
      const ends = { top: high === series, bottom: low === 1 };
      const across = rangeWords(shape.tied ? "place" : "string", from, to);
      return {
        inks: shape.tied ? tiedBlock(given) : stringBlock(given, ends),
        height: plan.bottom + EDGE,
        words: `${rangeWords(shape.tied ? "stage" : "place", low, high)}, ${across}`,
        units: (high - low + 1) * (to - from + 1),
      };
    }),
  );
}
