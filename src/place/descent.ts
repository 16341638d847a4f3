// The exchange descent: brings the stage sums together by exchanging sets of equal count between stages.
import { type Board, exchange, mayExchange, recount, stageOf } from "./board.ts";
import { type Effort, mayGoOn } from "./effort.ts";
import { DEEPEST, exchangeLists, SAMPLE } from "./exchangeLists.ts";
import { stageGap } from "./gap.ts";
import type { Random } from "./random.ts";

export interface DescentGoal {
  /** Stop at this gap or below. */
  readonly target: number;
  /** May units be exchanged with the spares as well? */
  readonly spares: boolean;
}

/** Gains smaller than this part of the gap are not worth a change. */
const LEAST_GAIN = 1e-5;
/** Set sizes tried, the next one only when the one before is stuck. */
const DEPTHS = [3, DEEPEST] as const;
/** Other samples of the lowest and highest stage that are tried before all pairs are. */
const REDRAWS = 3;
const YIELD_AFTER = 50_000;
/** What a look at two stages and a kick cost besides the sums they step through: on a small board they are most of the work. */
const A_LOOK = 20;
const A_KICK = 300;

interface Change {
  one: number;
  other: number;
  gap: number;
  gain: number;
  size: number;
  maskOne: number;
  maskOther: number;
}

/**
 * Works on `at` in place and leaves it at the best placing found; gives the best gap now and then.
 * Deterministic for one random source and one effort.
 */
export function* descend(at: Board, goal: DescentGoal, random: Random, work: Effort): Generator<number, number> {
  const { stages, size, sums } = at;
  const lists = exchangeLists(at, random);
  const pool = goal.spares && at.slots.length > stages * size;
  const best = { slots: Int32Array.from(at.slots), gap: stageGap(sums, stages) };
  const change: Change = { one: 0, other: 0, gap: 0, gain: 0, size: 0, maskOne: 0, maskOther: 0 };
  let gap = best.gap;

  const consider = (one: number, other: number, cls: number, depth: number, wanted: number): void => {
    const found = lists.nearest(one, other, cls, depth, wanted);
    work.spent += found.steps + A_LOOK;
    if (found.size === 0 || found.gain === 0) return;
    const before = sums[one]!;
    const beforeOther = other < stages ? sums[other]! : 0;
    sums[one] = before + found.gain;
    if (other < stages) sums[other] = beforeOther - found.gain;
    const after = stageGap(sums, stages);
    sums[one] = before;
    if (other < stages) sums[other] = beforeOther;
    if (after >= change.gap) return;
    Object.assign(change, found, { one, other, gap: after });
  };

  const apply = (cls: number): void => {
    let [left, right] = [change.maskOne, change.maskOther];
    while (left !== 0) {
      const a = 31 - Math.clz32(left & -left);
      const b = 31 - Math.clz32(right & -right);
      exchange(at, lists.slot(change.one, cls, a), lists.slot(change.other, cls, b));
      left &= left - 1;
      right &= right - 1;
    }
    lists.forget(change.one);
    lists.forget(change.other);
    gap = change.gap;
  };

  /** One improving exchange of sets of at most `depth` units, or none. */
  const improve = (depth: number, cls: number): boolean => {
    let low = 0;
    let high = 0;
    let total = 0;
    for (let j = 0; j < stages; j++) {
      if (sums[j]! < sums[low]!) low = j;
      if (sums[j]! > sums[high]!) high = j;
      total += sums[j]!;
    }
    const mean = total / stages;
    change.size = 0;
    // Of two stages equally low, one can be raised without changing the gap: bringing lowest and highest together always counts.
    const half = (sums[high]! - sums[low]!) / 2;
    let settled = false;
    const tries = DEPTHS.length + (size > SAMPLE ? REDRAWS : 0);
    for (let quick = 0; quick < tries && half > 0 && !settled; quick++) {
      change.size = 0;
      change.gap = gap * (1 + LEAST_GAIN);
      if (quick >= DEPTHS.length) {
        lists.forget(low);
        lists.forget(high);
      }
      consider(low, high, cls, DEPTHS[quick] ?? DEEPEST, half);
      settled = change.size > 0 && Math.abs(change.gain - half) <= 0.3 * half;
    }
    if (!settled) {
      change.size = 0;
      change.gap = gap * (1 - LEAST_GAIN);
      if (half > 0) consider(low, high, cls, depth, half);
      for (let j = 0; j < stages; j++) {
        if (j !== low) {
          consider(low, j, cls, depth, (sums[j]! - sums[low]!) / 2);
          consider(low, j, cls, depth, mean - sums[low]!);
        }
        if (j !== high) {
          consider(high, j, cls, depth, (sums[j]! - sums[high]!) / 2);
          consider(high, j, cls, depth, mean - sums[high]!);
        }
      }
      if (pool) {
        consider(low, stages, cls, depth, mean - sums[low]!);
        consider(high, stages, cls, depth, mean - sums[high]!);
      }
    }
    if (change.size === 0) return false;
    apply(cls);
    return true;
  };

  const keep = (): void => {
    if (gap >= best.gap) return;
    best.gap = gap;
    best.slots.set(at.slots);
  };

  const kick = (): void => {
    if (random() < 0.5) at.slots.set(best.slots);
    const reach = pool ? at.slots.length : stages * size;
    for (let left = 1 + Math.floor(random() * 3); left > 0; left--) {
      for (let tries = 0; tries < 20; tries++) {
        const one = Math.floor(random() * stages * size);
        const other = Math.floor(random() * reach);
        if (stageOf(at, one) === stageOf(at, other) || !mayExchange(at, one, other)) continue;
        exchange(at, one, other);
        break;
      }
    }
    recount(at);
    gap = stageGap(sums, stages);
    for (let j = 0; j <= stages; j++) lists.forget(j);
    work.spent += A_KICK + at.slots.length;
  };

  const redraw = (): void => {
    for (let j = 0; j <= stages; j++) lists.forget(j);
  };

  let told = work.spent;
  let level = 0;
  let redraws = 0;
  while (stages > 1 && best.gap > goal.target && mayGoOn(work, stages)) {
    let moved = false;
    for (let cls = 0; cls < at.rules.classes; cls++) moved = improve(DEPTHS[level]!, cls) || moved;
    keep();
    if (!moved) {
      if (size > SAMPLE && redraws < 2 && level > 0) {
        redraw();
        redraws++;
      } else if (level < DEPTHS.length - 1) level++;
      else {
        kick();
        level = 0;
        redraws = 0;
      }
    }
    if (work.spent - told >= YIELD_AFTER) {
      told = work.spent;
      yield best.gap;
    }
  }
  at.slots.set(best.slots);
  recount(at);
  return best.gap;
}
