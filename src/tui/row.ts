// Composes one row of the screen from spans of styled text, exactly as wide as the screen.
import type { Look } from "./terminal.ts";
import { cutText, drawnText } from "./text.ts";
import { type StyleName, styled } from "./theme.ts";
import { textWidth } from "./width.ts";

export interface Span {
  readonly text: string;
  readonly style: StyleName;
}

/** A row before it is fitted: spans from the left, and spans kept at the right edge while there is room. */
export interface Row {
  readonly left: readonly Span[];
  readonly right?: readonly Span[];
}

export const span = (text: string, style: StyleName = "plain"): Span => ({ text, style });
export const rowOf = (...left: readonly Span[]): Row => ({ left });
export const EMPTY_ROW: Row = { left: [] };

interface Piece {
  readonly text: string;
  readonly width: number;
  readonly style: StyleName;
}

function pieces(spans: readonly Span[], ascii: boolean): readonly Piece[] {
  return spans.map(({ text, style }) => {
    const drawn = drawnText(text, ascii);
    return { text: drawn, width: textWidth(drawn), style };
  });
}

const widthOf = (list: readonly Piece[]): number => list.reduce((sum, piece) => sum + piece.width, 0);

const drawn = new WeakMap<Row, { readonly columns: number; readonly look: Look; readonly text: string }>();

/** The row as text, worked out once for a row that stays the same object while a list scrolls. */
export function drawRow(row: Row, columns: number, look: Look): string {
  const known = drawn.get(row);
  if (known !== undefined && known.columns === columns && known.look === look) return known.text;
  const text = composed(row, columns, look);
  drawn.set(row, { columns, look, text });
  return text;
}

/** The row as text with style codes, at most `columns` cells; the right part gives way before the left is cut. */
function composed(row: Row, columns: number, look: Look): string {
  const left = pieces(row.left, look.ascii);
  const right = pieces(row.right ?? [], look.ascii);
  const mark = look.ascii ? "~" : "…";
  const fits = right.length > 0 && widthOf(left) + 1 + widthOf(right) <= columns;
  let out = "";
  let used = 0;
  const put = (piece: Piece): void => {
    if (used >= columns || piece.width === 0) return;
    const text = piece.width <= columns - used ? piece.text : cutText(piece.text, columns - used, mark);
    out += styled(text, piece.style, look);
    used += textWidth(text);
    if (text !== piece.text) used = columns;
  };
  for (const piece of left) put(piece);
  if (fits) {
    const gap = columns - used - widthOf(right);
    out += " ".repeat(gap);
    used += gap;
    for (const piece of right) put(piece);
  }
  return out;
}
