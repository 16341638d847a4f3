/*
 * Proves the best division into independent strings: a search over leaders and followers.
 *
 *   t = sum(a)/max(a) of a string, a = 1/C; the largest unused elastance is either the leader of a new string or a spare.
 *   A leader needs followers of sum >= (t - 1) a_leader to beat t; the prefix bound on the units left ends a branch.
 * Followers are tried from the smallest sufficient sums up where that is quick. Exact for any number of units as long as the effort
 * lasts. Source: [methods-derived]; compared with full enumeration in the tests.
 */
import { prefixLeast } from "./boundStrings.ts";
import { type Effort, mayGoOn } from "./effort.ts";

export interface StringsProblem {
  /** Elastances, sorted falling. */
  readonly falling: Float64Array;
  readonly series: number;
  readonly strings: number;
  /** min t of the placing in hand: only a greater one is reported. */
  readonly inHand: number;
  /** Stop at this min t or above. */
  readonly target: number;
}

export interface StringsAnswer {
  /** Positions in `falling` by string, or null when nothing beats the placing in hand. */
  readonly groups: readonly (readonly number[])[] | null;
  readonly least: number;
  readonly proven: boolean;
}

const CHECK_EVERY = 1024;
/** Gains below this part of t are not looked for. */
const FINEST = 1e-12;

export function* exactStrings(problem: StringsProblem, work: Effort): Generator<number, StringsAnswer> {
  const { falling, series, strings } = problem;
  const units = falling.length;
  const used = new Uint8Array(units);
  const held: number[][] = [];
  let least = problem.inHand;
  let best: number[][] | null = null;
  let pending = 0;
  let stopped = false;
  const left = new Float64Array(units);

  const tick = (cost: number): boolean => {
    pending += cost;
    if (pending >= CHECK_EVERY) {
      stopped ||= !mayGoOn(work, pending);
      pending = 0;
    }
    return stopped;
  };

  const hopeless = (from: number, toPlace: number): boolean => {
    let count = 0;
    for (let i = from; i < units; i++) if (!used[i]) left[count++] = falling[i]!;
    tick(count);
    return prefixLeast(left.subarray(0, count), series, toPlace) <= least * (1 + FINEST);
  };

  /** Takes `need` followers from position `from` on for the string of `leader`, of sum > `short`; then goes on to the next leader. */
  const follow = (leader: number, from: number, need: number, sum: number, worst: number, spares: number): void => {
    if (tick(1)) return;
    if (need === 0) {
      const t = 1 + sum / falling[leader]!;
      if (t <= least * (1 + FINEST)) return;
      lead(leader + 1, Math.min(worst, t), spares);
      return;
    }
    const wanted = (least * (1 + FINEST) - 1) * falling[leader]! - sum;
    // `held` grows by one follower at a time; the largest `need` that are left must suffice.
    let previous = Number.NaN;
    for (let i = from; i < units && !stopped; i++) {
      if (used[i]) continue;
      if (falling[i]! * need <= wanted) return;
      if (falling[i] === previous) continue;
      previous = falling[i]!;
      used[i] = 1;
      held[held.length - 1]!.push(i);
      follow(leader, i + 1, need - 1, sum + falling[i]!, worst, spares);
      held[held.length - 1]!.pop();
      used[i] = 0;
      if (worst <= least * (1 + FINEST) || least >= problem.target) return;
    }
  };

  /** `worst` is the least t of the strings made so far. */
  const lead = (from: number, worst: number, spares: number): void => {
    if (held.length === strings) {
      least = worst;
      best = held.map((string) => [...string]);
      return;
    }
    let at = from;
    while (at < units && used[at]) at++;
    if (hopeless(at, strings - held.length)) return;
    used[at] = 1;
    held.push([at]);
    follow(at, at + 1, series - 1, 0, worst, spares);
    held.pop();
    if (spares > 0 && !stopped && worst > least * (1 + FINEST) && least < problem.target)
      lead(at + 1, worst, spares - 1);
    used[at] = 0;
  };

  yield least;
  if (least < problem.target) lead(0, Number.POSITIVE_INFINITY, units - series * strings);
  mayGoOn(work, pending);
  return { groups: best, least, proven: !stopped };
}
