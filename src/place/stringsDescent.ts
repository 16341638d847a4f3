// Swaps between the worst string and all others (and the spares), with kicks when stuck: strings beyond what can be proven.
import { type BoardRules, noRules } from "./board.ts";
import { type Effort, mayGoOn } from "./effort.ts";
import type { Random } from "./random.ts";

export interface StringsState {
  readonly series: number;
  readonly strings: number;
  /** Elastance 1/C of each unit, any common scale. */
  readonly elastances: Float64Array;
  readonly rules?: BoardRules;
  /** Unit in each slot, string by string, then the spares. */
  readonly slots: Int32Array;
}

/** t of the string in `slots` from `from` on, `series` units. */
function evennessAt({ elastances, slots, series }: StringsState, string: number): number {
  let sum = 0;
  let greatest = 0;
  for (let k = string * series; k < (string + 1) * series; k++) {
    const a = elastances[slots[k]!]!;
    sum += a;
    if (a > greatest) greatest = a;
  }
  return sum / greatest;
}

const YIELD_AFTER = 20_000;

/** Raises min t in place until t >= `wanted` or the effort is spent; gives min t now and then. */
export function* descendStrings(
  state: StringsState,
  wanted: number,
  random: Random,
  work: Effort,
): Generator<number, number> {
  const { series, strings, slots } = state;
  const { classOf, fixed } = state.rules ?? noRules(slots.length);
  const t = new Float64Array(strings);
  const best = { slots: Int32Array.from(slots), least: 0, tied: strings };
  let pending = 0;

  const recount = (): void => {
    for (let s = 0; s < strings; s++) t[s] = evennessAt(state, s);
  };
  const worst = (): number => t.indexOf(Math.min(...t));
  const swap = (one: number, other: number): void => {
    const held = slots[one]!;
    slots[one] = slots[other]!;
    slots[other] = held;
  };
  const mayMove = (one: number, other: number): boolean => {
    const [a, b] = [slots[one]!, slots[other]!];
    return classOf[a] === classOf[b] && fixed[a] === 0 && fixed[b] === 0;
  };

  /** The swap that leaves the worse of the two strings touched best, if that beats the worst string as it is. */
  const improve = (): boolean => {
    const low = worst();
    let found = { one: -1, other: -1, least: t[low]! * (1 + 1e-12) };
    for (let one = low * series; one < (low + 1) * series; one++) {
      for (let other = 0; other < slots.length; other++) {
        const to = Math.floor(other / series);
        if (to === low && other < strings * series) continue;
        if (!mayMove(one, other)) continue;
        swap(one, other);
        const mine = evennessAt(state, low);
        const least = other < strings * series ? Math.min(mine, evennessAt(state, to)) : mine;
        swap(one, other);
        pending += series;
        if (least > found.least) found = { one, other, least };
      }
    }
    if (found.one < 0) return false;
    swap(found.one, found.other);
    const to = Math.floor(found.other / series);
    t[low] = evennessAt(state, low);
    if (found.other < strings * series) t[to] = evennessAt(state, to);
    return true;
  };

  const keep = (): void => {
    const least = Math.min(...t);
    if (least <= best.least) return;
    best.least = least;
    best.slots.set(slots);
  };

  const kick = (): void => {
    slots.set(best.slots);
    const low = worst();
    for (let left = 1 + Math.floor(random() * 3); left > 0; left--) {
      for (let tries = 0; tries < 20; tries++) {
        const one =
          random() < 0.5 ? low * series + Math.floor(random() * series) : Math.floor(random() * strings * series);
        const other = Math.floor(random() * slots.length);
        if (Math.floor(one / series) === Math.floor(other / series) || !mayMove(one, other)) continue;
        swap(one, other);
        break;
      }
    }
    recount();
  };

  recount();
  keep();
  let told = work.spent;
  while (strings > 0 && best.least < wanted && mayGoOn(work, pending + series)) {
    pending = 0;
    const moved = improve();
    keep();
    if (!moved) {
      if (strings === 1 && slots.length === series) break;
      kick();
    }
    if (work.spent - told >= YIELD_AFTER) {
      told = work.spent;
      yield best.least;
    }
  }
  slots.set(best.slots);
  return best.least;
}
