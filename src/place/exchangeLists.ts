// For each stage, the sums of small sets of its units, and the exchange of two sets nearest to a wanted transfer.
import type { Board } from "./board.ts";
import type { Random } from "./random.ts";
import { type SubsetSums, subsetBuilder } from "./subsetSums.ts";

/** Sets are drawn from so many units of a stage at most. */
export const SAMPLE = 10;
export const DEEPEST = 5;

interface Sample {
  readonly builder: ReturnType<typeof subsetBuilder>;
  readonly slots: Int32Array;
  readonly values: Float64Array;
  count: number;
  depth: number;
  sums: SubsetSums | null;
}

/** An exchange: the masks say which of each side's sampled slots change places. `gain` is what side one gains. */
export interface Exchange {
  gain: number;
  size: number;
  maskOne: number;
  maskOther: number;
  /** Elementary steps that finding it took. */
  steps: number;
}

export interface ExchangeLists {
  /** Forgets the lists of a stage (the spares are stage number `stages`), so that the next look draws a new sample. */
  readonly forget: (stage: number) => void;
  /** The exchange between two stages, of 1..depth units of class `cls` each, whose gain is nearest to `wanted`. */
  readonly nearest: (one: number, other: number, cls: number, depth: number, wanted: number) => Exchange;
  /** Slot behind bit `bit` of a mask of a stage. */
  readonly slot: (stage: number, cls: number, bit: number) => number;
}

export function exchangeLists(at: Board, random: Random): ExchangeLists {
  const { classes, classOf, fixed } = at.rules;
  const samples: (Sample | undefined)[] = new Array((at.stages + 1) * classes);
  const reach = Math.min(SAMPLE, Math.max(at.size, at.slots.length - at.stages * at.size));
  const candidates = new Int32Array(at.slots.length);
  const result: Exchange = { gain: 0, size: 0, maskOne: 0, maskOther: 0, steps: 0 };

  const draw = (stage: number, cls: number, sample: Sample): void => {
    const from = stage * at.size;
    const to = stage < at.stages ? from + at.size : at.slots.length;
    let count = 0;
    for (let slot = from; slot < to; slot++) {
      const unit = at.slots[slot]!;
      if (classOf[unit] === cls && fixed[unit] === 0) candidates[count++] = slot;
    }
    sample.count = Math.min(SAMPLE, count);
    for (let i = 0; i < sample.count; i++) {
      const pick = count > SAMPLE ? i + Math.floor(random() * (count - i)) : i;
      const slot = candidates[pick]!;
      candidates[pick] = candidates[i]!;
      sample.slots[i] = slot;
      sample.values[i] = at.values[at.slots[slot]!]!;
    }
  };

  const look = (stage: number, cls: number, depth: number): Sample => {
    const key = stage * classes + cls;
    let sample = samples[key];
    if (!sample) {
      sample = {
        builder: subsetBuilder(reach, DEEPEST),
        slots: new Int32Array(SAMPLE),
        values: new Float64Array(SAMPLE),
        count: 0,
        depth: 0,
        sums: null,
      };
      samples[key] = sample;
    }
    if (sample.sums === null) draw(stage, cls, sample);
    if (sample.sums === null || sample.depth < depth) {
      sample.sums = sample.builder.fill(sample.values, sample.count, Math.min(depth, DEEPEST));
      sample.depth = depth;
    }
    return sample;
  };

  const forget = (stage: number): void => {
    for (let cls = 0; cls < classes; cls++) {
      const sample = samples[stage * classes + cls];
      if (sample) sample.sums = null;
    }
  };

  const nearest = (one: number, other: number, cls: number, depth: number, wanted: number): Exchange => {
    const give = look(one, cls, depth).sums!;
    const take = look(other, cls, depth).sums!;
    result.size = 0;
    result.steps = 0;
    let best = Number.POSITIVE_INFINITY;
    for (let k = 1; k <= Math.min(depth, DEEPEST); k++) {
      const countGive = give.counts[k]!;
      const countTake = take.counts[k]!;
      if (countGive === 0 || countTake === 0) break;
      const giveSums = give.lists[k]!.sums;
      const takeSums = take.lists[k]!.sums;
      let j = 0;
      let bestI = -1;
      let bestJ = -1;
      for (let i = 0; i < countGive; i++) {
        const goal = giveSums[i]! + wanted;
        while (j < countTake && takeSums[j]! < goal) j++;
        if (j < countTake && takeSums[j]! - goal < best) {
          best = takeSums[j]! - goal;
          bestI = i;
          bestJ = j;
        }
        if (j > 0 && goal - takeSums[j - 1]! < best) {
          best = goal - takeSums[j - 1]!;
          bestI = i;
          bestJ = j - 1;
        }
      }
      result.steps += countGive + countTake;
      if (bestI >= 0) {
        result.gain = takeSums[bestJ]! - giveSums[bestI]!;
        result.size = k;
        result.maskOne = give.lists[k]!.masks[bestI]!;
        result.maskOther = take.lists[k]!.masks[bestJ]!;
      }
    }
    return result;
  };

  return { forget, nearest, slot: (stage, cls, bit) => samples[stage * classes + cls]!.slots[bit]! };
}
