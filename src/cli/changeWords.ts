// The least changes that would make something fit, in words.

import { visible } from "../order/index.ts";
import { type Dimension, formatQuantity } from "../quantity/index.ts";
import type { Change } from "../search/index.ts";

const NAMES: Readonly<Record<string, readonly [name: string, dimension: Dimension]>> = {
  energy: ["the energy of a pulse", "energy"],
  voltage: ["the charge voltage", "voltage"],
  ripple: ["the allowed fall", "fraction"],
  derating: ["the derating", "fraction"],
  maxSeries: ["the most in series", "count"],
  maxUnits: ["the most units", "count"],
  maxCost: ["the most it may cost", "count"],
  maxVolume: ["the most room", "volume"],
  maxMass: ["the most mass", "mass"],
  maxPeakCurrent: ["the most peak current of a unit", "current"],
  maxSlew: ["the most slew of a unit", "slew"],
  maxReversal: ["the most reversal", "fraction"],
  maxRms: ["the most rms current of a unit", "current"],
  maxTemperatureRise: ["the most rise in K of a unit", "count"],
  maxFaultEnergy: ["the most energy into a shorted unit", "energy"],
  minLife: ["the least life", "count"],
};

/** One sentence; `currency` is that of the plan. */
export function changeWords({ field, from, to, layout, note }: Change, currency: string | null): string {
  const then = `then ${visible(layout)} fits`;
  if (field === "available")
    return `have ${to} of ${visible(note)} to buy${from === null ? "" : ` instead of ${from}`}: ${then}`;
  const [name, own] = NAMES[field] ?? [field, "count" as const];
  // a limit that was asked as a part of the unit's rating stays one
  const dimension = note === "rating" ? "fraction" : own;
  const unit = field === "maxCost" && currency !== null ? ` ${currency}` : "";
  const show = (x: number): string =>
    `${formatQuantity(x, dimension, { digits: dimension === "count" ? 8 : 4 })}${unit}`;
  const way = from === null || to > from ? "raise" : "lower";
  return `${way} ${name} ${from === null ? "" : `from ${show(from)} `}to ${show(to)}: ${then}`;
}
