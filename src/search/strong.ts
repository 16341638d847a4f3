// A few rows strong enough to beat most layouts: the quick and sure way to say that a layout is not on the front.
//
// Chosen one at a time, each the one that beats most of what those before it leave of a sample. Thirty of them beat nine layouts in ten of a
// large catalogue, most of those by the first three.

import { type Figures, figuresAt, type LayoutTable, noFigures } from "./table.ts";

/** True when `a` is no worse than `b` in all five figures and better in one. Unknown counts as the worst, never as zero. */
export function beats(a: Readonly<Figures>, b: Readonly<Figures>): boolean {
  if (a.stress > b.stress || a.cost > b.cost || a.units > b.units || a.volume > b.volume || a.mass > b.mass)
    return false;
  return a.cost < b.cost || a.stress < b.stress || a.units < b.units || a.volume < b.volume || a.mass < b.mass;
}

/** At most so many are chosen. */
const MOST = 64;
/** Rows that they are tried on at most, for a work large enough; they are chosen from half as many. */
const TRIED = 1024;

/** Figures of some rows one after another: stress, cost, units, volume, mass of each. */
type Packed = Float64Array;
const WIDTH = 5;

export interface Strong {
  /** By rising stress. */
  readonly rows: Packed;
  /** Where the one stands that beat last: it tends to beat the next figures too. */
  last: number;
}

/** At most so many of the rows, evenly. */
function evenly(rows: readonly number[], most: number): readonly number[] {
  const stride = Math.ceil(rows.length / most);
  return stride <= 1 ? rows : rows.filter((_, i) => i % stride === 0);
}

function packed({ stress, cost, units, volume, mass }: LayoutTable, rows: readonly number[]): Packed {
  const all = new Float64Array(rows.length * WIDTH);
  rows.forEach((row, i) => {
    for (const [k, column] of [stress, cost, units, volume, mass].entries()) all[i * WIDTH + k] = column[row] as number;
  });
  return all;
}

/** True when the layout at `k` is no worse in all five figures and better in one. Unknown counts as the worst, never as zero. */
function beatsFrom(all: Packed, k: number, { stress, cost, units, volume, mass }: Readonly<Figures>): boolean {
  const s = all[k] as number;
  const c = all[k + 1] as number;
  if (s > stress || c > cost) return false;
  const u = all[k + 2] as number;
  const v = all[k + 3] as number;
  const m = all[k + 4] as number;
  if (u > units || v > volume || m > mass) return false;
  return c < cost || s < stress || u < units || v < volume || m < mass;
}

/** True when one of the strong layouts beats these figures, and so whatever is worse than them. */
export function isBeaten(strong: Strong, figures: Readonly<Figures>): boolean {
  const { rows, last } = strong;
  if (last < rows.length && beatsFrom(rows, last, figures)) return true;
  const { stress } = figures;
  for (let k = 0; k < rows.length && (rows[k] as number) <= stress; k += WIDTH) {
    if (!beatsFrom(rows, k, figures)) continue;
    strong.last = k;
    return true;
  }
  return false;
}

export interface StrongSearch {
  readonly candidates: readonly number[];
  readonly tried: readonly number[];
  /** How many rows the strong ones will be held against: a small work is not worth a long choice. */
  readonly ahead: number;
}

/** The strong rows among `candidates`, by how they fare against the rows `tried`. */
export function strongOf(table: LayoutTable, { candidates, tried, ahead }: StrongSearch): Strong {
  const effort = Math.ceil(Math.min(TRIED, ahead / 100));
  const rows = evenly(candidates, Math.ceil(effort / 2));
  const sample = evenly(tried, effort);
  const all = packed(table, rows);
  const figures = noFigures();
  // One mark for each candidate and each row of the sample that it beats, while none of the chosen does.
  const marks = new Uint8Array(rows.length * sample.length);
  const counts = new Int32Array(rows.length);
  for (let t = 0; t < sample.length; t++) {
    figuresAt(table, sample[t] as number, figures);
    for (let c = 0; c < rows.length; c++) {
      if (!beatsFrom(all, c * WIDTH, figures)) continue;
      marks[t * rows.length + c] = 1;
      counts[c]! += 1;
    }
  }
  const chosen: number[] = [];
  while (chosen.length < MOST) {
    let best = 0;
    for (let c = 1; c < rows.length; c++) if ((counts[c] as number) > (counts[best] as number)) best = c;
    if (!((counts[best] as number) > 0)) break;
    chosen.push(rows[best] as number);
    for (let from = 0; from < marks.length; from += rows.length) {
      if (marks[from + best] !== 1) continue;
      for (let c = 0; c < rows.length; c++) counts[c]! -= marks[from + c] as number;
      marks.fill(0, from, from + rows.length);
    }
  }
  chosen.sort((a, b) => (table.stress[a] as number) - (table.stress[b] as number));
  return { rows: packed(table, chosen), last: 0 };
}
