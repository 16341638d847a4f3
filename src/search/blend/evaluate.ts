// Adds up a blend from the model alone and says whether it fits; every engine's answer goes through here.
import { type BlendCount, type BlendModel, FIT_TOLERANCE } from "./model.ts";
import { shipmentCost } from "./shipments.ts";

export interface BlendTotals {
  /** Whole minor units of money, shipments included. */
  readonly cost: number;
  /** F, m3, kg, number of units, number of string types. */
  readonly capacity: number;
  readonly volume: number;
  readonly mass: number;
  readonly units: number;
  readonly types: number;
}

/** Totals of a blend, or null when a count is not a whole number within the option's strings, or an option is named twice. */
export function blendTotals(model: BlendModel, counts: readonly BlendCount[]): BlendTotals | null {
  const totals = { cost: 0, capacity: 0, volume: 0, mass: 0, units: 0, types: 0 };
  const seen = new Set<number>();
  for (const { option: index, strings } of counts) {
    const option = model.options[index];
    if (!option || seen.has(index) || !Number.isInteger(strings) || strings < 0 || strings > option.maxStrings)
      return null;
    seen.add(index);
    if (strings === 0) continue;
    totals.cost += option.costs[strings]!;
    totals.capacity += option.capacity * strings;
    totals.volume += option.volume * strings;
    totals.mass += option.mass * strings;
    totals.units += option.units * strings;
    totals.types += 1;
  }
  const used = counts.filter(({ strings }) => strings > 0).map(({ option }) => option);
  totals.cost += shipmentCost(model, used);
  return totals;
}

/** Least capacity that counts as meeting the requirement, F. */
export const capacityNeeded = (requirement: number): number => requirement * (1 - FIT_TOLERANCE);
/** Most of a quantity that counts as under its ceiling. */
export const roomUnder = (ceiling: number): number => ceiling * (1 + FIT_TOLERANCE);

/** Whether the blend can be bought and meets the need, every ceiling, the type limit and "a part in one way only". */
export function isFittingBlend(model: BlendModel, counts: readonly BlendCount[]): boolean {
  const totals = blendTotals(model, counts);
  if (totals === null) return false;
  const used = counts.filter(({ strings }) => strings > 0);
  const parts = new Set(used.map(({ option }) => model.options[option]!.partIndex));
  return (
    totals.capacity >= capacityNeeded(model.requirement) &&
    totals.volume <= roomUnder(model.ceilings.volume) &&
    totals.mass <= roomUnder(model.ceilings.mass) &&
    totals.units <= roomUnder(model.ceilings.units) &&
    totals.types <= model.maxTypes &&
    parts.size === used.length
  );
}

/** Counts in the order of the options, without the zeros: the one way a blend is written down. */
export const tidyCounts = (counts: readonly BlendCount[]): readonly BlendCount[] =>
  counts.filter(({ strings }) => strings > 0).sort((a, b) => a.option - b.option);
