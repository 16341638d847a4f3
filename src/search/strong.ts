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

/** Rows chosen at most. */
const MOST = 48;
/** Rows that they are chosen from: as many as pay for themselves in a table of that size. Four times as many are tried on. */
const candidatesOf = (count: number): number => Math.min(128, Math.max(24, Math.ceil(count / 800)));

/** Figures of some rows one after another: stress, cost, units, volume, mass of each. */
export type Strong = Float64Array;
const WIDTH = 5;

/** At most so many of the rows, evenly. */
function evenly(rows: readonly number[], most: number): readonly number[] {
  const stride = Math.ceil(rows.length / most);
  return stride <= 1 ? rows : rows.filter((_, i) => i % stride === 0);
}

function packed({ stress, cost, units, volume, mass }: LayoutTable, rows: readonly number[]): Strong {
  const all = new Float64Array(rows.length * WIDTH);
  rows.forEach((row, i) => {
    for (const [k, column] of [stress, cost, units, volume, mass].entries()) all[i * WIDTH + k] = column[row] as number;
  });
  return all;
}

/** The strong rows among `candidates`, by how they fare against the rows `tried`. */
export function strongOf(table: LayoutTable, candidates: readonly number[], tried: readonly number[]): Strong {
  const most = candidatesOf(table.count);
  const rows = evenly(candidates, most);
  const sample = evenly(tried, 4 * most).map((row) => figuresAt(table, row, noFigures()));
  const each = rows.map((row) => packed(table, [row]));
  // One mark for each candidate and each row of the sample that it beats, while none of the chosen does.
  const marks = each.map((one) => Uint8Array.from(sample, (figures) => (isBeaten(one, figures) ? 1 : 0)));
  const counts = marks.map((row) => row.reduce((sum, mark) => sum + mark, 0));
  const chosen: number[] = [];
  while (chosen.length < MOST) {
    const best = counts.indexOf(Math.max(...counts));
    if (best < 0 || counts[best] === 0) break;
    chosen.push(rows[best] as number);
    for (let t = 0; t < sample.length; t++) {
      if (marks[best]?.[t] !== 1) continue;
      for (let c = 0; c < marks.length; c++) {
        const own = marks[c] as Uint8Array;
        if (own[t] !== 1) continue;
        own[t] = 0;
        counts[c]! -= 1;
      }
    }
  }
  return packed(table, chosen);
}

/** True when one of the strong layouts beats these figures, and so whatever is worse than them. */
export function isBeaten(strong: Strong, { stress, cost, units, volume, mass }: Readonly<Figures>): boolean {
  for (let k = 0; k < strong.length; k += WIDTH) {
    const s = strong[k] as number;
    if (s > stress) continue;
    const c = strong[k + 1] as number;
    if (c > cost) continue;
    const u = strong[k + 2] as number;
    const v = strong[k + 3] as number;
    const m = strong[k + 4] as number;
    if (u > units || v > volume || m > mass) continue;
    if (c < cost || s < stress || u < units || v < volume || m < mass) return true;
  }
  return false;
}
