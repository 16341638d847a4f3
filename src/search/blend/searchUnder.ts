// Walks through all blends under a threshold, for those who want more than the cheapest one.
import { ascendCost, ascendFrom } from "./ascent.ts";
import { buildCapacityBound, type CapacityBound, stepsWithin } from "./capacityBound.ts";
import { buildCore, type Core, standing, survivingOptions } from "./core.ts";
import { blendTotals } from "./evaluate.ts";
import type { BlendLimits } from "./findBlend.ts";
import type { BlendCount, BlendModel } from "./model.ts";
import { buildPool } from "./pool.ts";
import { withShares } from "./shipments.ts";
import { type Budget, walkCore } from "./walk.ts";

/** Work after which the capacity bound is worth its making. */
const PLAIN_WORK = 125_000;

/** The options and counts of which every blend cheaper than `threshold` is made. */
export function coreUnder(given: BlendModel, threshold: number): Core {
  const model = withShares(given);
  const pool = buildPool(model, null, false);
  const ascent = ascendCost(pool, model.maxTypes, Number.POSITIVE_INFINITY);
  const left = survivingOptions(pool, standing(pool, ascent.prices, model.maxTypes), threshold);
  const near = buildPool(model, left, true);
  const closer = ascendFrom(near, model.maxTypes, ascent.prices, Number.POSITIVE_INFINITY, 24);
  return buildCore(model, near, closer.value > ascent.value ? closer.prices : ascent.prices, threshold);
}

/**
 * Tells `found` of every blend (shipments counted) cheaper than the threshold that it last answered, none with a string to spare in its last
 * option. False when the limits ended the walk. A blend may be told twice.
 */
export function searchUnder(
  model: BlendModel,
  threshold: number,
  found: (counts: readonly BlendCount[], cost: number) => number,
  limits: BlendLimits = {},
): boolean {
  const budget: Budget = {
    spent: 0,
    most: limits.work ?? Number.POSITIVE_INFINITY,
    stop: limits.stop ?? (() => false),
  };
  const core = coreUnder(model, threshold);
  let current = threshold;
  const walk = (bound: CapacityBound | null, most: number) =>
    walkCore({
      core,
      threshold: current,
      feasibility: null,
      budget,
      bound,
      most,
      found: (counts, shares) => {
        const cost = withShares(model) === model ? shares : blendTotals(model, counts)!.cost;
        if (cost < current) current = found(counts, cost);
        return current;
      },
    });
  const first = walk(null, PLAIN_WORK);
  if (first !== "capped") return first === "complete";
  const bound = buildCapacityBound(core, stepsWithin(core, 4e6, 2048), core.prices);
  return walk(bound, Number.POSITIVE_INFINITY) === "complete";
}
