/*
 * Uses the freedom that charging leaves for holding: least holding gap among placings whose charging gap stays within a limit.
 *
 *   symbol  unit    meaning
 *   S_j     F       stage capacitance;  charging gap n/sum_j(m/S_j) - 1
 *   G_j     S       stage conductance, sum of I_leak/V_meas and the balancing resistor;  holding gap likewise
 *
 * Random swaps under a falling temperature on  holding gap + weight * (charging gap above the limit). Leakage is taken as a
 * conductance: in proportion to voltage. Source: [Kirkpatrick1983] for the method; [methods-derived] the two gaps.
 */
import { power } from "../quantity/index.ts";
import { type Board, mayExchange, recount, stageOf } from "./board.ts";
import { type Effort, mayGoOn } from "./effort.ts";
import { stageGap } from "./gap.ts";
import type { Random } from "./random.ts";

export interface TwoGoals {
  /** Conductance of each unit by leakage, S; with `fixed` per stage. */
  readonly conductances: Float64Array;
  /** Conductance of a stage's balancing resistor, S. */
  readonly perStage: number;
  /** The charging gap may not exceed this. */
  readonly limit: number;
  /** Stop at this holding gap or below. */
  readonly target: number;
  /** May units be exchanged with the spares? */
  readonly spares: boolean;
  readonly moves: number;
}

const WEIGHT = 20;
const HOTTEST = 0.03;
const COLDEST = 3e-5;
const CHUNK = 2000;

export interface Gaps {
  readonly charging: number;
  readonly holding: number;
}

/** Stage conductances of a board. */
export function stageConductances(at: Board, conductances: Float64Array, perStage: number): Float64Array {
  const sums = new Float64Array(at.stages).fill(perStage);
  for (let slot = 0; slot < at.stages * at.size; slot++) {
    const j = Math.floor(slot / at.size);
    sums[j] = sums[j]! + conductances[at.slots[slot]!]!;
  }
  return sums;
}

export const bothGaps = (at: Board, conductances: Float64Array, perStage: number): Gaps => ({
  charging: stageGap(at.sums, at.stages),
  holding: stageGap(stageConductances(at, conductances, perStage), at.stages),
});

/** Works on `at` in place, ends at the best placing within the limit (the one it began with, if none is better). */
export function* holdLevel(at: Board, goals: TwoGoals, random: Random, work: Effort): Generator<Gaps, Gaps> {
  const { conductances, limit, moves } = goals;
  const { stages, size, values, slots } = at;
  const held = stageConductances(at, conductances, goals.perStage);
  const { sums } = at;
  const placed = stages * size;
  const reach = goals.spares ? slots.length : placed;
  const best = { slots: Int32Array.from(slots), ...bothGaps(at, conductances, goals.perStage) };
  let inverseS = 0;
  let inverseG = 0;
  for (let j = 0; j < stages; j++) {
    inverseS += 1 / sums[j]!;
    inverseG += 1 / held[j]!;
  }
  const cost = (charging: number, holding: number): number => holding + WEIGHT * Math.max(0, charging - limit);
  let now = cost(best.charging, best.holding);
  let heat = HOTTEST;
  const fall = power(COLDEST / HOTTEST, 1 / moves);
  for (let move = 0; move < moves && stages > 1; move++) {
    heat *= fall;
    if (move % CHUNK === CHUNK - 1) {
      if (best.holding <= goals.target || !mayGoOn(work, CHUNK)) break;
      if (move % (20 * CHUNK) === CHUNK - 1) yield best;
    }
    const one = Math.floor(random() * placed);
    const other = Math.floor(random() * reach);
    const a = Math.floor(one / size);
    const b = stageOf(at, other);
    if (a === b || !mayExchange(at, one, other)) continue;
    const u = slots[one]!;
    const v = slots[other]!;
    const dS = values[v]! - values[u]!;
    const dG = conductances[v]! - conductances[u]!;
    const [oldSa, oldGa] = [sums[a]!, held[a]!];
    const oldSb = b < stages ? sums[b]! : 0;
    const oldGb = b < stages ? held[b]! : 0;
    let newS = inverseS - 1 / oldSa + 1 / (oldSa + dS);
    let newG = inverseG - 1 / oldGa + 1 / (oldGa + dG);
    sums[a] = oldSa + dS;
    held[a] = oldGa + dG;
    if (b < stages) {
      newS += 1 / (oldSb - dS) - 1 / oldSb;
      newG += 1 / (oldGb - dG) - 1 / oldGb;
      sums[b] = oldSb - dS;
      held[b] = oldGb - dG;
    }
    let leastS = sums[0]!;
    let leastG = held[0]!;
    for (let j = 1; j < stages; j++) {
      if (sums[j]! < leastS) leastS = sums[j]!;
      if (held[j]! < leastG) leastG = held[j]!;
    }
    const charging = stages / (leastS * newS) - 1;
    const holding = stages / (leastG * newG) - 1;
    const after = cost(charging, holding);
    if (after <= now || random() < Math.exp((now - after) / heat)) {
      slots[one] = v;
      slots[other] = u;
      now = after;
      inverseS = newS;
      inverseG = newG;
      if (charging <= limit && (holding < best.holding || best.charging > limit)) {
        Object.assign(best, { charging, holding });
        best.slots.set(slots);
      }
    } else {
      sums[a] = oldSa;
      held[a] = oldGa;
      if (b < stages) {
        sums[b] = oldSb;
        held[b] = oldGb;
      }
    }
  }
  slots.set(best.slots);
  recount(at);
  return bothGaps(at, conductances, goals.perStage);
}
