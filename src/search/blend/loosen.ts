// The least that each limit must give for a blend to exist at all, the others kept: which ceiling to loosen first.
import { blendTotals, isFittingBlend } from "./evaluate.ts";
import { type BlendAnswer, type BlendLimits, findBlend } from "./findBlend.ts";
import type { BlendCount, BlendModel, BlendOption } from "./model.ts";
import type { CeilingName } from "./pool.ts";

/** Amounts are counted in steps of the largest possible total over this, so that sums stay whole. */
const FINENESS = 1e9;

export interface LeastAmount {
  /** `stopped`: `amount` can be had, but less might do. */
  readonly status: BlendAnswer["status"];
  readonly counts: readonly BlendCount[] | null;
  /** Least total of the row, within 1e-8 of it; null when not even without that ceiling does a blend exist. */
  readonly amount: number | null;
}

/** The blend with the least volume, mass or units, whatever it costs; the ceiling on that row itself is left out. */
export function leastAmount(model: BlendModel, row: CeilingName, limits: BlendLimits = {}): LeastAmount {
  const largest = model.options.map((option) => option[row] * option.maxStrings).sort((a, b) => b - a);
  const total = largest.slice(0, model.maxTypes).reduce((sum, amount) => sum + amount, 0);
  const step = row === "units" ? 1 : total / FINENESS || 1;
  const options = model.options.map((option): BlendOption => {
    const { floor: _floor, suppliers: _suppliers, ...facts } = option;
    const costs = Float64Array.from({ length: option.maxStrings + 1 }, (_, x) => Math.round((option[row] * x) / step));
    return { ...facts, costs };
  });
  const answer = findBlend(
    { ...model, shipments: [], options, ceilings: { ...model.ceilings, [row]: Number.POSITIVE_INFINITY } },
    limits,
  );
  const counts = answer.best?.counts ?? null;
  return { status: answer.status, counts, amount: counts === null ? null : blendTotals(model, counts)![row] };
}

export interface Loosening {
  readonly limit: CeilingName | "ceilings" | "types" | "requirement";
  /** For all ceilings together a factor, from 1. */
  readonly from: number;
  /** Least change that makes a blend possible; null when this limit alone cannot. */
  readonly to: number | null;
  /** |to/from - 1|; null where `to` is null. */
  readonly change: number | null;
  /** Cheapest blend once it is loosened, minor units; null when it was not found within the limits. */
  readonly cost: number | null;
  readonly proven: boolean;
}

/** For a model that no blend meets: each limit loosened alone, the least change first. */
export function findLoosenings(model: BlendModel, limits: BlendLimits = {}): readonly Loosening[] {
  const found = [
    ...(["volume", "mass", "units"] as const)
      .filter((row) => model.ceilings[row] < Number.POSITIVE_INFINITY)
      .map((row) => loosenCeiling(model, row, limits)),
    ...loosenTogether(model, limits),
    loosenTypes(model, limits),
    loosenRequirement(model, limits),
  ];
  return found.sort((a, b) => (a.change ?? Number.POSITIVE_INFINITY) - (b.change ?? Number.POSITIVE_INFINITY));
}

function outcome(
  limit: Loosening["limit"],
  from: number,
  to: number | null,
  priced: BlendAnswer | null,
  proven: boolean,
): Loosening {
  const change = to === null ? null : from === 0 ? Number.POSITIVE_INFINITY : Math.abs(to / from - 1);
  return { limit, from, to, change, cost: priced?.best?.cost ?? null, proven: proven && priced?.status !== "stopped" };
}

function loosenCeiling(model: BlendModel, row: CeilingName, limits: BlendLimits): Loosening {
  const least = leastAmount(model, row, limits);
  const from = model.ceilings[row];
  if (least.amount === null) return outcome(row, from, null, null, least.status === "infeasible");
  const to = Math.max(from, least.amount);
  const priced = findBlend({ ...model, ceilings: { ...model.ceilings, [row]: to } }, limits);
  return outcome(row, from, to, priced, least.status === "optimal");
}

/** Where two or more ceilings stand in the way: the least factor on all of them, by halving, good to 1e-6. */
function loosenTogether(model: BlendModel, limits: BlendLimits): readonly Loosening[] {
  const rows = (["volume", "mass", "units"] as const).filter((row) => model.ceilings[row] < Number.POSITIVE_INFINITY);
  if (rows.length < 2 || rows.some((row) => model.ceilings[row] === 0)) return [];
  const under = (factor: number): BlendAnswer => {
    const { volume, mass, units } = model.ceilings;
    const ceilings = { volume: volume * factor, mass: mass * factor, units: units * factor };
    return findBlend({ ...model, ceilings }, limits);
  };
  let [low, high] = [1, 2];
  let best = under(high);
  while (best.best === null && high < 1e6) {
    low = high;
    high *= 4;
    best = under(high);
  }
  if (best.best === null) return [outcome("ceilings", 1, null, null, best.status === "infeasible")];
  let proven = true;
  while (high - low > 1e-6 * low) {
    const middle = (low + high) / 2;
    const answer = under(middle);
    proven &&= answer.status !== "stopped";
    if (answer.best === null) low = middle;
    else {
      // No less than what this blend takes of the row that it fills most.
      const totals = blendTotals(model, answer.best.counts)!;
      best = answer;
      high = Math.min(middle, Math.max(low, ...rows.map((row) => totals[row] / model.ceilings[row])));
    }
  }
  return [outcome("ceilings", 1, high, best, proven)];
}

function loosenTypes(model: BlendModel, limits: BlendLimits): Loosening {
  for (let types = model.maxTypes; types <= model.options.length; types += 1) {
    const answer = findBlend({ ...model, maxTypes: types }, limits);
    if (answer.best !== null) return outcome("types", model.maxTypes, types, answer, true);
    if (answer.status === "stopped") return outcome("types", model.maxTypes, null, null, false);
  }
  return outcome("types", model.maxTypes, null, null, true);
}

/** Largest need that can be met, by halving; each half is settled by a search, so the answer is good to 1e-6 of the need. */
function loosenRequirement(model: BlendModel, limits: BlendLimits): Loosening {
  let low = 0;
  let high = model.requirement;
  let best: BlendAnswer | null = null;
  let proven = true;
  while (high - low > 1e-6 * model.requirement) {
    const requirement = (low + high) / 2;
    const answer = findBlend({ ...model, requirement }, limits);
    proven &&= answer.status !== "stopped";
    if (answer.best !== null && isFittingBlend({ ...model, requirement }, answer.best.counts)) {
      best = answer;
      low = Math.min(high, Math.max(requirement, blendTotals(model, answer.best.counts)!.capacity));
    } else high = requirement;
  }
  return outcome("requirement", model.requirement, best === null ? null : low, best, proven);
}
