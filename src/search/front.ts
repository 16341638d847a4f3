// The layouts that no other beats in everything: least cost, volume, mass, units and worst unit stress.
//
// A row leaves when another is no worse in all five and better in one. Unknown counts as the worst, never as zero.
// Method: rows beaten by one of a few strong rows leave first; the rest is sorted by cost, and each is held against the front so far,
// which a later row cannot beat. Checked against all pairs in the tests.

import { beats, isBeaten, strongOf } from "./strong.ts";
import { type Figures, figuresAt, type LayoutTable, noFigures } from "./table.ts";

/** Bands of stress: a row need only be held against those of its own band and below. */
const BANDS = 48;

/** Row numbers of the front, by cost. */
export function frontRows(table: LayoutTable): readonly number[] {
  const all = Array.from({ length: table.count }, (_, row) => row);
  const strong = strongOf(table, all, all);
  const figures = noFigures();
  const alive = all.filter((row) => !isBeaten(strong, figuresAt(table, row, figures))).sort(byCost(table));
  const bounds = quantiles(alive.map((row) => table.stress[row] as number));
  const found: Figures[][] = Array.from({ length: BANDS }, () => []);
  const front: number[] = [];
  for (const row of alive) {
    const own = figuresAt(table, row, noFigures());
    let band = 0;
    while (band < BANDS - 1 && own.stress > (bounds[band] as number)) band++;
    if (beatenBy(found[band] as Figures[], own)) continue;
    front.push(row);
    for (let b = band; b < BANDS; b++) (found[b] as Figures[]).push(own);
  }
  return front;
}

/** Upper ends of bands with about as many of the values each. */
function quantiles(values: readonly number[]): readonly number[] {
  const rising = Float64Array.from(values).sort();
  return Array.from({ length: BANDS }, (_, b) => rising[Math.floor(((b + 1) * rising.length) / BANDS) - 1] ?? 0);
}

/** Looks for one of the list that beats `own`; a find moves to the head, because it tends to beat the next ones too. */
function beatenBy(list: Figures[], own: Figures): boolean {
  const at = list.findIndex((one) => beats(one, own));
  if (at > 0) [list[0], list[at]] = [list[at] as Figures, list[0] as Figures];
  return at >= 0;
}

/** By cost, then units, volume, mass, stress: an order in which no row is beaten by a later one. Equals by part and row. */
function byCost({ cost, units, volume, mass, stress, part }: LayoutTable): (a: number, b: number) => number {
  const by = (column: Float64Array | Int32Array, a: number, b: number): number => {
    const [x, y] = [column[a] as number, column[b] as number];
    return x < y ? -1 : x > y ? 1 : 0;
  };
  return (a, b) =>
    by(cost, a, b) ||
    by(units, a, b) ||
    by(volume, a, b) ||
    by(mass, a, b) ||
    by(stress, a, b) ||
    by(part, a, b) ||
    a - b;
}
