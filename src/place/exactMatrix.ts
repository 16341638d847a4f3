/*
 * Proves the best placing of a small cross-tied bank: every division into stages that could beat the one in hand is looked at.
 *
 *   Window: sum_j (1 - m/S_j) = n g/(1+g) with every term >= 0, so a placing of gap <= g has all its stage sums in
 *   [m, m/(1 - eta)], eta = n g/(1+g). Stages are taken in rising order of sum, each a subset out of that window that shares no
 *   unit with those before, and a branch is left when sum_j m/S_j can no longer exceed n/(1+g).
 * Without spares the last stage is what is left over, m falls from T/n until the convexity bound meets the gap in hand, and the sums
 * still to come are no more uneven than the largest units left allow (majorised by them: the same bound).
 * Holds for at most 31 units (bit masks). Source: [Korf2009] for the recursion over subsets; [methods-derived] window and bounds.
 */
import { gapFromLeast, leastShortfall, pigeonholeLeast, sharedTops, topsOf } from "./boundMatrix.ts";
import { type Effort, mayGoOn } from "./effort.ts";
import { stageGap } from "./gap.ts";
import { choose, subsetBuilder } from "./subsetSums.ts";

/** Subsets of one stage that are worth listing. */
export const MOST_SUBSETS = 750_000;
const MOST_UNITS = 31;
const CHECK_EVERY = 4096;
/** Of rounding in a bound. */
const HAIR = 1e-12;

export const fitsExactSearch = (units: number, size: number): boolean =>
  units <= MOST_UNITS && choose(units, size) <= MOST_SUBSETS;

export interface ExactProblem {
  readonly values: Float64Array;
  readonly stages: number;
  readonly size: number;
  /** Gap of the placing in hand: only a smaller one is reported. */
  readonly inHand: number;
  /** Stop at this gap or below. */
  readonly target: number;
  /** May these units form a stage? Absent: any may. */
  readonly allowed?: ((mask: number) => boolean) | undefined;
  /** Units that must be used, as a mask; default none. */
  readonly must?: number;
}

export interface ExactAnswer {
  /** Unit indices by stage, or null when nothing beats the placing in hand. */
  readonly groups: readonly (readonly number[])[] | null;
  readonly gap: number;
  /** True when every better placing has been ruled out. */
  readonly proven: boolean;
}

/** `middle` first, then its neighbours outwards: the dense windows first. */
function* outwards(middle: number, count: number): Generator<number> {
  for (let d = 0; d < count; d++) {
    if (middle - d >= 0 && middle - d < count) yield middle - d;
    if (d > 0 && middle + d < count) yield middle + d;
  }
}

const unitsOf = (mask: number): number[] =>
  Array.from({ length: MOST_UNITS }, (_, i) => i).filter((i) => mask & (1 << i));

