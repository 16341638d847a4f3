// Prices of volume, mass and units that serve the capacity bound best; those of the Lagrangian bound need not.
import { pricesFrom } from "./ascent.ts";
import {
  buildCapacityBound,
  type CapacityBound,
  MOST_LAYERS,
  penalty,
  rootBound,
  stepsFor,
  stepsOf,
} from "./capacityBound.ts";
import type { Core } from "./core.ts";
import type { Multipliers } from "./dual.ts";
import { climb } from "./ellipsoid.ts";

/** Volume, mass and units (fractions of their ceilings) of the blend behind the root of the bound. */
export function rootBlend(
  core: Core,
  bound: CapacityBound,
): { readonly volume: number; readonly mass: number; readonly units: number } {
  const { table, steps, prices } = bound;
  const counted = core.maxTypesHere <= MOST_LAYERS;
  const sum = { volume: 0, mass: 0, units: 0 };
  let types = core.maxTypesHere;
  let step = stepsFor(bound, 1);
  core.columns.forEach((column, from) => {
    const here = table[bound.row(from, types) + step]!;
    if (step === 0 || here === table[bound.row(from + 1, types) + step]!) return;
    const each = penalty(prices, column);
    for (const strings of column.strings) {
      const rest = Math.max(0, step - stepsOf(column, strings, steps));
      const price = column.costs[strings]! + each * strings;
      if (here !== price && here !== table[bound.row(from + 1, counted ? types - 1 : types) + rest]! + price) continue;
      sum.volume += strings * column.volume;
      sum.mass += strings * column.mass;
      sum.units += strings * column.units;
      if (here === price) step = 0;
      else step = rest;
      types -= counted ? 1 : 0;
      return;
    }
  });
  return sum;
}

/** Prices of the ceilings under which the bound, counted in few steps, stands highest. */
export function pricedCeilings(core: Core, steps: number): Multipliers {
  const { capacity, volume, mass, units } = core.prices;
  const live = [1, 2, 3].filter((row) => core.columns.some((c) => [0, c.volume, c.mass, c.units][row]! > 0));
  if (live.length === 0) return core.prices;
  const top = climb(
    {
      look: (at, slope) => {
        const bound = buildCapacityBound(core, steps, pricesFrom(1, at));
        const blend = rootBlend(core, bound);
        slope.set([0, blend.volume - 1, blend.mass - 1, blend.units - 1]);
        return rootBound(core, bound);
      },
      live,
      enough: Number.POSITIVE_INFINITY,
      fine: 1e-4 * capacity,
    },
    [capacity, volume, mass, units],
    0.3 * capacity,
    9 * live.length,
  );
  return pricesFrom(1, top.at);
}
