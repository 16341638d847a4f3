// Paints frames on a terminal by writing only the cells that changed, each run at its own absolute place.
import { EventEmitter } from "node:events";
import { BLANK, type Cell, isUnseenOnBlanks, rowCells, sameCell } from "./cells.ts";

/** Cells equal to the old ones between two changed runs that are cheaper to write again than to jump over. */
const CHEAPER_THAN_A_JUMP = 6;

/** Where the terminal's own cursor stands, from 0; null hides it. */
export type Caret = { readonly row: number; readonly column: number } | null;

const cellAt = (cells: readonly Cell[], column: number): Cell => cells[column] ?? BLANK;

/** Writes cells `from` to `to` of a row, setting each style where it begins and leaving the plain one. */
function writeRun(cells: readonly Cell[], from: number, to: number): string {
  let out = "";
  let style = "";
  for (let column = from; column < to; column += 1) {
    const cell = cellAt(cells, column);
    const keeps = cell.text === " " && cell.style === "" && isUnseenOnBlanks(style);
    if (cell.style !== style && !keeps) {
      // An absent number is nought, which takes all styles away: a byte less than saying it.
      out += style === "" ? `\x1b[${cell.style}m` : `\x1b[${cell.style === "" ? "" : `;${cell.style}`}m`;
      style = cell.style;
    }
    out += cell.text;
  }
  return style === "" ? out : `${out}\x1b[m`;
}

/** What turns one row of cells into another; empty when they look alike. */
function rowChange(before: readonly Cell[], after: readonly Cell[], row: number): string {
  const end = Math.max(before.length, after.length);
  let filled = after.length;
  while (filled > 0 && sameCell(cellAt(after, filled - 1), BLANK)) filled -= 1;
  let out = "";
  /** Within a row the column alone is told, which is shorter and as absolute. */
  const place = (column: number): string => (out === "" ? `\x1b[${row + 1};${column + 1}H` : `\x1b[${column + 1}G`);
  for (let column = 0; column < end; ) {
    if (sameCell(cellAt(before, column), cellAt(after, column))) {
      column += 1;
      continue;
    }
    // Never start inside a wide character, old or new: half of one cannot be written.
    let from = column;
    while (from > 0 && (cellAt(before, from).text === "" || cellAt(after, from).text === "")) from -= 1;
    if (from >= filled) return `${out}${place(from)}\x1b[K`;
    let to = column + 1;
    for (let look = to; look < filled && look - to < CHEAPER_THAN_A_JUMP; look += 1) {
      if (!sameCell(cellAt(before, look), cellAt(after, look))) to = look + 1;
    }
    while (to < end && (cellAt(before, to).text === "" || cellAt(after, to).text === "")) to += 1;
    out += `${place(from)}${writeRun(after, from, to)}`;
    column = to;
  }
  return out;
}

export interface Size {
  readonly columns: number;
  readonly rows: number;
}

export interface StyledRow {
  readonly plain: string;
  readonly text: string;
}

/**
 * Stands where ink expects standard output. Each write is one whole frame, rows parted by newlines.
 * It says it is no terminal, so that ink writes frames and nothing else.
 */
export class PaintStream extends EventEmitter {
  readonly isTTY = false;
  columns: number;
  rows: number;
  caret: Caret = null;
  /** The rows that were given to ink as plain text, with their styles: laying out styled text takes ink twice as long. */
  styled: readonly StyledRow[] = [];
  /** What stands on the terminal; null: not known, so clear first. */
  #shown: string[] | null = null;
  #given: readonly string[] = [];
  #shownCells: (readonly Cell[])[] = [];
  #shownCaret: Caret = null;
  #open = true;
  readonly #out: (text: string) => void;

  constructor(size: Size, out: (text: string) => void) {
    super();
    this.columns = size.columns;
    this.rows = size.rows;
    this.#out = out;
  }

  /** After this nothing is written: ink draws a last frame as it goes, which must not land in the user's shell. */
  close(): void {
    this.#open = false;
  }

  /** The screen may hold anything (another program, a new size): draw all of the next frame. */
  forget(): void {
    this.#shown = null;
  }

  resize(size: Size): void {
    this.columns = size.columns;
    this.rows = size.rows;
    this.forget();
  }

  /** Draws the last frame again in full, and the caret where it should be. */
  redraw(): void {
    this.forget();
    this.paint(this.#given);
  }

  /** Moves the caret when ink found nothing new to write. */
  settle(): void {
    const caret = this.#open && this.#shown !== null ? this.#caretChange(false) : "";
    if (caret !== "") this.#out(caret);
  }

  /** A frame of ink's layout: its rows are known by their plain text, and are painted in the styles that they were given with. */
  write(frame: string): boolean {
    const styled = this.styled;
    this.paint(
      frame
        .split("\n")
        .map((line, row) => (line === styled[row]?.plain.trimEnd() ? (styled[row]?.text ?? line) : line)),
    );
    return true;
  }

  paint(rows: readonly string[]): void {
    if (!this.#open) return;
    this.#given = rows;
    const fresh = this.#shown === null;
    const shown = this.#shown ?? [];
    if (fresh) {
      this.#shownCells = [];
      this.#shownCaret = null;
    }
    let out = fresh ? "\x1b[?25l\x1b[0m\x1b[2J" : "";
    for (let row = 0; row < this.rows; row += 1) {
      const text = rows[row] ?? "";
      if (!fresh && text === shown[row]) continue;
      const cells = rowCells(text, this.columns);
      out += rowChange(this.#shownCells[row] ?? [], cells, row);
      this.#shownCells[row] = cells;
    }
    this.#shown = Array.from({ length: this.rows }, (_, row) => rows[row] ?? "");
    const caret = this.#caretChange(out !== "");
    if (out + caret !== "") this.#out(`\x1b[?2026h${out}${caret}\x1b[?2026l`);
  }

  #caretChange(moved: boolean): string {
    const { caret } = this;
    const before = this.#shownCaret;
    this.#shownCaret = caret;
    if (caret === null) return before === null ? "" : "\x1b[?25l";
    const place = `\x1b[${caret.row + 1};${caret.column + 1}H`;
    if (before === null) return `${place}\x1b[?25h`;
    return moved || before.row !== caret.row || before.column !== caret.column ? place : "";
  }
}
