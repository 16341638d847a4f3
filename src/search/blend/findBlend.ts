// Finds the cheapest blend and proves it, or says how far the best one found may be from it when told to stop.
import { type Ascent, ascendCost, ascendFeasibility, ascendFrom } from "./ascent.ts";
import { buildCapacityBound, type CapacityBound, rootBound, stepsWithin } from "./capacityBound.ts";
import { buildCore, standing, survivingOptions } from "./core.ts";
import { BOUND_SLACK, type Multipliers, wholeBound } from "./dual.ts";
import { blendTotals, isFittingBlend, tidyCounts } from "./evaluate.ts";
import type { BlendModel } from "./model.ts";
import { buildPool } from "./pool.ts";
import { pricedCeilings } from "./pricedCeilings.ts";
import { withShares } from "./shipments.ts";
import { bestSingle, beyondAnyCost, type FoundBlend } from "./singles.ts";
import { thinCore } from "./thinCore.ts";
import { tightenCore } from "./tightenCore.ts";
import { type Budget, walkCore } from "./walk.ts";

export interface BlendLimits {
  /** Most steps of work; a step is one look at one option, some tenths of a microsecond. Absent: no limit. */
  readonly work?: number;
  /** Asked every thousand steps or so; true ends the search. */
  readonly stop?: () => boolean;
}

export interface BlendAnswer {
  /** `stopped` means that `best` may not be the cheapest, or that a blend may exist where none was found. */
  readonly status: "optimal" | "infeasible" | "stopped";
  readonly best: FoundBlend | null;
  /** No blend costs less than this; Infinity when none exists. */
  readonly lowerBound: number;
  /** (cost - lowerBound)/cost; 0 when proven, null when nothing was found. */
  readonly gap: number | null;
  /** Prices behind the bound: of the cost, or (cost = 0) those that prove that no blend exists. */
  readonly prices: Multipliers;
  /** Steps of work spent, and the size of the last core walked. */
  readonly work: number;
  readonly coreOptions: number;
  readonly corePairs: number;
}

/** Thresholds rise from the bound by this fraction of it, then four times as far each time. */
const FIRST_RISE = 0.002;
const FINE_RISE = 0.0005;
const RISE = 4;
/** After so many rises without a blend, everything is searched. */
const MOST_RISES = 6;
/** With so few options left under the best blend known, no rising threshold is needed. */
const FEW_OPTIONS = 24;
/** Fewer pairs are walked sooner than thinned. */
const FEW_PAIRS = 60;
/** Work that a walk may take before the capacity bound is made; and then, as that is made finer and finer. */
const PLAIN_WORK = 125_000;
const STAGES = [
  { effort: 4e6, steps: 2048, work: 80_000, fine: false },
  { effort: 4e6, steps: 2048, work: 200_000, fine: true },
  { effort: 3e7, steps: 16384, work: 2_000_000, fine: true },
  { effort: 2e8, steps: 65536, work: Number.POSITIVE_INFINITY, fine: true },
] as const;
/** Before the fine steps, one look at how far the capacity bound lifts the bound. */
const LOOK_AHEAD = 0.08;

export const NO_PRICES: Multipliers = { cost: 1, capacity: 0, volume: 0, mass: 0, units: 0 };

