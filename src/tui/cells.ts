// Reads a drawn row, text with style codes, into the cells it fills.
import { cellsOf } from "./width.ts";

/** One cell: its character ("" for the right half of a wide one) and its style as the numbers of one `ESC [ ... m`. */
export interface Cell {
  readonly text: string;
  readonly style: string;
}

export const BLANK: Cell = { text: " ", style: "" };

/** Attributes by number, and the number that ends each; 1 and 2 share an end. */
const ATTRIBUTE_END: Readonly<Record<number, number>> = { 1: 22, 2: 22, 3: 23, 4: 24, 7: 27, 9: 29 };

interface Pen {
  attributes: number[];
  ink: string;
  ground: string;
}

const penStyle = (pen: Pen): string => [...pen.attributes, pen.ink, pen.ground].filter((part) => part !== "").join(";");

/** Length of the colour that starts at `at` ("38;5;n" or "38;2;r;g;b"), in numbers. */
const longColour = (numbers: readonly number[], at: number): number => (numbers[at + 1] === 5 ? 3 : 5);

function applyStyle(pen: Pen, parameters: string): void {
  const numbers = parameters === "" ? [0] : parameters.split(";").map(Number);
  for (let i = 0; i < numbers.length; i += 1) {
    const n = numbers[i] ?? 0;
    if (n === 0) Object.assign(pen, { attributes: [], ink: "", ground: "" });
    else if (n === 38 || n === 48) {
      const length = longColour(numbers, i);
      pen[n === 38 ? "ink" : "ground"] = numbers.slice(i, i + length).join(";");
      i += length - 1;
    } else if (n === 39) pen.ink = "";
    else if (n === 49) pen.ground = "";
    else if ((n >= 30 && n <= 37) || (n >= 90 && n <= 97)) pen.ink = String(n);
    else if ((n >= 40 && n <= 47) || (n >= 100 && n <= 107)) pen.ground = String(n);
    else if (ATTRIBUTE_END[n] !== undefined) {
      pen.attributes = [...pen.attributes.filter((a) => a !== n), n].sort((a, b) => a - b);
    } else pen.attributes = pen.attributes.filter((a) => ATTRIBUTE_END[a] !== n);
  }
}

const UNSEEN_ON_BLANKS = /^(?:(?:[123]|3[0-7]|9[0-7])(?:;|$))*$/;

/** A style without inverse, underline, strike or ground looks the same as none on a blank. */
export const isUnseenOnBlanks = (style: string): boolean => UNSEEN_ON_BLANKS.test(style);

const STYLE_CODE = /\x1b\[([\d;]*)m/y;

/**
 * The cells of a row, at most `columns`; shorter rows end where their text ends.
 * A wide character that would stick out is left off; any escape sequence but a style is dropped.
 */
export function rowCells(row: string, columns: number): readonly Cell[] {
  const cells: Cell[] = [];
  const pen: Pen = { attributes: [], ink: "", ground: "" };
  let style = "";
  for (let i = 0; i < row.length; ) {
    if (row[i] === "\x1b") {
      STYLE_CODE.lastIndex = i;
      const code = STYLE_CODE.exec(row);
      if (code) {
        applyStyle(pen, code[1] ?? "");
        style = penStyle(pen);
      }
      i += code ? code[0].length : 1;
      continue;
    }
    const char = String.fromCodePoint(row.codePointAt(i) ?? 0x20);
    i += char.length;
    const width = cellsOf(char);
    if (cells.length + width > columns) break;
    const text = char < " " ? " " : char;
    cells.push({ text, style: text === " " && isUnseenOnBlanks(style) ? "" : style });
    if (width === 2) cells.push({ text: "", style });
  }
  return cells;
}

export const sameCell = (a: Cell, b: Cell): boolean => a.text === b.text && a.style === b.style;
