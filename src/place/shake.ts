// Random swaps under a falling temperature: frees a placing of unequal lots on which exchanges stick.
import { power } from "../quantity/index.ts";
import { type Board, exchange, mayExchange, recount } from "./board.ts";
import { type Effort, mayGoOn } from "./effort.ts";
import type { Random } from "./random.ts";

/** Temperature falls by this factor from the first to the last move. */
const COOLING = 1e-4;

/**
 * Lowers sum (S_j - mean)^2 by `moves` random swaps between stages (spares are left alone), accepting worse ones with the chance
 * exp(-rise/temperature). Works on `at` in place.
 */
export function shake(at: Board, moves: number, random: Random, work: Effort): void {
  const placed = at.stages * at.size;
  if (at.stages < 2) return;
  const mean = at.sums.reduce((sum, s) => sum + s, 0) / at.stages;
  // Start where the mean swap between neighbours of the sorted lot is still accepted often.
  let step = 0;
  for (let i = 0; i < placed; i++) step += Math.abs(at.values[at.slots[i]!]! - mean / at.size);
  let heat = (step / placed) ** 2;
  const fall = power(COOLING, 1 / moves);
  for (let move = 0; move < moves; move++) {
    heat *= fall;
    const one = Math.floor(random() * placed);
    const other = Math.floor(random() * placed);
    const a = Math.floor(one / at.size);
    const b = Math.floor(other / at.size);
    if (a === b || !mayExchange(at, one, other)) continue;
    const gain = at.values[at.slots[other]!]! - at.values[at.slots[one]!]!;
    // (S_a + g)^2 + (S_b - g)^2 against S_a^2 + S_b^2, all about the mean.
    const rise = 2 * gain * (at.sums[a]! - at.sums[b]! + gain);
    if (rise <= 0 || random() < Math.exp(-rise / heat)) exchange(at, one, other);
  }
  recount(at);
  mayGoOn(work, moves);
}
