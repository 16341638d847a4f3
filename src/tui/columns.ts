// Lays out a table: which columns there is room for, and each row's spans.
import { type Row, type Span, span } from "./row.ts";
import { fitText, type Side, safeText } from "./text.ts";
import { textWidth } from "./width.ts";

export interface Column<T> {
  readonly title: string;
  readonly width: number;
  readonly side: Side;
  /** Which columns go first when there is little room: the highest number. 0 always stays. */
  readonly priority: number;
  readonly cell: (item: T) => Span;
}

/** Each column as narrow as its longest cell and its title let it be, never wider than it says. */
export const snug = <T>(columns: readonly Column<T>[], items: readonly T[]): readonly Column<T>[] =>
  columns.map((column) => {
    let longest = textWidth(column.title);
    for (const item of items) longest = Math.max(longest, textWidth(safeText(column.cell(item).text)));
    return { ...column, width: Math.min(column.width, longest) };
  });

/** The columns that fit, in their own order, the least wanted left out. One blank between two. */
export function columnsFor<T>(columns: readonly Column<T>[], width: number): readonly Column<T>[] {
  const byPriority = [...columns].sort((a, b) => a.priority - b.priority);
  const kept = new Set<Column<T>>();
  let used = -1;
  for (const column of byPriority) {
    if (column.priority > 0 && used + 1 + column.width > width) continue;
    kept.add(column);
    used += 1 + column.width;
  }
  return columns.filter((column) => kept.has(column));
}

/** Gives what is left over to one column, up to a most. */
export function widen<T>(
  columns: readonly Column<T>[],
  title: string,
  width: number,
  most: number,
): readonly Column<T>[] {
  const used = columns.reduce((sum, column) => sum + column.width + 1, -1);
  const spare = Math.max(0, width - used);
  return columns.map((column) =>
    column.title === title
      ? { ...column, width: Math.max(column.width, Math.min(most, column.width + spare)) }
      : column,
  );
}

const joined = (spans: readonly Span[]): Row => ({
  left: spans.flatMap((cell, index) => (index === 0 ? [cell] : [span(" "), cell])),
});

export const headingRow = <T>(columns: readonly Column<T>[]): Row =>
  joined(columns.map(({ title, width, side }) => span(fitText(title, width, side), "quiet")));

export const tableRow = <T>(columns: readonly Column<T>[], item: T): Row =>
  joined(
    columns.map(({ width, side, cell }) => {
      const { text, style } = cell(item);
      return span(fitText(safeText(text), width, side), style);
    }),
  );
