// Draws a quantity against its limit as a bar of characters, the limit a mark on the bar.

export interface BarOptions {
  readonly columns: number;
  /** What the right end stands for. */
  readonly full: number;
  /** Where the mark goes; null leaves it out. */
  readonly limit: number | null;
  readonly ascii: boolean;
}

/** Cell of a value, 0 to columns - 1. */
const cellOf = (value: number, { columns, full }: BarOptions): number =>
  Math.min(columns - 1, Math.max(0, Math.ceil((value / full) * columns) - 1));

/**
 * A bar exactly `columns` long. A value over the limit always covers the mark, one under it never does,
 * however coarse the cells are; a value that is no number draws none.
 */
export function drawBar(value: number, options: BarOptions): string {
  const { columns, full, limit, ascii } = options;
  const [solid, mark, rest] = ascii ? ["#", "|", "."] : ["█", "│", "·"];
  if (columns < 1) return "";
  if (!(full > 0) || !Number.isFinite(value)) return rest.repeat(columns);
  const limitCell = limit === null ? -1 : cellOf(limit, options);
  let filled = value <= 0 ? 0 : cellOf(value, options) + 1;
  if (limit !== null && value <= limit) filled = Math.min(filled, limitCell);
  if (limit !== null && value > limit) filled = Math.max(filled, limitCell + 1);
  let out = "";
  for (let column = 0; column < columns; column += 1) {
    out += column < filled ? solid : column === limitCell ? mark : rest;
  }
  return out;
}
