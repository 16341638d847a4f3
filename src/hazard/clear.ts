/*
 * How long a bank that bleeds through a resistor stays hazardous by a rule of tiers.
 *
 *   symbol  name         unit  range
 *   C       capacitance  F     > 0
 *   R       resistance   ohm   > 0, Infinity when the path is open
 *   V0      voltage      V     >= 0
 *
 *   V(t) = V0 exp(-t/RC); hazardous while C V^2/2 >= threshold(V).
 * The threshold jumps at the tiers' edges, so the bank may pass from hazardous to clear and back: each tier is hazardous
 * from max(its lowest voltage, sqrt(2 threshold/C)) up to the next tier, and the lowest such voltage is the last to go.
 * Holds for constant R and C; recovery voltage comes on top. Source: [methods-derived] 3.3; [textbook] exponential decay.
 */

import { ARTICLE_360, type Tier } from "./energyClass.ts";

/** The voltage below which no tier is ever hazardous again, V; Infinity when C is too small for any. Range: C > 0. */
export function clearingVoltage(capacitance: number, tiers: readonly Tier[] = ARTICLE_360): number {
  const ladder = [...tiers].sort((a, b) => a.fromVoltage - b.fromVoltage);
  // A stricter tier below keeps holding: the threshold never rises with voltage, so a tier that is hazardous only from where the next
  // begins is never the lowest.
  const from = ladder.map((tier, index) => {
    const energy = Math.min(...ladder.slice(0, index + 1).map((one) => one.energy));
    return Math.max(tier.fromVoltage, Math.sqrt((2 * energy) / capacitance));
  });
  return Math.min(...from);
}

/**
 * Seconds after which the rule is cleared for good; 0 when it was never hazardous, Infinity when the path is open.
 * At that very instant the limit is just met; every moment after it is clear.
 * Range: C, R > 0, V0 >= 0. Source: [methods-derived] 3.3.
 */
export function timeUntilClear(
  bank: { readonly capacitance: number; readonly resistance: number; readonly voltage: number },
  tiers: readonly Tier[] = ARTICLE_360,
): number {
  const clear = clearingVoltage(bank.capacitance, tiers);
  if (bank.voltage <= clear) return 0;
  return bank.resistance * bank.capacitance * Math.log(bank.voltage / clear);
}
