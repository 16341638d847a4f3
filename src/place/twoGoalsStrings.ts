/*
 * Strings: least holding gap among placings whose charging gap stays within a limit.
 *
 *   symbol  unit  meaning
 *   a       1/F   elastance of a unit;      charging  t = sum(a)/max(a),  gap n_s/min t - 1
 *   r       ohm   1/(I_leak/V_meas + 1/R);  holding   the same with r in place of a
 *
 * A unit of a string cannot average its leakage with others, so large holding gaps are the rule. Random swaps under a falling
 * temperature on  holding gap + weight * (charging gap above the limit). Source: [Kirkpatrick1983], [methods-derived].
 */
import { power } from "../quantity/index.ts";
import type { BoardRules } from "./board.ts";
import { type Effort, mayGoOn } from "./effort.ts";
import type { Random } from "./random.ts";
import type { Gaps } from "./twoGoals.ts";

export interface StringGoals {
  readonly series: number;
  readonly strings: number;
  readonly elastances: Float64Array;
  readonly resistances: Float64Array;
  readonly rules: BoardRules;
  readonly limit: number;
  readonly target: number;
  readonly spares: boolean;
  readonly moves: number;
}

const WEIGHT = 20;
const HOTTEST = 0.1;
const COLDEST = 1e-4;
const CHUNK = 2000;

const least = (t: Float64Array): number => {
  let found = t[0]!;
  for (let s = 1; s < t.length; s++) if (t[s]! < found) found = t[s]!;
  return found;
};

/** Works on `slots` in place (string by string, then the spares); ends at the best placing within the limit. */
export function* holdStrings(
  slots: Int32Array,
  goals: StringGoals,
  random: Random,
  work: Effort,
): Generator<Gaps, Gaps> {
  const { series, strings, limit, moves, rules } = goals;
  const placed = series * strings;
  const reach = goals.spares ? slots.length : placed;
  const evenness = (weights: Float64Array, string: number): number => {
    let sum = 0;
    let greatest = 0;
    for (let k = string * series; k < (string + 1) * series; k++) {
      const w = weights[slots[k]!]!;
      sum += w;
      if (w > greatest) greatest = w;
    }
    return sum / greatest;
  };
  const fill = (weights: Float64Array): Float64Array =>
    Float64Array.from({ length: strings }, (_, s) => evenness(weights, s));
  const tC = fill(goals.elastances);
  const tG = fill(goals.resistances);
  const gaps = (): Gaps => ({ charging: series / least(tC) - 1, holding: series / least(tG) - 1 });
  const cost = ({ charging, holding }: Gaps): number => holding + WEIGHT * Math.max(0, charging - limit);
  const best = { slots: Int32Array.from(slots), gaps: gaps() };
  let now = cost(best.gaps);
  let heat = HOTTEST;
  const fall = power(COLDEST / HOTTEST, 1 / moves);
  const refresh = (string: number): void => {
    if (string >= strings) return;
    tC[string] = evenness(goals.elastances, string);
    tG[string] = evenness(goals.resistances, string);
  };
  for (let move = 0; move < moves && reach > series; move++) {
    heat *= fall;
    if (move % CHUNK === CHUNK - 1) {
      if (best.gaps.holding <= goals.target || !mayGoOn(work, CHUNK)) break;
      if (move % (20 * CHUNK) === CHUNK - 1) yield best.gaps;
    }
    const one = Math.floor(random() * placed);
    const other = Math.floor(random() * reach);
    const a = Math.floor(one / series);
    const b = other < placed ? Math.floor(other / series) : strings;
    const [u, v] = [slots[one]!, slots[other]!];
    if (a === b || rules.classOf[u] !== rules.classOf[v] || rules.fixed[u] || rules.fixed[v]) continue;
    slots[one] = v;
    slots[other] = u;
    refresh(a);
    refresh(b);
    const found = gaps();
    const after = cost(found);
    if (after <= now || random() < Math.exp((now - after) / heat)) {
      now = after;
      if (found.charging <= limit && (found.holding < best.gaps.holding || best.gaps.charging > limit)) {
        best.gaps = found;
        best.slots.set(slots);
      }
    } else {
      slots[one] = u;
      slots[other] = v;
      refresh(a);
      refresh(b);
    }
  }
  slots.set(best.slots);
  return best.gaps;
}
