/*
 * The voltage below which a bank never breaks a rule again, and the time that the rule gives for getting there.
 *
 *   symbol  name         unit  range
 *   C       capacitance  F     > 0, high end
 *   V       -            V     >= 0
 *
 * Each limit is broken over a stretch of voltage: a voltage over itself, a charge Q over Q/C, an energy E from sqrt(2E/C)
 * on (at the limit counts), a capacitance over it at every voltage of its range; each only within the voltages that it speaks
 * of. The lowest start of any stretch is the clearing voltage. A rule that speaks of a voltage is held to that alone: a charge
 * beside it is an exemption, and is left out, which is the safe side. Source: [methods-derived] 3.2, 3.3.
 */

import type { Limit, Rule } from "./rule.ts";

/** What a rule asks, made ready to be held against time. */
export interface Clearing {
  /** V; null: the rule sets no level of its own (it gives a time, or a share that comes back). */
  readonly voltage: number | null;
  /** s; null: the rule gives no time. The longest where it gives several. */
  readonly seconds: number | null;
}

/** Where the stretch begins over which a limit is broken, V; Infinity when it never is. */
function brokenFrom({ quantity, value, at }: Limit, capacitance: number): number {
  const level: Partial<Record<Limit["quantity"], number>> = {
    voltage: value,
    charge: value / capacitance,
    energy: Math.sqrt((2 * value) / capacitance),
    capacitance: capacitance > value ? 0 : Number.POSITIVE_INFINITY,
  };
  const from = Math.max(level[quantity] ?? Number.POSITIVE_INFINITY, at?.from ?? 0);
  return from < (at?.below ?? Number.POSITIVE_INFINITY) && from <= (at?.upTo ?? Number.POSITIVE_INFINITY)
    ? from
    : Number.POSITIVE_INFINITY;
}

/** The clearing of a rule for a bank of C. Range: capacitance > 0. Source: file head. */
export function clearingOf({ limits }: Pick<Rule, "limits">, capacitance: number): Clearing {
  const volts = limits.filter(({ quantity }) => quantity === "voltage");
  const levels = (volts.length > 0 ? volts : limits).map((limit) => brokenFrom(limit, capacitance));
  const lowest = Math.min(...levels);
  const sets = limits.some(({ quantity }) => ["voltage", "charge", "energy", "capacitance"].includes(quantity));
  const times = limits.flatMap(({ quantity, value }) => (quantity === "time" ? [value] : []));
  return { voltage: sets ? lowest : null, seconds: times.length > 0 ? Math.max(...times) : null };
}
