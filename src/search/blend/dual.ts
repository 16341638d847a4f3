// The Lagrangian bound: what the cheapest blend must cost at least, for given prices on capacity, volume, mass and units.
import type { Pool } from "./pool.ts";

/**
 * Prices on the normalised rows, each >= 0, minor units of money per 1.0 of the row. `cost` weighs the purchase cost:
 * 1 bounds the cost; 0 asks only whether the rows can be met at all (a bound above 0 then says they cannot).
 */
export interface Multipliers {
  readonly cost: 0 | 1;
  readonly capacity: number;
  readonly volume: number;
  readonly mass: number;
  readonly units: number;
}

/** Slope of the bound along (capacity, volume, mass, units) and its value. Reused between calls to spare the collector. */
export interface DualPoint {
  value: number;
  readonly slope: Float64Array;
}

export const dualPoint = (): DualPoint => ({ value: 0, slope: new Float64Array(4) });

/** Rounding errors of a bound stay far below this, and costs are whole: bounds are compared with this much slack. */
export const BOUND_SLACK = 1e-3;

/** Least whole cost that a real-valued bound proves. */
export const wholeBound = (bound: number): number => Math.ceil(bound - BOUND_SLACK);

/** What a string of column k is worth under the prices. */
export const worth = (pool: Pool, k: number, prices: Multipliers): number =>
  prices.capacity * pool.capacity[k]! -
  prices.volume * pool.volume[k]! -
  prices.mass * pool.mass[k]! -
  prices.units * pool.units[k]!;

/**
 * Value of the bound: prices times limits plus the `maxTypes` most negative reduced costs, each taken over the hull. For a
 * fixed set of prices each option stands alone, so the limit on types is met exactly by picking the best few.
 * Source: [Geoffrion] Lagrangean relaxation for integer programming, Mathematical Programming Study 2 (1974) (from memory)
 */
export function evaluateDual(pool: Pool, prices: Multipliers, maxTypes: number, out: DualPoint): void {
  const { size, capacity, volume, mass, units, start, hullX, hullCost } = pool;
  const { cost: weight, capacity: pc, volume: pv, mass: pm, units: pu } = prices;
  const room = Math.min(maxTypes, size);
  const bestValue = new Float64Array(room);
  const bestColumn = new Int32Array(room).fill(-1);
  const bestStrings = new Float64Array(room);
  let filled = 0;
  for (let k = 0; k < size; k += 1) {
    const gain = pc * capacity[k]! - pv * volume[k]! - pm * mass[k]! - pu * units[k]!;
    if (gain <= 0) continue;
    const bar = filled === room ? bestValue[room - 1]! : 0;
    let low = bar;
    let strings = 0;
    for (let p = start[k]!; p < start[k + 1]!; p += 1) {
      const reduced = weight * hullCost[p]! - gain * hullX[p]!;
      if (reduced < low) {
        low = reduced;
        strings = hullX[p]!;
      }
    }
    if (strings === 0) continue;
    let at = filled < room ? filled : room - 1;
    while (at > 0 && bestValue[at - 1]! > low) {
      bestValue[at] = bestValue[at - 1]!;
      bestColumn[at] = bestColumn[at - 1]!;
      bestStrings[at] = bestStrings[at - 1]!;
      at -= 1;
    }
    bestValue[at] = low;
    bestColumn[at] = k;
    bestStrings[at] = strings;
    if (filled < room) filled += 1;
  }
  let value = pc - pv - pm - pu;
  const slope = out.slope;
  slope[0] = 1;
  slope[1] = -1;
  slope[2] = -1;
  slope[3] = -1;
  for (let at = 0; at < filled; at += 1) {
    const k = bestColumn[at]!;
    const x = bestStrings[at]!;
    value += bestValue[at]!;
    slope[0] -= capacity[k]! * x;
    slope[1] += volume[k]! * x;
    slope[2] += mass[k]! * x;
    slope[3] += units[k]! * x;
  }
  out.value = value;
}
