// The order of layouts: total cost, then units, volume, name; what is not assessed for sharing comes after what is.

import { layoutId, type Ties } from "../bank/index.ts";
import type { Capacitor } from "../catalog/index.ts";
import type { LayoutTable } from "./table.ts";

export const RANKINGS = ["cost", "units", "volume", "mass", "stress"] as const;
export type Ranking = (typeof RANKINGS)[number];

export const tiesOf = (table: LayoutTable, row: number): Ties => (table.tied[row] === 1 ? "cross-tied" : "strings");

export const idOf = (table: LayoutTable, parts: readonly Capacitor[], row: number): string =>
  layoutId({
    part: (parts[table.part[row] as number] as Capacitor).part,
    series: table.series[row] as number,
    parallel: table.parallel[row] as number,
    ties: tiesOf(table, row),
  });

/** Compares two rows of a table; `by` comes first, then the standing order. */
export function comparison(
  table: LayoutTable,
  parts: readonly Capacitor[],
  by: Ranking,
): (a: number, b: number) => number {
  const { cost, units, volume, stress } = table;
  const first = table[by];
  const unassessed = (row: number): number => (stress[row] === Number.POSITIVE_INFINITY ? 1 : 0);
  const size = (column: Float64Array, a: number, b: number): number => {
    const [x, y] = [column[a] as number, column[b] as number];
    return x < y ? -1 : x > y ? 1 : 0;
  };
  return (a, b) => {
    const sure = unassessed(a) - unassessed(b);
    if (sure !== 0) return sure;
    const d = size(first, a, b) || size(cost, a, b) || size(units, a, b) || size(volume, a, b);
    if (d !== 0) return d;
    const [x, y] = [idOf(table, parts, a), idOf(table, parts, b)];
    return x < y ? -1 : x > y ? 1 : 0;
  };
}

/** The first `limit` rows in order (all when 0), without sorting the rest: a heap whose top is the worst kept. */
export function firstRows(count: number, limit: number, compare: (a: number, b: number) => number): readonly number[] {
  if (limit === 0 || limit >= count) return Array.from({ length: count }, (_, i) => i).sort(compare);
  const heap: number[] = [];
  const sift = (i: number): void => {
    let at = i;
    for (;;) {
      let worst = at;
      for (const child of [2 * at + 1, 2 * at + 2]) {
        if (child < heap.length && compare(heap[child] as number, heap[worst] as number) > 0) worst = child;
      }
      if (worst === at) return;
      [heap[at], heap[worst]] = [heap[worst] as number, heap[at] as number];
      at = worst;
    }
  };
  for (let row = 0; row < count; row++) {
    if (heap.length < limit) {
      heap.push(row);
      if (heap.length === limit) for (let i = limit >> 1; i >= 0; i--) sift(i);
    } else if (compare(row, heap[0] as number) < 0) {
      heap[0] = row;
      sift(0);
    }
  }
  return heap.sort(compare);
}
