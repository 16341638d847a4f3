// Draws a quantity as a bar against several marks, each a letter on the bar: what it is measured by, at one look.

export interface BarMark {
  readonly at: number;
  /** One character. */
  readonly letter: string;
}

export interface MarksBarOptions {
  readonly columns: number;
  /** What the right end stands for. */
  readonly full: number;
  readonly marks: readonly BarMark[];
  readonly ascii: boolean;
}

/** Cell in which a value ends, 0 to columns - 1. */
const cellOf = (value: number, { columns, full }: MarksBarOptions): number =>
  Math.min(columns - 1, Math.max(0, Math.ceil((value / full) * columns) - 1));

/**
 * A bar exactly `columns` long. The letters always stand; the bar reaches past a letter only when the value is over it,
 * however coarse the cells are. Marks with no number, and values with none, are left off.
 */
export function marksBar(value: number, options: MarksBarOptions): string {
  const { columns, full, ascii } = options;
  const [solid, rest] = ascii ? ["#", "."] : ["█", "·"];
  if (columns < 1) return "";
  if (!(full > 0)) return rest.repeat(columns);
  const marks = options.marks.filter(({ at }) => Number.isFinite(at));
  let filled = value > 0 && Number.isFinite(value) ? cellOf(value, options) + 1 : 0;
  for (const { at } of marks) {
    const cell = cellOf(at, options);
    if (value <= at) filled = Math.min(filled, cell);
    else if (value > at) filled = Math.max(filled, Math.min(columns, cell + 2));
  }
  const cells = Array.from({ length: columns }, (_, column) => (column < filled ? solid : rest));
  for (const mark of marks) cells[cellOf(mark.at, options)] = mark.letter;
  return cells.join("");
}
