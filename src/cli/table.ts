// Rows to aligned text within a width: columns that matter least leave first, and the one that may be cut is cut.

import { visible } from "../order/index.ts";
import { cut, pad, type Side, widthOf } from "./wrap.ts";

export interface TextColumn<Row> {
  readonly heading: string;
  readonly cell: (row: Row, index: number) => string;
  readonly side?: Side;
  /** May be cut, down to this many columns. */
  readonly least?: number;
  /** Leaves when the table is too wide, the highest first: from 2 before anything is cut, 1 after, 0 never. */
  readonly rank?: number;
}

const GAP = "  ";

/** A table with a heading row. Cells are made safe to print. Wider than `width` only when no column may leave or be cut further. */
export function textTable<Row>(
  columns: readonly TextColumn<Row>[],
  rows: readonly Row[],
  width: number,
  indent = "",
): string {
  const filled = columns.map((column) => ({ column, cells: rows.map((row, i) => visible(column.cell(row, i))) }));
  const wide = ({ column, cells }: (typeof filled)[number]): number =>
    cells.reduce((most, cell) => Math.max(most, widthOf(cell)), widthOf(column.heading));
  let shown = filled.map((one) => ({ ...one, width: wide(one) }));
  const total = (): number =>
    indent.length + shown.reduce((sum, one) => sum + one.width, 0) + GAP.length * (shown.length - 1);
  for (;;) {
    const over = total() - width;
    if (over <= 0) break;
    const softest = shown.find((one) => one.column.least !== undefined && one.width > one.column.least);
    const room = softest ? softest.width - (softest.column.least as number) : 0;
    const leaving = shown.reduce((most, one) => Math.max(most, one.column.rank ?? 0), 0);
    if (softest && leaving < 2) {
      softest.width -= Math.min(room, over);
      continue;
    }
    if (leaving === 0) break;
    const last = shown.findLastIndex((one) => (one.column.rank ?? 0) === leaving);
    shown = shown.filter((_, i) => i !== last);
  }
  const line = (texts: readonly string[]): string =>
    (
      indent +
      texts
        .map((text, i) => pad(cut(text, shown[i]?.width ?? 0), shown[i]?.width ?? 0, shown[i]?.column.side))
        .join(GAP)
    ).trimEnd();
  const head = line(shown.map((one) => one.column.heading));
  return [head, ...rows.map((_, r) => line(shown.map((one) => one.cells[r] ?? "")))].join("\n");
}
