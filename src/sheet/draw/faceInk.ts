// One piece of the bank face: its cells, the bars or links between them, and the points where the earthing stick is applied.

import { PAGE, SIZES } from "./drawing.tsx";
import { CELL, faceCell, TERMINAL } from "./faceCell.ts";
import { type FacePiece, type FaceProps, positionName, serialAt } from "./facePlan.ts";
import { across, down, type Ink, type Said } from "./ink.ts";
import { potentialOf } from "./potential.ts";
import { shownOrBlank } from "./valueWords.ts";

const NAMES = 46;
const TOP = 12;
/** Right of the last cell. */
const MARGIN = 4;
const STEP = CELL.height + CELL.air;

const range = (from: number, to: number): readonly number[] =>
  Array.from({ length: to - from + 1 }, (_, index) => from + index);

/** Potential of a node in words; a blank where it is not known, words where no end is earthed. */
export function potentialWords(props: FaceProps, node: number): string {
  if (props.earth === "none") return "floats";
  return shownOrBlank(potentialOf(props, node), "voltage");
}

/** The node of a position that is further from earth. */
export const farNode = ({ earth, series }: Pick<FaceProps, "earth" | "series">, row: number): number =>
  earth === "positive" && row <= series ? row - 1 : row;

const endsOf = (polarised: boolean | null): readonly [string, string] => (polarised === true ? ["+", "−"] : ["", ""]);

/** Of each of so many cells in a row. */
export const cellWidth = (columns: number): number =>
  Math.min(CELL.mostWidth, Math.floor((PAGE.width - NAMES - MARGIN) / columns));

export interface FaceDrawn {
  readonly inks: readonly Ink[];
  readonly height: number;
}

/** Height of the row's upper bar; the lowest bar is that of the row under the last. */
const barAt = (high: number, node: number): number => TOP + (high - node) * STEP + CELL.air / 2;

function nodeInk(props: FaceProps, piece: FacePiece, node: number): Ink {
  const { rows, columns } = piece;
  const y = barAt(rows[1], node);
  const left = NAMES;
  const count = columns[1] - columns[0] + 1;
  const width = cellWidth(count);
  const right = NAMES + count * width;
  const terminals = range(1, count).map((column) => NAMES + column * width - TERMINAL);
  const reach = CELL.air / 2;
  const above = node < rows[1] ? terminals.map((x) => down(x, y - reach, y)) : [];
  const below = node >= rows[0] ? terminals.map((x) => down(x, y, y + reach)) : [];
  const isBar = props.ties === "cross-tied" || node === 0 || node === props.series;
  const names: readonly Said[] = [
    { x: left - 8, y: y - 1, text: `TP${node}`, anchor: "end", size: SIZES.small },
    { x: left - 8, y: y + 7, text: potentialWords(props, node), anchor: "end", size: SIZES.small, room: NAMES - 8 },
  ];
  return {
    wires: [...above, ...below],
    rails: isBar ? [across(left, right, y)] : [],
    sticks: isBar ? [{ x: left, y }] : terminals.map((x) => ({ x, y })),
    words: isBar ? names : [],
  };
}

/** The cells of a piece with what joins them. A node at a cut is drawn on both pieces: it is one point. */
export function faceInk(props: FaceProps, piece: FacePiece): FaceDrawn {
  const [low, high] = piece.rows;
  const [from, to] = piece.columns;
  const width = cellWidth(to - from + 1);
  const cells = range(low, high).flatMap((row) =>
    range(from, to).map((column) =>
      faceCell({
        role: "cell",
        x: NAMES + (column - from) * width,
        width,
        y: TOP + (high - row) * STEP + CELL.air,
        name: positionName(props, { row, column }),
        serial: serialAt(props, { row, column }),
        ends: endsOf(props.polarised),
        potential: potentialWords(props, farNode(props, row)),
      }),
    ),
  );
  const nodes = range(low - 1, high).map((node) => nodeInk(props, piece, node));
  return { inks: [...cells, ...nodes], height: TOP + (high - low + 1) * STEP + CELL.air + 8 };
}

/** Spares stand aside, joined to nothing. */
export function spareInk(spares: readonly (string | null)[], first: number, columns: number): FaceDrawn {
  const width = cellWidth(columns);
  const inks = spares.map((serial, index) =>
    faceCell({
      role: "spare",
      x: NAMES + (index % columns) * width,
      width,
      y: TOP + Math.floor(index / columns) * (CELL.height + 6),
      name: `S${first + index}`,
      serial,
      ends: ["", ""],
      potential: "shorted: ___",
    }),
  );
  return { inks, height: TOP + Math.ceil(spares.length / columns) * (CELL.height + 6) };
}
