// What is left of the options once the bound has spoken: those that a blend cheaper than a threshold could still use.
import { BOUND_SLACK, dualPoint, evaluateDual, type Multipliers, worth } from "./dual.ts";
import type { BlendModel } from "./model.ts";
import type { Pool } from "./pool.ts";
import { shareOf, shipmentShares } from "./shipments.ts";

/** Least reduced cost of column k with at least one string, over its hull. */
export function reducedCost(pool: Pool, k: number, prices: Multipliers): number {
  const gain = worth(pool, k, prices);
  let low = Number.POSITIVE_INFINITY;
  for (let p = pool.start[k]!; p < pool.start[k + 1]!; p += 1) {
    low = Math.min(low, prices.cost * pool.hullCost[p]! - gain * pool.hullX[p]!);
  }
  return low;
}

/** The bound at some prices, and the room that it leaves below a threshold. */
export interface Standing {
  readonly value: number;
  /** Least reduced cost of each column, at least one string taken. */
  readonly reduced: Float64Array;
  /** Reduced cost of the last of the best `maxTypes`, or 0 when fewer are below 0: what a newcomer displaces. */
  readonly bar: number;
}

export function standing(pool: Pool, prices: Multipliers, maxTypes: number): Standing {
  const point = dualPoint();
  evaluateDual(pool, prices, maxTypes, point);
  const reduced = new Float64Array(pool.size);
  for (let k = 0; k < pool.size; k += 1) reduced[k] = reducedCost(pool, k, prices);
  const below = reduced.filter((value) => value < 0).sort();
  return { value: point.value, reduced, bar: below.length < maxTypes ? 0 : below[maxTypes - 1]! };
}

/** Largest reduced cost that an option may have and still be part of a blend that costs less than `threshold`. */
export const reducedLimit = (at: Standing, threshold: number): number =>
  at.bar + Math.max(0, threshold - 1 + BOUND_SLACK - at.value);

/** Places in the model of the columns that a blend cheaper than `threshold` could use. */
export function survivingOptions(pool: Pool, at: Standing, threshold: number): number[] {
  const limit = reducedLimit(at, threshold);
  const left: number[] = [];
  for (let k = 0; k < pool.size; k += 1) if (at.reduced[k]! <= limit) left.push(pool.option[k]!);
  return left;
}

/** One option of the core with the string counts that survive, best first. */
export interface CoreColumn {
  readonly option: number;
  readonly part: number;
  readonly capacity: number;
  readonly volume: number;
  readonly mass: number;
  readonly units: number;
  readonly most: number;
  /** Whom it needs a shipment from, and the part of `costs` that is its share of them. */
  readonly suppliers: readonly number[];
  readonly share: number;
  readonly costs: Float64Array;
  /** Surviving counts and their reduced costs, ascending by the latter. */
  readonly strings: Int32Array;
  readonly reduced: Float64Array;
}

export interface Core {
  readonly columns: readonly CoreColumn[];
  readonly prices: Multipliers;
  readonly maxTypes: number;
  /** The limit on types, or the number of columns where that is less. */
  readonly maxTypesHere: number;
  /** Number of (option, count) pairs. */
  readonly pairs: number;
}

/** The pairs of a pool with exact hulls that a blend cheaper than `threshold` could use, best columns first. */
export function buildCore(model: BlendModel, pool: Pool, prices: Multipliers, threshold: number): Core {
  const at = standing(pool, prices, model.maxTypes);
  const slack = Math.max(0, threshold - 1 + BOUND_SLACK - at.value);
  const shares = shipmentShares(model);
  const columns: CoreColumn[] = [];
  let pairs = 0;
  for (let k = 0; k < pool.size; k += 1) {
    // A column among the best few is compared with itself, any other displaces the last of them.
    const own = slack + Math.min(at.reduced[k]!, at.bar);
    const from = model.options[pool.option[k]!]!;
    const gain = worth(pool, k, prices);
    const kept: { x: number; reduced: number }[] = [];
    for (let x = 1; x <= pool.most[k]!; x += 1) {
      const reduced = from.costs[x]! - gain * x;
      if (reduced <= own) kept.push({ x, reduced });
    }
    if (kept.length === 0) continue;
    kept.sort((a, b) => a.reduced - b.reduced || a.x - b.x);
    pairs += kept.length;
    columns.push({
      option: pool.option[k]!,
      part: from.partIndex,
      capacity: pool.capacity[k]!,
      volume: pool.volume[k]!,
      mass: pool.mass[k]!,
      units: pool.units[k]!,
      most: pool.most[k]!,
      suppliers: from.suppliers ?? [],
      share: shareOf(from, shares),
      costs: from.costs,
      strings: Int32Array.from(kept, ({ x }) => x),
      reduced: Float64Array.from(kept, ({ reduced }) => reduced),
    });
  }
  columns.sort((a, b) => a.reduced[0]! - b.reduced[0]! || a.option - b.option);
  return { columns, prices, maxTypes: model.maxTypes, maxTypesHere: Math.min(model.maxTypes, columns.length), pairs };
}
