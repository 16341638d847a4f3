// When no blend fits: each limit loosened alone, the least change first, in the words of the brief.

import { requiredCapacitance } from "../bank/index.ts";
import { toMajor } from "../quantity/index.ts";
import type { BlendLimits } from "./blend/findBlend.ts";
import { findLoosenings, type Loosening } from "./blend/loosen.ts";
import { type BlendDemand, blendWork } from "./blendOptions.ts";
import type { Loosen } from "./blendResult.ts";
import type { Brief } from "./brief.ts";

const FIELDS: Readonly<Record<Loosening["limit"], Loosen["field"]>> = {
  volume: "maxVolume",
  mass: "maxMass",
  units: "maxUnits",
  ceilings: "all ceilings",
  types: "maxTypes",
  requirement: "energy",
};

/** More units than this are not looked at when the ceiling on units is loosened. */
const MOST_UNITS = 20_000;
/** Above this many string types the searches of this kind would take too long. */
const MOST_TYPES = 400;

/** What would make a blend possible; empty when there are too many parts to try. */
export function loosenBlend(demand: BlendDemand, currency: string | null, limits: BlendLimits): readonly Loosen[] {
  const { brief } = demand.terms;
  // Tables must reach beyond the unit ceiling, or loosening it would change nothing.
  const units = Math.max(brief.maxUnits, Math.min(MOST_UNITS, 10 * brief.maxUnits));
  const { maxVolume: _volume, maxMass: _mass, ...roomy } = brief;
  const open = blendWork({ ...demand, terms: { ...demand.terms, brief: { ...roomy, maxUnits: units } } });
  if (open.types.length === 0 || open.types.length > MOST_TYPES) return [];
  const infinite = Number.POSITIVE_INFINITY;
  const model = {
    ...open.model,
    options: open.model.options.flatMap((option, at) => {
      const { candidate, series } = open.types[at]!;
      // What has no size cannot be held under a ceiling, loosened or not.
      if (brief.maxVolume !== undefined && candidate.volume === null) return [];
      if (brief.maxMass !== undefined && candidate.mass === null) return [];
      const { floor: _floor, ...facts } = option;
      return [
        {
          ...facts,
          costs: option.costs,
          volume: brief.maxVolume === undefined ? 0 : series * (candidate.volume as number),
          mass: brief.maxMass === undefined ? 0 : series * (candidate.mass as number),
        },
      ];
    }),
    ceilings: { volume: brief.maxVolume ?? infinite, mass: brief.maxMass ?? infinite, units: brief.maxUnits },
  };
  if (model.options.length === 0) return [];
  const scale = brief.energy / requiredCapacitance({ ...brief, steady: undefined });
  return (
    findLoosenings(model, limits)
      .map(({ limit, from, to, change, cost, proven }): Loosen => {
        // A bank that gives less energy needs that much less capacitance.
        const energy = limit === "requirement";
        const shown = (value: number): number => (energy ? value * scale : value);
        return {
          field: FIELDS[limit],
          from: energy ? brief.energy : from,
          to: to === null ? null : shown(to),
          change,
          cost: cost === null || currency === null ? null : toMajor(cost, currency),
          proven,
        };
      })
      // A steady current needs its capacitance whatever the energy: then less energy is no way out.
      .filter(({ field }) => field !== "energy" || brief.steady === undefined)
  );
}

/** The one change where only the cost stands in the way; `to` is what the cheapest costs, major money. */
export const costLoosened = (brief: Brief, to: number, proven: boolean): Loosen => ({
  field: "maxCost",
  from: brief.maxCost ?? 0,
  to,
  change: brief.maxCost ? to / brief.maxCost - 1 : null,
  cost: to,
  proven,
});