/** Gives the gap in hand now and then; the answer at the end. */
export function* exactMatrix(problem: ExactProblem, work: Effort): Generator<number, ExactAnswer> {
  const { values, stages, size, allowed, must = 0 } = problem;
  const units = values.length;
  const all = subsetBuilder(units, size).fill(values, units, size);
  let count = all.counts[size]!;
  const { sums, masks } = all.lists[size]!;
  work.spent += count;
  if (allowed) {
    let kept = 0;
    for (let i = 0; i < count; i++) {
      if (!allowed(masks[i]!)) continue;
      sums[kept] = sums[i]!;
      masks[kept++] = masks[i]!;
    }
    count = kept;
  }
  const spares = units > stages * size;
  const total = values.reduce((sum, v) => sum + v, 0);
  const everything = units === 31 ? 0x7fffffff : (1 << units) - 1;
  const chosen = new Float64Array(stages);
  const held = new Int32Array(stages);
  const order = Array.from(values, (_, i) => i).sort((a, b) => values[b]! - values[a]!);
  const rest = new Float64Array(units);
  let gap = problem.inHand;
  let best: number[][] | null = null;
  let pending = 0;
  let stopped = false;

  const record = (): void => {
    const found = stageGap(chosen, stages);
    if (found >= gap) return;
    if (must !== 0 && (held.reduce((all, mask) => all | mask, 0) & must) !== must) return;
    gap = found;
    best = Array.from(held, unitsOf);
  };

  const leave = (used: number): void => {
    let at = 0;
    for (let i = 0; i < units; i++) if (!(used & (1 << order[i]!))) rest[at++] = values[order[i]!]!;
    pending += units;
  };
  /** The most that the least of `many` stages made of the unused units can hold. */
  const reach = (used: number, many: number): number => {
    leave(used);
    return pigeonholeLeast(rest, many, size);
  };
  const tops = Array.from({ length: stages }, () => new Float64Array(stages));
  /** List entries before this one leave hope of a smaller gap, when they are the least of the `remaining` stages. Without spares. */
  const hopeful = (depth: number, from: number, used: number, shares: number, left: number): number => {
    const remaining = stages - depth;
    leave(used);
    const mine = topsOf(rest, remaining, size, tops[depth]!);
    if (from < count) sharedTops(rest, { stages: remaining, size, least: sums[from]! }, mine);
    const wanted = stages / (1 + gap) - shares;
    let low = from;
    let high = count;
    while (low < high) {
      const middle = (low + high) >> 1;
      const sum = sums[middle]!;
      // sum_j least/S_j = (least/sum) (remaining - shortfall), at the most; a hair is given for rounding.
      const most = ((remaining - leastShortfall(mine, remaining, left, sum)) * chosen[0]!) / sum;
      if (sum * remaining <= left * (1 + HAIR) && most > wanted - HAIR) low = middle + 1;
      else high = middle;
    }
    pending += 4 * remaining;
    return low;
  };

  /** Stages `depth`.. from list entry `from` on; `used` units are taken, `shares` = sum of m/S so far, `left` = what no stage has. */
  const place = (depth: number, from: number, used: number, shares: number, left: number): void => {
    const remaining = stages - depth;
    if (!spares && remaining === 1) {
      if (left < chosen[depth - 1]!) return;
      const over = everything & ~used;
      if (allowed && !allowed(over)) return;
      chosen[depth] = left;
      held[depth] = over;
      record();
      return;
    }
    const least = chosen[0]!;
    const bounded = !spares && remaining > 2;
    let until = bounded ? hopeful(depth, from, used, shares, left) : count;
    let known = gap;
    for (let i = from; i < until; i++) {
      if (bounded && gap < known) {
        known = gap;
        until = hopeful(depth, i, used, shares, left);
        if (i >= until) return;
      }
      if (++pending >= CHECK_EVERY) {
        stopped = !mayGoOn(work, pending);
        pending = 0;
      }
      if (stopped) return;
      const sum = sums[i]!;
      if (spares) {
        if (shares + (remaining * least) / sum <= stages / (1 + gap)) return;
      } else {
        // The stages still to come are all >= sum and share what is left: at best all but one equal it.
        const last = left - (remaining - 1) * sum;
        if (last < sum || shares + ((remaining - 1) * least) / sum + least / last <= stages / (1 + gap)) return;
      }
      const mask = masks[i]!;
      if (mask & used) continue;
      chosen[depth] = sum;
      held[depth] = mask;
      if (remaining === 1) record();
      else if (spares || remaining < 4 || reach(used | mask, remaining - 1) >= sum)
        place(depth + 1, i + 1, used | mask, shares + least / sum, left - sum);
      if (gap <= problem.target) return;
    }
  };

  let below = count;
  if (!spares) {
    while (below > 0 && sums[below - 1]! * stages > total) below--;
  }
  const falling = Float64Array.from(order, (i) => values[i]!);
  const fullest = topsOf(falling, stages, size, new Float64Array(stages));
  const starts = spares
    ? outwards(count >> 1, count)
    : (function* () {
        for (let i = below - 1; i >= 0; i--) yield i;
      })();
  for (const start of starts) {
    if (stopped || gap <= problem.target) break;
    const least = sums[start]!;
    if (!spares && gapFromLeast(fullest, stages, least) >= gap) break;
    chosen[0] = least;
    held[0] = masks[start]!;
    place(1, start + 1, masks[start]!, 1, total - least);
    if ((start & 1023) === 0) yield gap;
  }
  mayGoOn(work, pending);
  return { groups: best, gap, proven: !stopped };
}
