// The layouts that no other beats in everything: least cost, volume, mass, units and worst unit stress.
//
// A row leaves when another is no worse in all five and better in one. Unknown counts as the worst, never as zero.
// Method: rows beaten by one of a few strong rows of their band of stress leave first; the rest is sorted by cost, and each is held against
// the front so far, which a later row cannot beat. Checked against all pairs in the tests.

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

/** Weightings of log cost, volume, mass and units; each names one strong row in each band of stress. */
const WEIGHTS: readonly (readonly [number, number, number, number])[] = [
  [1, 0, 0, 0],
  [0, 1, 0, 0],
  [0, 0, 1, 0],
  [0, 0, 0, 1],
  [1, 1, 1, 1],
  [3, 1, 1, 1],
  [1, 3, 3, 1],
  [1, 0, 0, 2],
];

/** Bands of stress with about as many rows each. */
const BANDS = 48;
/** Steps of stress from 0 to 1 that bands are made of; what lies above, or is unknown, goes to the last. */
const STEPS = 4096;
const stepOf = (stress: number): number => (stress < 1 ? Math.floor(stress * STEPS) : STEPS - 1);

/** Rows looked at to find the strong ones; every row is still judged. */
const SAMPLE = 20_000;

interface Banding {
  readonly bands: Uint8Array;
  /** Every how manieth row is looked at. */
  readonly stride: number;
}

/** The band of each step of stress, rising with it, from a sample of the rows. */
function bandsOf(stress: Float64Array, count: number, stride: number): Uint8Array {
  const seen = new Uint32Array(STEPS);
  let total = 0;
  for (let row = 0; row < count; row += stride, total++) seen[stepOf(stress[row] as number)]! += 1;
  let below = 0;
  return Uint8Array.from(seen, (here) => {
    const band = Math.min(BANDS - 1, Math.floor((below * BANDS) / Math.max(1, total)));
    below += here;
    return band;
  });
}

/** For each band, a few rows of no higher band that are strong in cost, volume, mass and units. */
function strongRows(columns: Columns, count: number, { bands, stride }: Banding): readonly number[][] {
  const log = (x: number): number => (x === Number.POSITIVE_INFINITY ? 60 : Math.log(x + 1e-12));
  const [cost, volume, mass, units, stress] = columns;
  const best = Array.from({ length: BANDS }, () => new Float64Array(WEIGHTS.length).fill(Number.POSITIVE_INFINITY));
  const rows = Array.from({ length: BANDS }, () => new Int32Array(WEIGHTS.length).fill(-1));
  for (let row = 0; row < count; row += stride) {
    const band = bands[stepOf(stress[row] as number)] as number;
    const c = log(cost[row] as number);
    const v = log(volume[row] as number);
    const m = log(mass[row] as number);
    const u = log(units[row] as number);
    const scores = best[band] as Float64Array;
    for (let w = 0; w < WEIGHTS.length; w++) {
      const [a, b, d, e] = WEIGHTS[w] as readonly [number, number, number, number];
      const score = a * c + b * v + d * m + e * u;
      if (score >= (scores[w] as number)) continue;
      scores[w] = score;
      (rows[band] as Int32Array)[w] = row;
    }
  }
  return best.map((scores, band) => {
    for (let w = 0; band > 0 && w < WEIGHTS.length; w++) {
      const below = best[band - 1]?.[w] as number;
      if (below >= (scores[w] as number)) continue;
      scores[w] = below;
      (rows[band] as Int32Array)[w] = rows[band - 1]?.[w] as number;
    }
    return [...new Set([...(rows[band] as Int32Array), ...(band > 0 ? (rows[band - 1] as Int32Array) : [])])].filter(
      (row) => row >= 0,
    );
  });
}

/** Looks for a row of `list` that beats `row`; a find moves to the head, because it tends to beat the next one too. */
function beatenBy(columns: Columns, list: number[], row: number): boolean {
  for (let k = 0; k < list.length; k++) {
    const strong = list[k] as number;
    if (!beats(columns, strong, row)) continue;
    if (k > 0) {
      list[k] = list[0] as number;
      list[0] = strong;
    }
    return true;
  }
  return false;
}

/** How many rows that nothing has beaten yet a band remembers, besides its strong ones. */
const ARCHIVE = 64;

/** Row numbers of the front, by cost. */
export function frontRows(table: LayoutTable): readonly number[] {
  const columns = columnsOf(table);
  const stress = columns[4];
  const stride = Math.max(1, Math.floor(table.count / SAMPLE));
  const bands = bandsOf(stress, table.count, stride);
  const strong = strongRows(columns, table.count, { bands, stride });
  const most = strong.map((list) => list.length + ARCHIVE);
  const alive: number[] = [];
  for (let row = 0; row < table.count; row++) {
    const band = bands[stepOf(stress[row] as number)] as number;
    const list = strong[band] as number[];
    if (beatenBy(columns, list, row)) continue;
    alive.push(row);
    if (list.length < (most[band] as number)) list.push(row);
  }
  const front: number[] = [];
  const found: number[][] = Array.from({ length: BANDS }, () => []);
  for (const row of sortByCost(alive, columns)) {
    const band = bands[stepOf(stress[row] as number)] as number;
    if (beatenBy(columns, found[band] as number[], row)) continue;
    front.push(row);
    for (let b = band; b < BANDS; b++) (found[b] as number[]).push(row);
  }
  return front;
}

/** By cost, then units, volume, mass, stress, row: an order in which no row is beaten by a later one. */
function sortByCost(rows: number[], [c, v, m, u, s]: Columns): number[] {
  const by = (column: Float64Array, a: number, b: number): number => {
    const [x, y] = [column[a] as number, column[b] as number];
    return x < y ? -1 : x > y ? 1 : 0;
  };
  return rows.sort((a, b) => by(c, a, b) || by(u, a, b) || by(v, a, b) || by(m, a, b) || by(s, a, b) || a - b);
}
