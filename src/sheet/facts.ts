/*
 * Figures of one bank that several sections share.
 *
 *   symbol  in code          unit  meaning
 *   V       voltage          V     charge voltage with overshoot
 *   C       capacitance      F     of the whole bank, at its high end; null when the tolerance is unknown
 *   n R     chain            ohm   one whole balancing chain, at the high end of its tolerance; null without one
 *   -       chains           1     how many: one when cross-tied, one for each string
 *   Vs      clear            V     what a wait is for: the lowest of the rule's level, the brief's touch-safe voltage and 60 V
 *   Vr      level            V     below it the governing rule alone is cleared for good; Infinity when the bank never breaks it
 * Source: [methods-derived] 3.1
 */

import { clearingOf, ruleOf, TOUCH_SAFE } from "../hazard/index.ts";
import { cell } from "./cells.ts";
import type { SheetInput } from "./input.ts";
import { measuredOf } from "./measured.ts";
import { toldRule } from "./rules.ts";

export interface Facts {
  readonly voltage: number;
  readonly capacitance: number | null;
  readonly chain: number | null;
  readonly chains: number;
  readonly dump: number | null;
  readonly clear: number;
  /** What sets it, in words. */
  readonly clearBy: string;
  readonly level: number;
  /** s that the governing rule gives; null when it gives none. */
  readonly allowed: number | null;
  /** What governs, in words. */
  readonly rule: string;
  /** J stored at V, C at its high end. */
  readonly stored: number | null;
  /** V that the charger reaches when it runs on, and J stored then; null when that is not known. */
  readonly highest: number | null;
  readonly ranOn: number | null;
}

type Bank = Pick<SheetInput, "layout" | "brief" | "rule"> & Partial<Pick<SheetInput, "placed">>;

export function factsOf({ layout, brief, rule, placed = null }: Bank): Facts {
  const voltage = brief.voltage * (1 + brief.overshoot);
  // The tolerance's high end stays where the units were measured: a wait is never shortened by a meter.
  const measured = measuredOf({ layout, placed });
  const read = measured === null ? null : measured.bank * (1 + measured.doubt);
  const capacitance = read === null ? layout.capacitance.high : Math.max(layout.capacitance.high ?? 0, read);
  const { balance, series } = layout;
  const reached = brief.charger?.highest ?? brief.charger?.supply ?? null;
  const highest = reached === null ? null : Math.max(reached, voltage);
  const storedAt = (volts: number | null): number | null =>
    capacitance === null || volts === null ? null : (capacitance * volts ** 2) / 2;
  const clearing = rule === null ? null : clearingOf(ruleOf(rule), capacitance ?? layout.capacitance.nominal);
  const own = brief.touchSafeRule
    ? `the brief's touch-safe voltage (${brief.touchSafeRule})`
    : "the brief's touch-safe voltage";
  const told = rule === null ? own : toldRule(rule);
  // A rule without a level of its own asks for touch-safe; what the brief calls so is not taken above the usual 60 V.
  const level = clearing === null ? brief.touchSafe : (clearing.voltage ?? Math.min(brief.touchSafe, TOUCH_SAFE));
  const clear = Math.min(level, brief.touchSafe, TOUCH_SAFE);
  return {
    voltage,
    capacitance,
    chain: balance === null ? null : balance.resistance * (1 + balance.tolerance) * series,
    chains: balance === null ? 0 : balance.positions / series,
    dump: brief.dumpResistance ?? null,
    clear,
    clearBy: clear === level ? told : setBy({ clear, level, voltage }, told),
    level,
    allowed: clearing?.seconds ?? null,
    rule: told,
    stored: storedAt(voltage),
    highest,
    ranOn: storedAt(highest),
  };
}

/** Why a wait goes below the governing level: a rule that this bank never breaks is no leave to touch it. */
function setBy({ clear, level, voltage }: Pick<Facts, "clear" | "level" | "voltage">, rule: string): string {
  const what = clear === TOUCH_SAFE ? "touch-safe by default" : "the brief's touch-safe voltage";
  return `${what}; ${rule}, ${level < voltage ? `asks only ${cell(level, "voltage")}` : "is never passed by this bank"}`;
}
