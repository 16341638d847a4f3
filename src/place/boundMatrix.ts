/*
 * Lower bounds on the charging gap of a cross-tied bank: no placing whatever can do better.
 *
 *   symbol  meaning
 *   n       stages in series (n_s);  n_p units per stage;  N units measured
 *   T       sum of all units used;   U any upper bound on m, the least stage sum
 *
 *   L0  gap >= 0
 *   L1  gap >= n / sum_j(U/x_j) - 1  for U <= T/n, x the most uneven sums that could be: 1/S is convex, so the fuller the fullest the
 *       better, the rest at U. The k fullest hold at most the top k n_p units, and together T - (n-k) U (then x is spread over them)
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

/**
 * L1 for stages still to be filled: the least sum of (S - least)/S over `stages` sums of `least` or more, together `total`, of which the
 * k fullest hold at most `tops[k - 1]`. Infinite when there are no such sums. Summed from the evenest: partial sums as large as they can
 * be, each leaving `least` for every stage after it; 1/S is convex, so no sums that could be are more uneven in its eyes.
 */
export function leastShortfall(tops: ArrayLike<number>, stages: number, total: number, least: number): number {
  let partial = total;
  let short = 0;
  for (let k = stages - 1; k >= 1; k--) {
    const before = Math.min(tops[k - 1]!, partial - least);
    const sum = partial - before;
    short += (sum - least) / sum;
    partial = before;
  }
  return partial < least * (1 - ROUNDING) ? Number.POSITIVE_INFINITY : short + (partial - least) / partial;
}

/** Sums of the largest `size`, 2 `size`, ... of the values. */
export function topsOf(descending: ArrayLike<number>, stages: number, size: number, out: Float64Array): Float64Array {
  let sum = 0;
  for (let k = 0, i = 0; k < stages; k++) {
    for (const to = i + size; i < to; i++) sum += descending[i]!;
    out[k] = sum;
  }
  return out;
}

/**
 * Lowers `tops` where the units fall in two heaps: when every stage must hold t of the upper heap to reach `least`, the k fullest have
 * no more of it than the others leave. The heaps part at the widest step between neighbours.
 */
export function sharedTops(
  descending: ArrayLike<number>,
  { stages, size, least }: { readonly stages: number; readonly size: number; readonly least: number },
  tops: Float64Array,
): void {
  const count = stages * size;
  let heap = 1;
  let widest = -1;
  for (let i = 1; i < count; i++) {
    const step = descending[i - 1]! - descending[i]!;
    if (step > widest) {
      widest = step;
      heap = i;
    }
  }
  // A stage of t from the upper heap holds at most its t largest and the largest of the lower heap.
  let t = 0;
  for (; t < size; t++) {
    let most = t + count - heap < size ? Number.NEGATIVE_INFINITY : 0;
    for (let i = 0; i < t && i < heap; i++) most += descending[i]!;
    for (let i = heap; i < heap + size - t && i < count; i++) most += descending[i]!;
    if (most >= least) break;
  }
  let sum = 0;
  for (let k = 1; k < stages; k++) {
    const upper = Math.min(k * size, heap - (stages - k) * t);
    const lower = k * size - upper;
    if (upper < 0 || lower > count - heap) continue;
    sum = 0;
    for (let i = 0; i < upper; i++) sum += descending[i]!;
    for (let i = heap; i < heap + lower; i++) sum += descending[i]!;
    if (sum < tops[k - 1]!) tops[k - 1] = sum;
  }
}

/** L1: the least gap when the least of the stage sums is at most `most`. */
export function gapFromLeast(tops: ArrayLike<number>, stages: number, most: number): number {
  const short = leastShortfall(tops, stages, tops[stages - 1]!, most);
  // An even division gives exactly 0.
  return Math.max(0, short / (stages - short));
}

const ROUNDING = 1e-12;

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
  const descending = Float64Array.from(values).sort().reverse();
  const tops = topsOf(descending, stages, size, new Float64Array(stages));
  const total = tops[stages - 1]!;
  const offer = (most: number, kind: BoundKind): void => {
    const gap = gapFromLeast(tops, stages, whole ? Math.floor(most * (1 + 1e-13)) : most);
    if (gap > best.gap) best = { gap, kind };
  };
  if (whole) offer(Math.floor(total / stages), "whole numbers");
  offer(pigeonholeLeast(descending, stages, size), "pigeonhole");
  if (size === 2) offer(foldedLeast(descending), "folded pairs");
  return best;
}
