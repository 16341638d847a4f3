/*
 * Lower bounds on the charging gap of a cross-tied bank: no placing whatever can do better.
 *
 *   symbol  meaning
 *   n       stages in series (n_s);  n_p units per stage;  N units measured
 *   T       sum of all units used;   U any upper bound on m, the least stage sum
 *
 *   L0  gap >= 0
 *   L1  gap >= n / ((n-1) + U/(T-(n-1)U)) - 1    for U <= T/n: 1/S is convex, so one stage taking all the rest is the best case
 *   L2  whole-number data, T = nq + r: U = q
 *   L3  pigeonhole: A = top p units, t = floor(p/n), D = n(t+1) - p. Either every stage has t of A, and then D stages share
 *       at most [top D t of A + top D(n_p-t) of the rest], or one stage has at most t-1 of A
 *   L4  n_p = 2: m <= min_i (c_(i) + c_(2n+1-i)), the folded pairing
 *
 * L1..L4 hold when every unit is used (N = n n_p); with spares only L0 does.
 * Source: [methods-derived] proofs of L1 and L3; compared with full enumeration in the tests.
 */

export type BoundKind = "even share" | "whole numbers" | "pigeonhole" | "folded pairs" | "prefix" | "exhaustive";

export interface Bound {
  /** Lower bound on the gap, >= 0. */
  readonly gap: number;
  readonly kind: BoundKind;
}

/** L1: the least gap when the least of `stages` sums, together `total`, is at most `most`. */
export function gapFromLeast(stages: number, total: number, most: number): number {
  const rest = total - (stages - 1) * most;
  // gap = (rest - most) / ((n-1) rest + most), written so that an even division gives exactly 0.
  return Math.max(0, (rest - most) / ((stages - 1) * rest + most));
}

const scratch = { head: new Float64Array(64) };

/** L3: an upper bound on the least stage sum. The first n * n_p values of `descending` count. */
export function pigeonholeLeast(descending: Float64Array, stages: number, size: number): number {
  const count = stages * size;
  // One buffer for all calls: an exact search asks this at every node.
  if (scratch.head.length <= count) scratch.head = new Float64Array(2 * count);
  const { head } = scratch;
  head[0] = 0;
  for (let i = 0; i < count; i++) head[i + 1] = head[i]! + descending[i]!;
  const top = (from: number, many: number): number => head[from + many]! - head[from]!;
  let least = head[count]! / stages;
  for (let p = 1; p < count; p++) {
    const each = Math.floor(p / stages);
    const sharing = stages * (each + 1) - p;
    const rest = sharing * (size - each);
    if (rest > count - p) continue;
    const shared = (top(0, sharing * each) + top(p, rest)) / sharing;
    const starved = each >= 1 && size - each + 1 <= count - p ? top(0, each - 1) + top(p, size - each + 1) : 0;
    least = Math.min(least, Math.max(shared, starved));
  }
  return least;
}

/** L4: an upper bound on the least sum of pairs. */
function foldedLeast(descending: Float64Array): number {
  let least = Number.POSITIVE_INFINITY;
  for (let i = 0; i < descending.length / 2; i++) {
    least = Math.min(least, descending[i]! + descending[descending.length - 1 - i]!);
  }
  return least;
}

/** The greatest of L0..L4. `values` are positive; `whole` says that they are whole numbers, which L2 needs. */
export function matrixBound(
  values: Float64Array,
  { stages, size, whole }: { readonly stages: number; readonly size: number; readonly whole: boolean },
): Bound {
  let best: Bound = { gap: 0, kind: "even share" };
  if (values.length !== stages * size || stages === 1) return best;
  const total = values.reduce((sum, v) => sum + v, 0);
  const descending = Float64Array.from(values).sort().reverse();
  const offer = (most: number, kind: BoundKind): void => {
    const gap = gapFromLeast(stages, total, whole ? Math.floor(most * (1 + 1e-13)) : most);
    if (gap > best.gap) best = { gap, kind };
  };
  if (whole) offer(Math.floor(total / stages), "whole numbers");
  offer(pigeonholeLeast(descending, stages, size), "pigeonhole");
  if (size === 2) offer(foldedLeast(descending), "folded pairs");
  return best;
}
