// All k-subsets of a few values, sorted by sum, built by merging instead of sorting.

/** Subsets of one size: sums in rising order, and which values each holds as a bit mask. */
export interface SubsetList {
  readonly sums: Float64Array;
  readonly masks: Int32Array;
}

/** One list for each size k; only the first `counts[k]` entries of list k count. */
export interface SubsetSums {
  readonly lists: readonly SubsetList[];
  readonly counts: Int32Array;
}

export function choose(n: number, k: number): number {
  let result = 1;
  for (let i = 1; i <= k; i++) result = (result * (n - k + i)) / i;
  return Math.round(result);
}

/** Merges list A with list B shifted by `value` and marked with `bit`; both rising, so the result is rising. */
function merge(
  a: SubsetList,
  countA: number,
  b: SubsetList,
  countB: number,
  value: number,
  bit: number,
  out: SubsetList,
): void {
  let i = 0;
  let j = 0;
  for (let at = 0; at < countA + countB; at++) {
    const take = j >= countB || (i < countA && a.sums[i]! <= b.sums[j]! + value);
    out.sums[at] = take ? a.sums[i]! : b.sums[j]! + value;
    out.masks[at] = take ? a.masks[i++]! : b.masks[j++]! | bit;
  }
}

/** Holds the buffers for up to `most` values and subsets of up to `deepest` of them; `fill` may be called again and again. */
export interface SubsetBuilder {
  readonly fill: (values: ArrayLike<number>, count: number, depth: number) => SubsetSums;
}

/**
 * Horowitz-Sahni doubling by size: list k of i + 1 values is list k of i values merged with list k - 1 of them plus the new one.
 * Takes time in proportion to the number of subsets. At most 31 values (bit masks of one word).
 */
export function subsetBuilder(most: number, deepest: number): SubsetBuilder {
  const buffer = (k: number): SubsetList => ({
    sums: new Float64Array(choose(most, k)),
    masks: new Int32Array(choose(most, k)),
  });
  const front = Array.from({ length: deepest + 1 }, (_, k) => buffer(k));
  const back = Array.from({ length: deepest + 1 }, (_, k) => buffer(k));
  const counts = new Int32Array(deepest + 1);
  const fill = (values: ArrayLike<number>, count: number, depth: number): SubsetSums => {
    counts.fill(0);
    counts[0] = 1;
    front[0]!.sums[0] = 0;
    front[0]!.masks[0] = 0;
    for (let i = 0; i < count; i++) {
      for (let k = Math.min(i + 1, depth); k >= 1; k--) {
        merge(front[k]!, counts[k]!, front[k - 1]!, counts[k - 1]!, values[i]!, 1 << i, back[k]!);
        counts[k] = counts[k]! + counts[k - 1]!;
        const old = front[k]!;
        front[k] = back[k]!;
        back[k] = old;
      }
    }
    return { lists: front, counts };
  };
  return { fill };
}
