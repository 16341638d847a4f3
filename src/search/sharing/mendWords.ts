// What would mend a missing balancing resistor or an unknown tolerance, as sentences for a finding's note.

import { formatQuantity } from "../../quantity/index.ts";
import type { BalanceMends } from "./mends.ts";

/** "Any one would mend it: ..." ; says so when nothing that was tried does. */
export function mendWords(mends: BalanceMends, series: number): string {
  const { series: more, tolerance, voltage } = mends;
  const ways = [
    more === null ? null : `${more} in series instead of ${series}`,
    tolerance === null ? null : `resistors of ${formatQuantity(tolerance, "fraction")} or tighter`,
    voltage === null ? null : `a charge voltage of at most ${formatQuantity(voltage, "voltage", { rounding: "down" })}`,
  ].filter((way) => way !== null);
  const no = "No balancing resistor of these families keeps the worst unit within its limit.";
  return ways.length === 0
    ? `${no} No more stages, tighter resistor or lower voltage that was tried mends it.`
    : `${no} Any one of these mends it: ${ways.join("; ")}.`;
}

/** The widest even tolerance of capacitance (fraction) with which n in series at V share within the limit; null when none, or n = 1. */
export function widestTolerance(voltage: number, series: number, limit: number): number | null {
  if (series === 1) return null;
  // V (1 + t) <= limit (n - (n - 2) t), solved for t. Source: [methods-derived] 1.2
  const widest = (series * limit - voltage) / (voltage + (series - 2) * limit);
  return widest < 0 ? null : Math.min(widest, 1);
}
