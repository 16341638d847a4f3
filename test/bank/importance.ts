// Importance sampling of a bank with one stage over its limit: an outside witness of chances too small to count.
import { streamState, uniformFrom } from "../../src/bank/random.ts";

export interface Estimate {
  readonly exceed: number;
  readonly error: number;
}

export interface ImportanceCase {
  readonly n: number;
  readonly p: number;
  readonly low: number;
  readonly high: number;
  readonly share: number;
}

/** A draw in [0, 1) of density k exp(k x)/(exp(k) - 1), and the factor by which an even draw is rarer there. */
function tilted(u: number, k: number): { readonly x: number; readonly weight: number } {
  if (Math.abs(k) < 1e-9) return { x: u, weight: 1 };
  const x = Math.log1p(u * Math.expm1(k)) / k;
  return { x, weight: Math.expm1(k) / (k * Math.exp(k * x)) };
}

/**
 * Units uniform, cross-tied. Stage 1 is drawn towards the low end, the others towards the high end; each bank in which it is over counts with
 * its likelihood ratio over the number of stages that are over, so the sum over the n stages is any of them being over.
 */
export function importanceTail(given: ImportanceCase, banks: number, seed: number): Estimate {
  let best = { victim: 0, others: 0, spread: Number.POSITIVE_INFINITY };
  // A steep tilt of many units draws so narrowly that a short pilot run cannot see what it misses.
  const steep = given.n * given.p <= 4;
  for (const victim of steep ? [-10, -100, -1000] : [-1, -2, -4, -7, -12])
    for (const others of steep ? [5, 50, 500] : [0.3, 0.8, 1.5, 3, 6]) {
      const { exceed, error } = run(given, { victim, others }, 2000, seed + 1);
      if (exceed > 0 && error / exceed < best.spread) best = { victim, others, spread: error / exceed };
    }
  return run(given, best, banks, seed);
}

function run(
  { n, p, low, high, share }: ImportanceCase,
  tilts: { readonly victim: number; readonly others: number },
  banks: number,
  seed: number,
): Estimate {
  const draw = uniformFrom(streamState(seed, 77));
  let sum = 0;
  let squares = 0;
  const inverse = new Float64Array(n);
  for (let bank = 0; bank < banks; bank++) {
    let weight = 1;
    let total = 0;
    for (let stage = 0; stage < n; stage++) {
      let capacitance = 0;
      for (let unit = 0; unit < p; unit++) {
        const drawn = tilted(draw(), stage === 0 ? tilts.victim : tilts.others);
        weight *= drawn.weight;
        capacitance += low + (high - low) * drawn.x;
      }
      inverse[stage] = 1 / capacitance;
      total += inverse[stage]!;
    }
    if (!(inverse[0]! > share * total)) continue;
    let over = 0;
    for (const value of inverse) if (value > share * total) over++;
    const value = (n * weight) / over;
    sum += value;
    squares += value * value;
  }
  const exceed = sum / banks;
  return { exceed, error: Math.sqrt(Math.max(0, squares / banks - exceed * exceed) / banks) };
}
