/*
 * Figures of one bank that several sections share.
 *
 *   symbol  in code          unit  meaning
 *   V       voltage          V     charge voltage with overshoot
 *   C       capacitance      F     of the whole bank, at its high end; null when the tolerance is unknown
 *   n R     chain            ohm   one whole balancing chain, at the high end of its tolerance; null without one
 *   -       chains           1     how many: one when cross-tied, one for each string
 *   Vs      clear            V     below it the governing rule is cleared for good
 *
 * Source: [methods-derived] 3.1 for the times.
 */

import { bleedPaths, clearingOf, type RuleId, ruleOf } from "../hazard/index.ts";
import type { SheetInput } from "./input.ts";

export interface Facts {
  readonly voltage: number;
  readonly capacitance: number | null;
  readonly chain: number | null;
  readonly chains: number;
  readonly dump: number | null;
  readonly clear: number;
  /** s that the governing rule gives; null when it gives none. */
  readonly allowed: number | null;
  /** What governs, in words. */
  readonly rule: string;
  /** J stored at V, C at its high end. */
  readonly stored: number | null;
}

/** The rule's name with where it stands: "NFPA 70E Article 360 (2021, 2024)". */
export const ruleName = (id: RuleId): string => {
  const { body, clause, edition } = ruleOf(id);
  return [body, clause, edition === "" ? "" : `(${edition})`].filter((part) => part !== "").join(" ");
};

/** The name, and how far its text was read where that is not the whole way. */
export function toldRule(id: RuleId): string {
  const { tag } = ruleOf(id);
  const read = { read: "", "second hand": ", second hand", memory: ", from memory: confirm against the text" }[tag];
  return `${ruleName(id)}${read}`;
}

export function factsOf({ layout, brief, rule }: SheetInput): Facts {
  const voltage = brief.voltage * (1 + brief.overshoot);
  const capacitance = layout.capacitance.high;
  const { balance, series } = layout;
  const clearing = rule === null ? null : clearingOf(ruleOf(rule), capacitance ?? layout.capacitance.nominal);
  const own = brief.touchSafeRule
    ? `the brief's touch-safe voltage (${brief.touchSafeRule})`
    : "the brief's touch-safe voltage";
  return {
    voltage,
    capacitance,
    chain: balance === null ? null : balance.resistance * (1 + balance.tolerance) * series,
    chains: balance === null ? 0 : balance.positions / series,
    dump: brief.dumpResistance ?? null,
    clear: clearing?.voltage ?? brief.touchSafe,
    allowed: clearing?.seconds ?? null,
    rule: rule === null ? own : toldRule(rule),
    stored: capacitance === null ? null : (capacitance * voltage ** 2) / 2,
  };
}

/** Seconds from a voltage to another by each path alone; null where C is not known, or there is no such path. */
export interface Ways {
  readonly chains: number | null;
  readonly oneOpen: number | null;
  readonly dump: number | null;
}

export interface Fall {
  readonly from: number;
  readonly to: number;
}

/** `capacitance` and `chain` may stand in for the bank's own: those of a bank with a fault. */
export function waysDown(facts: Pick<Facts, "capacitance" | "chain" | "chains" | "dump">, { from, to }: Fall): Ways {
  const { capacitance, chain, chains, dump } = facts;
  if (capacitance === null) return { chains: null, oneOpen: null, dump: null };
  const paths = bleedPaths({
    capacitance,
    voltage: from,
    safeVoltage: to,
    chainResistance: chain ?? Number.POSITIVE_INFINITY,
    chains,
    ...(dump === null ? {} : { dump }),
  });
  return { chains: paths.chains, oneOpen: paths.oneOpen, dump: paths.dump };
}
