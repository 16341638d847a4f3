// The layouts that no other beats in everything: least cost, volume, mass, units and worst unit stress.
//
// A row leaves when another is no worse in all five and better in one. Unknown counts as the worst, never as zero.
// Method: rows beaten by one of a few strong pivots leave first; the rest is sorted by cost, and each is held against the front so far,
// which a later row cannot beat. Checked against all pairs in the tests.

import type { LayoutTable } from "./table.ts";

type Columns = readonly [Float64Array, Float64Array, Float64Array, Float64Array, Float64Array];

const columnsOf = (t: LayoutTable): Columns => [t.cost, t.volume, t.mass, t.units, t.stress];

/** True when row `a` is no worse than `b` in all five and better in one. */
function beats([c, v, m, u, s]: Columns, a: number, b: number): boolean {
  if ((s[a] as number) > (s[b] as number) || (c[a] as number) > (c[b] as number)) return false;
  if ((v[a] as number) > (v[b] as number) || (m[a] as number) > (m[b] as number)) return false;
  if ((u[a] as number) > (u[b] as number)) return false;
  return c[a] !== c[b] || s[a] !== s[b] || v[a] !== v[b] || m[a] !== m[b] || u[a] !== u[b];
}

/** Weightings of the log columns that each name one strong row. */
const WEIGHTS: readonly (readonly number[])[] = [
  [1, 0, 0, 0, 0.01],
  [0, 1, 0, 0, 0.01],
  [0, 0, 1, 0, 0.01],
  [0, 0, 0, 1, 0.01],
  [1, 1, 1, 1, 0],
  [1, 1, 1, 1, 1],
  [1, 1, 1, 1, 3],
  [1, 1, 1, 1, 8],
  [3, 1, 1, 1, 4],
  [1, 3, 3, 1, 4],
  [1, 0, 0, 0, 1],
  [1, 0, 0, 0, 3],
  [0, 1, 1, 0, 3],
  [0, 0, 0, 1, 3],
];

function pivotsOf(columns: Columns, count: number): readonly number[] {
  const pivots = new Set<number>();
  const step = Math.max(1, Math.floor(count / 20000));
  const log = (x: number): number => (x === Number.POSITIVE_INFINITY ? 60 : Math.log(x + 1e-12));
  const best = WEIGHTS.map(() => ({ score: Number.POSITIVE_INFINITY, row: -1 }));
  for (let row = 0; row < count; row += step) {
    const logs = columns.map((column) => log(column[row] as number));
    WEIGHTS.forEach((weights, w) => {
      const score = weights.reduce((sum, weight, k) => sum + weight * (logs[k] as number), 0);
      const held = best[w] as { score: number; row: number };
      if (score < held.score) {
        held.score = score;
        held.row = row;
      }
    });
  }
  for (const { row } of best) if (row >= 0) pivots.add(row);
  return [...pivots];
}

/** Row numbers of the front, by cost. */
export function frontRows(table: LayoutTable): readonly number[] {
  const columns = columnsOf(table);
  const pivots = pivotsOf(columns, table.count);
  const alive: number[] = [];
  for (let row = 0; row < table.count; row++) {
    let beaten = false;
    for (let k = 0; k < pivots.length && !beaten; k++) beaten = beats(columns, pivots[k] as number, row);
    if (!beaten) alive.push(row);
  }
  const order = sortByCost(alive, columns);
  const front: number[] = [];
  for (const row of order) {
    let beaten = false;
    for (let k = front.length - 1; k >= 0; k--) {
      if (!beats(columns, front[k] as number, row)) continue;
      beaten = true;
      // The row that beats one tends to beat its neighbours: keep it at the end, where the next look begins.
      const strong = front[k] as number;
      front[k] = front[front.length - 1] as number;
      front[front.length - 1] = strong;
      break;
    }
    if (!beaten) front.push(row);
  }
  return sortByCost(front, columns);
}

/** By cost, then units, volume, mass, stress, row: an order in which no row is beaten by a later one. */
function sortByCost(rows: number[], [c, v, m, u, s]: Columns): number[] {
  const by = (column: Float64Array, a: number, b: number): number => {
    const [x, y] = [column[a] as number, column[b] as number];
    return x < y ? -1 : x > y ? 1 : 0;
  };
  return rows.sort((a, b) => by(c, a, b) || by(u, a, b) || by(v, a, b) || by(m, a, b) || by(s, a, b) || a - b);
}
