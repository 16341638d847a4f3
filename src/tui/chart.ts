// Lays several curves, lines and marks over each other on one small chart, with what its axes mean written beside it.
import { type PlotRange, type Point, plotBraille } from "./plot.ts";
import { type Row, rowOf, type Span, span } from "./row.ts";
import { fitText } from "./text.ts";
import { textWidth } from "./width.ts";

export interface Curve {
  readonly points: readonly Point[];
  /** A line through the points; else dots, which is how two curves are told apart. */
  readonly joined: boolean;
  /** What the curve is drawn with where there is only ASCII. */
  readonly glyph: string;
}

/** A letter at a point, over all curves. */
export interface Mark {
  readonly at: Point;
  readonly letter: string;
}

/** A level all across, with its words at the axis. */
export interface Level {
  readonly y: number;
  readonly words: string;
}

export interface ChartOptions {
  readonly columns: number;
  readonly rows: number;
  readonly x: PlotRange;
  readonly y: PlotRange;
  readonly curves: readonly Curve[];
  readonly levels?: readonly Level[];
  readonly marks?: readonly Mark[];
  /** Words at the top and the bottom of the upright axis. */
  readonly top: string;
  readonly bottom: string;
  /** Words under the chart, at its left, middle and right. */
  readonly under: readonly [string, string, string];
  readonly ascii: boolean;
}

const BLANK = "\u2800";
/** Dots of a level, one in so many: a dotted line all across. */
const LEVEL_STEP = 2;

/** Cell of a value among `cells` of so many dots each, the first at the low end, where its dot falls too; null outside. */
function cellOf(value: number, { low, high }: PlotRange, cells: number, dots: number): number | null {
  const share = high > low ? (value - low) / (high - low) : 0.5;
  return share >= 0 && share <= 1 ? Math.floor(Math.round(share * (cells * dots - 1)) / dots) : null;
}

/** Braille laid over braille; in ASCII the curve above hides what is beneath. */
function laidOver(under: string, over: string, glyph: string, ascii: boolean): string {
  if (over === BLANK) return under;
  if (ascii) return glyph;
  return String.fromCharCode((under === " " ? 0x2800 : under.charCodeAt(0)) | over.charCodeAt(0));
}

/** The row of a height: 0 is the top. */
const rowAt = (y: number, { y: range, rows }: ChartOptions): number | null => {
  const turned = { low: -range.high, high: -range.low };
  return cellOf(-y, turned, rows, 4);
};

/** Cells of the plot without its axes, row by row. */
function plotCells(options: ChartOptions, columns: number): readonly (readonly string[])[] {
  const { rows, x, y, curves, levels = [], marks = [], ascii } = options;
  const cells = Array.from({ length: rows }, () => Array.from({ length: columns }, () => " "));
  const lay = (points: readonly Point[], joined: boolean, glyph: string): void => {
    for (const [row, line] of plotBraille(points, { columns, rows, x, y, joined }).entries())
      for (const [column, dots] of [...line].entries())
        (cells[row] as string[])[column] = laidOver(cells[row]?.[column] ?? " ", dots, glyph, ascii);
  };
  const dots = columns * 2;
  for (const level of levels) {
    const line = Array.from({ length: Math.ceil(dots / LEVEL_STEP) }, (_, i) => ({
      x: x.low + ((x.high - x.low) * i * LEVEL_STEP) / Math.max(1, dots - 1),
      y: level.y,
    }));
    lay(line, false, "-");
  }
  for (const { points, joined, glyph } of [...curves].reverse()) lay(points, joined, glyph);
  for (const { at, letter } of marks) {
    const column = cellOf(at.x, x, columns, 2);
    const row = rowAt(at.y, options);
    if (column !== null && row !== null) (cells[row] as string[])[column] = letter;
  }
  return cells;
}

/** Words of the axis by row: the ends first, then each level, on a row still free as near as may be. */
function axisWords(options: ChartOptions): readonly string[] {
  const { rows, levels = [], top, bottom } = options;
  const words = Array.from({ length: rows }, () => "");
  words[0] = top;
  if (rows > 1) words[rows - 1] = bottom;
  for (const level of levels) {
    const row = rowAt(level.y, options);
    if (row === null) continue;
    const near = [row, row + 1, row - 1].find((one) => words[one] === "");
    if (near !== undefined) words[near] = level.words;
  }
  return words;
}

/** Three words under a plot, as many as fit without touching. */
function underRow([left, middle, right]: ChartOptions["under"], width: number): string {
  const ends = textWidth(left) + textWidth(right);
  if (ends >= width) return fitText(left, width);
  const room = width - ends;
  const inner = textWidth(middle) + 2 <= room ? middle : "";
  const before = Math.floor((room - textWidth(inner)) / 2);
  return `${left}${" ".repeat(before)}${inner}${" ".repeat(room - textWidth(inner) - before)}${right}`;
}

/** The chart: `rows` rows of plot, and one of words under it. Colour has no part in telling its curves apart. */
export function chartRows(options: ChartOptions): readonly Row[] {
  const { columns, rows, under, ascii } = options;
  if (rows < 1) return [];
  const words = axisWords(options);
  const axis = Math.min(Math.floor(columns / 2), Math.max(...words.map(textWidth)));
  const width = Math.max(1, columns - axis - 2);
  const line = (text: string): Span => span(`${fitText(text, axis, "right", ascii ? "~" : "…")} │`, "quiet");
  const body = plotCells(options, width).map((cells, row) =>
    rowOf(line(words[row] ?? ""), span(cells.join(""), "accent")),
  );
  return [...body, rowOf(span(`${" ".repeat(axis)}  ${underRow(under, width)}`, "quiet"))];
}
