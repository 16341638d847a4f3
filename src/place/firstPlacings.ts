// Quick first placings of a cross-tied bank; the searches start from the best of them, so that none of them is ever better.
import { stageGap } from "./gap.ts";
import { largestDifferencing } from "./largestDifferencing.ts";

const fallingOrder = (values: ArrayLike<number>): number[] =>
  Array.from({ length: values.length }, (_, i) => i).sort((a, b) => values[b]! - values[a]! || a - b);

/** Row by row of the sorted lot, every other row backwards. */
export function snake(values: ArrayLike<number>, stages: number, order = fallingOrder(values)): number[][] {
  const groups: number[][] = Array.from({ length: stages }, () => []);
  for (const [k, i] of order.entries()) {
    const column = k % stages;
    groups[Math.floor(k / stages) % 2 === 0 ? column : stages - 1 - column]!.push(i);
  }
  return groups;
}

/** Largest unit first, each into the lowest stage that still has room. Source: [Graham1969] with equal counts. */
export function largestFirst(values: ArrayLike<number>, stages: number, order = fallingOrder(values)): number[][] {
  const groups: number[][] = Array.from({ length: stages }, () => []);
  const sums = new Float64Array(stages);
  const size = values.length / stages;
  const counts = new Int32Array(stages);
  for (const i of order) {
    let into = -1;
    for (let g = 0; g < stages; g++) if (counts[g]! < size && (into < 0 || sums[g]! < sums[into]!)) into = g;
    groups[into]!.push(i);
    counts[into] = counts[into]! + 1;
    sums[into] = sums[into]! + values[i]!;
  }
  return groups;
}

/** The best of snake, largest first and balanced largest differencing; the number of values is a multiple of `stages`. */
export function firstPlacing(values: ArrayLike<number>, stages: number): number[][] {
  const gap = (groups: readonly (readonly number[])[]): number =>
    stageGap(
      groups.map((group) => group.reduce((sum, i) => sum + values[i]!, 0)),
      stages,
    );
  const order = fallingOrder(values);
  return [
    largestDifferencing(values, stages),
    snake(values, stages, order),
    largestFirst(values, stages, order),
  ].reduce((best, groups) => (gap(groups) < gap(best) ? groups : best));
}
