// The first blends to hold others against: the cheapest bank of one string type, and a cost that no blend reaches.
import { isFittingBlend } from "./evaluate.ts";
import type { BlendCount, BlendModel, CostFloor } from "./model.ts";
import { type Pool, stringsToReach } from "./pool.ts";
import { allShipments, shipmentCost } from "./shipments.ts";

export interface FoundBlend {
  readonly counts: readonly BlendCount[];
  /** Whole minor units of money. */
  readonly cost: number;
}

const floorCost = ({ fixed, perString, least = 0 }: CostFloor, strings: number): number =>
  Math.max(least, fixed + perString * strings);

/** Cheapest bank of one string type, or null. `model` without shares in its tables. */
export function bestSingle(model: BlendModel, pool: Pool): FoundBlend | null {
  let best: FoundBlend | null = null;
  for (let k = 0; k < pool.size; k += 1) {
    const strings = stringsToReach(1, pool.capacity[k]!);
    if (strings > pool.most[k]!) continue;
    const from = model.options[pool.option[k]!]!;
    const sent = shipmentCost(model, [pool.option[k]!]);
    if (best !== null && from.floor && floorCost(from.floor, strings) + sent >= best.cost) continue;
    const cost = from.costs[strings]! + sent;
    if (best !== null && cost >= best.cost) continue;
    const counts = [{ option: pool.option[k]!, strings }];
    if (isFittingBlend(model, counts)) best = { counts, cost };
  }
  return best;
}

/** One more than any blend can cost. */
export function beyondAnyCost(model: BlendModel, pool: Pool): number {
  const dearest = Array.from({ length: pool.size }, (_, k) => model.options[pool.option[k]!]!.costs[pool.most[k]!]!);
  dearest.sort((a, b) => b - a);
  return dearest.slice(0, model.maxTypes).reduce((sum, cost) => sum + cost, 0) + allShipments(model) + 1;
}
