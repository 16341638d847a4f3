// Two stages and no spares: the exact best division, from the sorted sums of the two halves of the lot.
import type { Effort } from "./effort.ts";
import { subsetBuilder } from "./subsetSums.ts";

const MOST_UNITS = 32;

export const fitsHalves = (units: number, stages: number, size: number): boolean =>
  stages === 2 && units === 2 * size && units <= MOST_UNITS;

/**
 * Unit indices of the two stages whose sums are nearest to each other. At most 32 units, an even number.
 * Source: [HorowitzSahni1974] two lists walked from opposite ends, here one pair of lists for each count of units.
 */
export function exactHalves(values: Float64Array, work: Effort): readonly [readonly number[], readonly number[]] {
  const size = values.length / 2;
  const total = values.reduce((sum, v) => sum + v, 0);
  const left = subsetBuilder(size, size).fill(values.subarray(0, size), size, size);
  const right = subsetBuilder(size, size).fill(values.subarray(size), size, size);
  let nearest = Number.POSITIVE_INFINITY;
  let masks: readonly [number, number] = [0, 0];
  for (let k = 0; k <= size; k++) {
    const few = left.lists[k]!;
    const rest = right.lists[size - k]!;
    let j = right.counts[size - k]! - 1;
    for (let i = 0; i < left.counts[k]!; i++) {
      // Fall along the right list while the stage stands above half; each step is a candidate.
      for (;;) {
        const over = 2 * (few.sums[i]! + rest.sums[j]!) - total;
        if (Math.abs(over) < nearest) {
          nearest = Math.abs(over);
          masks = [few.masks[i]!, rest.masks[j]!];
        }
        if (over <= 0 || j === 0) break;
        j--;
      }
    }
    work.spent += left.counts[k]! + right.counts[size - k]!;
  }
  const inFirst = (i: number): boolean => (i < size ? masks[0] & (1 << i) : masks[1] & (1 << (i - size))) !== 0;
  const all = Array.from(values, (_, i) => i);
  return [all.filter(inFirst), all.filter((i) => !inFirst(i))];
}
