/*
 * Levels charging to the end while holding stays level: exchanges of equal count between two stages of a cross-tied bank.
 *
 *   symbol  meaning
 *   S_j     stage capacitance;  G_j stage conductance
 *   tau     what stage a should gain from stage b, half the difference of their sums
 *
 * Of all exchanges of 2 to 5 units for as many, out of up to ten units of each stage, the one whose gain is nearest to tau among those
 * that leave the holding gap within its cap. Sums of one side are sorted and searched by halves. Stuck: two random swaps that keep
 * holding within the cap, from the best placing or from where it stands. Source: [HorowitzSahni1974] subset sums of two sides.
 */
import { type Board, exchange, recount } from "./board.ts";
import { type Effort, mayGoOn } from "./effort.ts";
import { stageGap } from "./gap.ts";
import type { Random } from "./random.ts";
import { stageConductances } from "./twoGoals.ts";

export interface LevelBoth {
  readonly conductances: Float64Array;
  readonly perStage: number;
  /** The holding gap may not exceed this. */
  readonly cap: number;
  /** Stop at this charging gap. */
  readonly target: number;
}

interface Sets {
  readonly sums: Float64Array;
  readonly held: Float64Array;
  readonly masks: Int32Array;
}

const SAMPLE = 10;
const LEAST = 2;
const MOST = 5;
/** Neighbours of the wanted sum that are looked at for one whose conductance fits. */
const NEAR = 24;
/** Steps of the search by halves. */
const HALVINGS = 8;
const KICK_TRIES = 200;

/** Masks of k of m bits. */
const masksOf = (m: number, k: number): number[] => {
  const masks: number[] = [];
  for (let mask = 0; mask < 1 << m; mask++) {
    let bits = 0;
    for (let rest = mask; rest > 0; rest &= rest - 1) bits++;
    if (bits === k) masks.push(mask);
  }
  return masks;
};

