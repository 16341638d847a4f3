// Draws points and lines on a grid of braille cells, two dots wide and four high each.

export interface Point {
  readonly x: number;
  readonly y: number;
}

export interface PlotRange {
  readonly low: number;
  readonly high: number;
}

export interface PlotOptions {
  readonly columns: number;
  readonly rows: number;
  readonly x: PlotRange;
  readonly y: PlotRange;
  /** Joins each point to the next by a line. */
  readonly joined: boolean;
}

/** Bit of each dot of a braille cell, by dot row and dot column (Unicode block 2800). */
const DOT_BITS: readonly (readonly [number, number])[] = [
  [0x01, 0x08],
  [0x02, 0x10],
  [0x04, 0x20],
  [0x40, 0x80],
];

/** Share of the range, 0 to 1; a range with no width puts everything in its middle. */
const shareOf = (value: number, { low, high }: PlotRange): number =>
  high > low ? (value - low) / (high - low) : value === low ? 0.5 : Number.NaN;

/** Rows of braille, the first on top. Points outside the ranges, and points that are no number, are left off. */
export function plotBraille(points: readonly Point[], options: PlotOptions): readonly string[] {
  const { columns, rows, x, y, joined } = options;
  if (columns < 1 || rows < 1) return [];
  const wide = columns * 2;
  const high = rows * 4;
  const grid = Array.from({ length: rows }, () => new Uint8Array(columns));
  const dot = (dotX: number, dotY: number): void => {
    const bits = DOT_BITS[dotY % 4];
    const line = grid[Math.floor(dotY / 4)];
    const column = Math.floor(dotX / 2);
    if (bits && line) line[column] = (line[column] ?? 0) | (bits[dotX % 2] ?? 0);
  };
  let last: readonly [number, number] | null = null;
  for (const point of points) {
    const across = shareOf(point.x, x);
    const up = shareOf(point.y, y);
    if (!(across >= 0 && across <= 1 && up >= 0 && up <= 1)) {
      last = null;
      continue;
    }
    const here = [Math.round(across * (wide - 1)), Math.round((1 - up) * (high - 1))] as const;
    const from: readonly [number, number] = joined && last !== null ? last : here;
    const steps = Math.max(Math.abs(here[0] - from[0]), Math.abs(here[1] - from[1]), 1);
    for (let step = 0; step <= steps; step += 1) {
      const share = step / steps;
      dot(Math.round(from[0] + (here[0] - from[0]) * share), Math.round(from[1] + (here[1] - from[1]) * share));
    }
    last = here;
  }
  return grid.map((line) => String.fromCharCode(...[...line].map((bits) => 0x2800 + bits)));
}