/** The cheapest blend of `model`, which must be sound (see `blendModelFaults`). */
export function findBlend(model: BlendModel, limits: BlendLimits = {}): BlendAnswer {
  const budget: Budget = {
    spent: 0,
    most: limits.work ?? Number.POSITIVE_INFINITY,
    stop: limits.stop ?? (() => false),
  };
  // Bounds and walks see shipments as shares, never too much of them; what is found is counted in full.
  const shared = withShares(model);
  const pool = buildPool(shared, null, false);
  let best = bestSingle(model, pool);
  let core = { options: 0, pairs: 0 };
  let lower = 0;
  let ascent: Ascent = { prices: NO_PRICES, value: 0 };
  const answer = (status: BlendAnswer["status"], prices = ascent.prices): BlendAnswer => ({
    status,
    best,
    lowerBound: status === "optimal" ? best!.cost : status === "infeasible" ? Number.POSITIVE_INFINITY : lower,
    gap: best === null ? null : status === "optimal" || best.cost === 0 ? 0 : (best.cost - lower) / best.cost,
    prices,
    work: budget.spent,
    coreOptions: core.options,
    corePairs: core.pairs,
  });

  const reach = best === null ? ascendFeasibility(pool, model.maxTypes) : null;
  if (reach !== null && reach.value > 1e-9) return answer("infeasible", reach.prices);
  ascent = ascendCost(pool, model.maxTypes, best === null ? Number.POSITIVE_INFINITY : best.cost - 1 + 2 * BOUND_SLACK);
  lower = Math.max(0, wholeBound(ascent.value));
  const at = standing(pool, ascent.prices, model.maxTypes);
  let ceiling = best === null ? Number.POSITIVE_INFINITY : best.cost;
  let rise = Math.max(1, Math.ceil(FIRST_RISE * lower));
  let stage = -1;
  let looking = false;
  let ceilingPrices = NO_PRICES;
  let known: { readonly under: number; readonly options: readonly number[] } | null = null;
  for (let round = 0; lower < ceiling; round += 1) {
    if (ceiling === Number.POSITIVE_INFINITY && round >= MOST_RISES) ceiling = beyondAnyCost(model, pool);
    let threshold = round >= MOST_RISES && stage < 0 ? ceiling : Math.min(ceiling, lower + rise);
    if (budget.stop()) return answer("stopped");
    let options: readonly number[] =
      known !== null && threshold <= known.under ? known.options : survivingOptions(pool, at, threshold);
    if (stage < 0 && threshold < ceiling && ceiling < Number.POSITIVE_INFINITY) {
      const all = survivingOptions(pool, at, ceiling);
      if (all.length <= FEW_OPTIONS) {
        threshold = ceiling;
        options = all;
      }
    }
    const near = buildPool(shared, options, true);
    const closer = ascendFrom(near, model.maxTypes, ascent.prices, threshold - 1 + 2 * BOUND_SLACK, 16);
    lower = Math.max(lower, Math.min(threshold, wholeBound(closer.value)));
    rise *= RISE;
    if (lower >= threshold) continue;
    const whole = buildCore(shared, near, closer.value >= ascent.value ? closer.prices : ascent.prices, threshold);
    let left = whole.pairs > FEW_PAIRS ? thinCore(whole) : whole;
    // What was ruled out under a threshold stays ruled out under every lower one.
    if (known === null || threshold > known.under || threshold >= ceiling) {
      known = { under: threshold, options: left.columns.map(({ option }) => option) };
    }
    let bound: CapacityBound | null = null;
    if (stage >= 0) {
      const { effort, steps, fine } = STAGES[stage]!;
      // Making the tables is work too; an addition there is a hundredth of a look.
      budget.spent += effort / 50;
      const count = (): number => stepsWithin(left, effort, steps);
      if (looking) ceilingPrices = pricedCeilings(left, stepsWithin(left, effort / 30, steps));
      bound = buildCapacityBound(left, count(), fine ? ceilingPrices : left.prices);
      lower = Math.max(lower, Math.min(threshold, wholeBound(rootBound(left, bound))));
      if (lower >= threshold) continue;
      if (looking) {
        looking = false;
        rise = Math.max(1, Math.ceil(FINE_RISE * lower));
        continue;
      }
      if (fine) {
        left = tightenCore(left, bound, threshold - 1 + BOUND_SLACK);
        bound = buildCapacityBound(left, count(), ceilingPrices);
      }
    }
    core = { options: left.columns.length, pairs: left.pairs };
    let met = false;
    const end = walkCore({
      core: left,
      threshold,
      feasibility: reach?.prices ?? null,
      budget,
      bound,
      most: stage < 0 ? PLAIN_WORK : STAGES[stage]!.work,
      found: (counts, shares) => {
        const cost = shared === model ? shares : blendTotals(model, counts)!.cost;
        if (cost >= Math.min(threshold, best?.cost ?? threshold) || !isFittingBlend(model, counts))
          return Math.min(threshold, best?.cost ?? threshold);
        best = { counts: tidyCounts(counts), cost };
        met = true;
        return cost;
      },
    });
    if (end === "stopped") return answer("stopped");
    if (end === "complete") {
      if (met) return answer("optimal");
      lower = threshold;
      continue;
    }
    if (met) ceiling = best!.cost;
    stage += 1;
    looking = STAGES[stage]!.fine;
    rise = looking ? Math.max(1, Math.ceil(LOOK_AHEAD * lower)) : Math.max(1, threshold - lower);
  }
  return answer(best === null ? "infeasible" : "optimal");
}
