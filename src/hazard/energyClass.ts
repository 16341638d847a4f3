/*
 * How hazardous the energy that a bank stores is, by tiers of voltage.
 *
 *   symbol  name      unit  range
 *   E       energy    J     >= 0
 *   V       voltage   V     >= 0
 *
 * A tier holds from its lowest voltage on; where two hold, the one with the lower energy does. At the limit itself it is
 * hazardous: whether the text means "over" or "at or over" was not read, so the safe reading is taken, and said.
 * Arc blast (10 kJ at 100 V and above) is a flag apart: it adds to a hazard, it does not replace the tiers.
 * Source: [NFPA-70E] Article 360, second hand; [LBNL-hazard] tables 2.2.13, 2.3.3, 2.3.5.
 */

import type { Limit } from "./rule.ts";
import { type RuleId, ruleOf } from "./rules.ts";

export interface Tier {
  /** V, inclusive. */
  readonly fromVoltage: number;
  /** J; hazardous at this energy and above. */
  readonly energy: number;
}

export interface EnergyClass {
  readonly hazardous: boolean;
  /** J, the threshold of the tier that holds at this voltage. */
  readonly threshold: number;
  readonly tier: Tier;
  readonly ruleId: RuleId;
  /** How the limit was read, to be shown beside the verdict. */
  readonly reading: "at or over";
  readonly arcBlast: boolean;
  /** By the laxer 10 J figure; shown so that a reader sees that the rules differ. */
  readonly shockByTenJoule: boolean;
}

const tiersOf = (limits: readonly Limit[]): readonly Tier[] =>
  limits
    .filter((limit) => limit.quantity === "energy")
    .map((limit) => ({ fromVoltage: limit.at?.from ?? 0, energy: limit.value }));

/** Tiers of NFPA 70E Article 360, lowest voltage first. Source: [NFPA-70E] Article 360, second hand. */
export const ARTICLE_360: readonly Tier[] = tiersOf(ruleOf("nfpa-70e-360").limits);

const over = (id: RuleId, energy: number, voltage: number): boolean =>
  tiersOf(ruleOf(id).limits).some((tier) => voltage >= tier.fromVoltage && energy >= tier.energy);

/** The tier that holds at a voltage: of those it has reached, the strictest. Range: voltage >= 0. */
export function tierAt(voltage: number, tiers: readonly Tier[] = ARTICLE_360): Tier {
  const reached = tiers.filter((tier) => voltage >= tier.fromVoltage);
  return reached.reduce((strict, tier) => (tier.energy < strict.energy ? tier : strict));
}

/** The class of E joules at V volts. Range: E, V >= 0, finite. Source: [NFPA-70E], [LBNL-hazard]. */
export function energyClass({ energy, voltage }: { readonly energy: number; readonly voltage: number }): EnergyClass {
  const tier = tierAt(voltage);
  return {
    hazardous: energy >= tier.energy,
    threshold: tier.energy,
    tier,
    ruleId: "nfpa-70e-360",
    reading: "at or over",
    arcBlast: over("lbnl-arc-blast", energy, voltage),
    shockByTenJoule: over("lbnl-shock", energy, voltage),
  };
}
