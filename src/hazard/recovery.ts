/*
 * The voltage that comes back after a short, because the dielectric still holds charge.
 *
 *   symbol  name         unit  range
 *   Vk      soak         V     >= 0, voltage that the bank was held at
 *   C       capacitance  F     > 0
 *
 *   wet aluminium electrolytics: 0.10 Vk to 0.15 Vk; others: up to about 0.10 Vk, from no known least.
 * Nothing here says how soon; minutes is usual (common practice, no source). A shorting strap is the only remedy.
 * Double-layer units were not looked up: they are taken as electrolytics, `assumed`.
 * Source: [absorption-notes] second hand; [Moore-electrostatics] second hand.
 */

import { energyClass } from "./energyClass.ts";
import type { HowRead } from "./rule.ts";
import { ruleOf } from "./rules.ts";

export interface Recovery {
  /** V; null where the sources give no least. */
  readonly low: number | null;
  readonly high: number;
  /** J at the high voltage. */
  readonly energy: number;
  /** By the tiers of stored energy, at the high voltage. */
  readonly hazardous: boolean;
  readonly ruleId: "absorption-electrolytic" | "absorption-other";
  readonly tag: HowRead;
}

/** What may come back after a dump from `soak` volts. Source: [absorption-notes], [Moore-electrostatics]. */
export function recovery(bank: {
  readonly soak: number;
  readonly capacitance: number;
  readonly polarised: boolean;
}): Recovery {
  const ruleId = bank.polarised ? "absorption-electrolytic" : "absorption-other";
  const rule = ruleOf(ruleId);
  const shares = rule.limits.map((limit) => limit.value);
  const high = Math.max(...shares) * bank.soak;
  const energy = (bank.capacitance * high ** 2) / 2;
  return {
    low: shares.length > 1 ? Math.min(...shares) * bank.soak : null,
    high,
    energy,
    hazardous: energyClass({ energy, voltage: high }).hazardous,
    ruleId,
    tag: rule.tag,
  };
}