/** Works on `at` in place and ends at the best placing found within the cap; its charging gap. Classes and pins are not looked at. */
export function* levelBoth(at: Board, goals: LevelBoth, random: Random, work: Effort): Generator<number, number> {
  const { stages, size, values, slots, sums } = at;
  const { conductances, cap } = goals;
  const held = stageConductances(at, conductances, goals.perStage);
  const many = Math.min(SAMPLE, size);
  const masks = Array.from({ length: MOST + 1 }, (_, k) => Int32Array.from(masksOf(many, Math.min(k, many))));
  const picks = Array.from({ length: stages }, () => new Int32Array(many));
  const lists = new Map<number, Sets>();
  let gap = stageGap(sums, stages);
  let best = { gap, slots: Int32Array.from(slots) };

  const draw = (j: number): void => {
    const from = Array.from({ length: size }, (_, k) => j * size + k);
    for (let i = 0; i < many; i++) {
      const other = size > many ? i + Math.floor(random() * (size - i)) : i;
      [from[i], from[other]] = [from[other]!, from[i]!];
      picks[j]![i] = from[i]!;
    }
    for (let k = LEAST; k <= MOST; k++) lists.delete(j * 8 + k);
  };
  const setsOf = (j: number, k: number): Sets => {
    const known = lists.get(j * 8 + k);
    if (known) return known;
    const rows = Array.from(masks[k]!, (mask) => {
      let [c, g] = [0, 0];
      for (let i = 0; i < many; i++) {
        if (!(mask & (1 << i))) continue;
        const unit = slots[picks[j]![i]!]!;
        c += values[unit]!;
        g += conductances[unit]!;
      }
      return { c, g, mask };
    }).sort((x, y) => x.c - y.c);
    const made = {
      sums: Float64Array.from(rows, (row) => row.c),
      held: Float64Array.from(rows, (row) => row.g),
      masks: Int32Array.from(rows, (row) => row.mask),
    };
    lists.set(j * 8 + k, made);
    return made;
  };
  /** Does holding stay within the cap when stage a gains `gain` from stage b? */
  const mayGain = (a: number, b: number): ((gain: number) => boolean) => {
    let least = Number.POSITIVE_INFINITY;
    let inverse = 0;
    for (let j = 0; j < stages; j++) {
      if (j === a || j === b) continue;
      least = Math.min(least, held[j]!);
      inverse += 1 / held[j]!;
    }
    return (gain) => {
      const [x, y] = [held[a]! + gain, held[b]! - gain];
      return stages <= Math.min(least, x, y) * (inverse + 1 / x + 1 / y) * (1 + cap);
    };
  };
  const swapMasks = (a: number, b: number, [one, other]: readonly [number, number]): void => {
    const bits = (mask: number): number[] => Array.from({ length: many }, (_, i) => i).filter((i) => mask & (1 << i));
    const [from, to] = [bits(one), bits(other)];
    for (const [i, bit] of from.entries()) swap(picks[a]![bit]!, picks[b]![to[i]!]!);
    draw(a);
    draw(b);
  };
  const swap = (one: number, other: number): void => {
    const gain = conductances[slots[other]!]! - conductances[slots[one]!]!;
    const [a, b] = [Math.floor(one / size), Math.floor(other / size)];
    held[a] = held[a]! + gain;
    held[b] = held[b]! - gain;
    exchange(at, one, other);
  };
  /** Exchanges between a and b if that brings their sums nearer. */
  const improve = (a: number, b: number, k: number): boolean => {
    const wanted = (sums[b]! - sums[a]!) / 2;
    const [mine, theirs] = [setsOf(a, k), setsOf(b, k)];
    const fits = mayGain(a, b);
    const count = theirs.sums.length;
    let nearest = Number.POSITIVE_INFINITY;
    let found: readonly [number, number] | null = null;
    let gain = 0;
    let steps = 0;
    for (let i = 0; i < mine.sums.length; i++) {
      const goal = wanted + mine.sums[i]!;
      steps += HALVINGS;
      let [low, high] = [0, count];
      while (low < high) {
        const middle = (low + high) >> 1;
        if (theirs.sums[middle]! < goal) low = middle + 1;
        else high = middle;
      }
      for (let d = 0; d < NEAR; d++) {
        const up = low + (d >> 1);
        const j = d % 2 === 0 ? up : low - 1 - (d >> 1);
        if (j < 0 || j >= count) continue;
        steps++;
        const miss = Math.abs(theirs.sums[j]! - goal);
        if (miss < nearest && fits(theirs.held[j]! - mine.held[i]!)) {
          nearest = miss;
          gain = theirs.sums[j]! - mine.sums[i]!;
          found = [mine.masks[i]!, theirs.masks[j]!];
        }
      }
    }
    mayGoOn(work, steps);
    if (found === null) return false;
    // Judged by squares: levelling two stages between the lowest and the highest helps, though the gap does not show it yet.
    const apart = sums[b]! - sums[a]!;
    const after = apart - 2 * gain;
    if (Math.abs(after) >= Math.abs(apart) * (1 - 1e-5)) return false;
    swapMasks(a, b, found);
    gap = stageGap(sums, stages);
    return true;
  };
  const step = (): boolean => {
    const low = sums.indexOf(Math.min(...sums));
    const high = sums.indexOf(Math.max(...sums));
    for (let k = LEAST; k <= Math.min(MOST, many); k++) {
      if (improve(low, high, k)) return true;
      for (let j = 0; j < stages; j++) if (j !== low && j !== high && improve(low, j, k)) return true;
      for (let j = 0; j < stages; j++) if (j !== low && j !== high && improve(high, j, k)) return true;
    }
    return false;
  };
  const kick = (): void => {
    if (random() < 0.5) {
      slots.set(best.slots);
      recount(at);
      held.set(stageConductances(at, conductances, goals.perStage));
    }
    let left = 2;
    for (let turn = 0; turn < KICK_TRIES && left > 0; turn++) {
      const [one, other] = [Math.floor(random() * stages * size), Math.floor(random() * stages * size)];
      const [a, b] = [Math.floor(one / size), Math.floor(other / size)];
      if (a === b || !mayGain(a, b)(conductances[slots[other]!]! - conductances[slots[one]!]!)) continue;
      swap(one, other);
      left--;
    }
    for (let j = 0; j < stages; j++) draw(j);
    gap = stageGap(sums, stages);
    mayGoOn(work, KICK_TRIES);
  };

  for (let j = 0; j < stages; j++) draw(j);
  while (stages > 1 && size >= LEAST && best.gap > goals.target && mayGoOn(work, 1)) {
    if (step()) {
      if (gap < best.gap) {
        best = { gap, slots: Int32Array.from(slots) };
        yield gap;
      }
    } else kick();
  }
  slots.set(best.slots);
  recount(at);
  return best.gap;
}
