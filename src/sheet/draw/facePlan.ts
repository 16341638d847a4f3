// What a bank face is drawn from, and its cut into pieces: which positions stand on which page, and which serial where.
//
// Rows run from the positive end at the top down to the negative end, as in the schematic: row 1 is the lowest.

import type { Ties } from "../../bank/index.ts";
import type { Earth } from "./schematicProps.ts";
import { piecesOf } from "./slots.ts";

/** Most cells that one piece of a face may hold, across and down. */
export interface PieceSize {
  readonly columns: number;
  readonly rows: number;
}

/** What A4 and Letter hold upright, with letters of 7 pt; more is cut down to it. */
export const FACE_PIECE: PieceSize = { columns: 8, rows: 10 };

export interface FaceProps {
  /** Starts every id inside the drawing: letters, digits, hyphens. */
  readonly id: string;
  readonly title: string;
  readonly series: number;
  readonly parallel: number;
  readonly ties: Ties;
  /** Serials by stage (cross-tied) or by string, as a placing gives them; null, or what is missing, is a line to fill in. */
  readonly groups: readonly (readonly (string | null)[])[] | null;
  /** Serials of the spares; null is a line to fill in. */
  readonly spares: readonly (string | null)[];
  readonly polarised: boolean | null;
  /** V with overshoot; potentials are even shares of it. */
  readonly chargeVoltage: number | null;
  readonly earth: Earth;
  readonly piece: PieceSize;
}

/** A position by its height in the bank and its column, both from 1. */
export interface FacePlace {
  readonly row: number;
  readonly column: number;
}

type Placed = Pick<FaceProps, "ties" | "groups">;

/** "3.7": stage and place in it, or string and place in it. */
export const positionName = ({ ties }: Pick<Placed, "ties">, { row, column }: FacePlace): string =>
  ties === "cross-tied" ? `${row}.${column}` : `${column}.${row}`;

/** The serial that stands there; null: not known. */
export function serialAt({ ties, groups }: Placed, { row, column }: FacePlace): string | null {
  const [group, place] = ties === "cross-tied" ? [row, column] : [column, row];
  const serial = groups?.[group - 1]?.[place - 1] ?? null;
  return serial === null || serial.trim() === "" ? null : serial;
}

export interface FacePiece {
  /** First and last row, first and last column. */
  readonly rows: readonly [low: number, high: number];
  readonly columns: readonly [from: number, to: number];
}

const sizeWithin = ({ columns, rows }: PieceSize): PieceSize => ({
  columns: Math.min(Math.max(Math.floor(columns), 1), FACE_PIECE.columns),
  rows: Math.min(Math.max(Math.floor(rows), 1), FACE_PIECE.rows),
});

/** Pieces from the positive end down, each row of them from the first column on. */
export function facePieces({
  series,
  parallel,
  piece,
}: Pick<FaceProps, "series" | "parallel" | "piece">): readonly FacePiece[] {
  const size = sizeWithin(piece);
  const columns = piecesOf(parallel, size.columns);
  return piecesOf(series, size.rows)
    .toReversed()
    .flatMap((rows) => columns.map((across) => ({ rows, columns: across })));
}

/** The spares, so many to a piece. */
export function sparePieces({
  spares,
  piece,
}: Pick<FaceProps, "spares" | "piece">): readonly (readonly (string | null)[])[] {
  const { columns, rows } = sizeWithin(piece);
  return spares.length === 0
    ? []
    : piecesOf(spares.length, columns * rows).map(([from, to]) => spares.slice(from - 1, to));
}
