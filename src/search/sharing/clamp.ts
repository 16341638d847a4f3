// What clamp diodes of one arrangement must stand, when a dump would reverse a unit beyond what it may see.

import { type ClampDiode, clampDiode, reversedByHold, reversedMix } from "../../bank/index.ts";
import { unitLimit } from "../candidate.ts";
import { fullVoltage, holdCaseOf, type RestingBank } from "./holdCase.ts";

export interface BankClamp extends Omit<ClampDiode, "reverseVoltage"> {
  /** Greatest voltage that each blocks while the bank is charged, V; null when sharing is not assessed. */
  readonly reverseVoltage: number | null;
  /** Stage voltages before the dump, V: of the stage that empties first, and of each other; null when the tolerance is unknown. */
  readonly before: { readonly victim: number; readonly others: number } | null;
  /** What was taken to limit the dump's current; null: nothing is known to, so surge and action are unknown. */
  readonly through: { readonly kind: "dump resistor" | "units' ESR"; readonly ohms: number } | null;
  /** false: the catalogue does not say whether the unit is polarised; the diodes are needed if it is. */
  readonly polarityKnown: boolean;
}

export interface ClampInput extends RestingBank {
  readonly share: { readonly charging: number | null; readonly holding: number | null };
}

/** Reverse that is rounding, as a part of the bank's voltage. */
const NOTHING = 1e-12;

/** The duty; null when no clamp is needed: one in series, not polarised, nothing reversed, or within the unit's reverse rating. */
export function clampOf(bank: ClampInput): BankClamp | null {
  const { result, unit, brief, share } = bank;
  const { series: n, parallel: p, ties } = result;
  if (n === 1 || unit.polarised === false) return null;
  const volts = fullVoltage(brief);
  const count = ties === "cross-tied" ? n : n * p;
  const reverseVoltage =
    share.charging === null || share.holding === null ? null : Math.max(share.charging, share.holding);
  const polarityKnown = unit.polarised !== undefined;
  const open = { count, reverseVoltage, surgeCurrent: null, action: null, before: null, through: null, polarityKnown };
  if (unit.tolerance === undefined) return open;
  const { low, high } = unit.tolerance;
  const { victim, others } = beforeDump(bank, volts);
  const ratio = (1 - low) / (1 + high);
  // Charge of the victim less what the same charge leaves on the others: below zero it is reversed.
  const given = holdCaseOf(bank);
  const held = given === null ? 0 : -reversedByHold(given).voltage;
  const reverse = Math.max((volts * (1 / ratio)) / (1 / ratio + n - 1) - victim, held);
  if (reverse <= NOTHING * volts) return null;
  if (polarityKnown && unit.reverseVoltage !== undefined && reverse <= unit.reverseVoltage * (1 + 1e-9)) return null;
  const dump = brief.dumpResistance;
  const esr = dump === undefined ? (unit.esr ?? null) : null;
  const duty = clampDiode({
    ties,
    n,
    p,
    C: unit.capacitance,
    tLow: low,
    tHigh: high,
    victim,
    others,
    worstVoltage: reverseVoltage ?? unitLimit(unit, brief),
    dumpResistance: dump ?? 0,
    esr,
  });
  const through =
    dump !== undefined
      ? { kind: "dump resistor" as const, ohms: dump }
      : esr === null
        ? null
        : { kind: "units' ESR" as const, ohms: esr };
  return { ...duty, reverseVoltage, before: { victim, others }, through, polarityKnown };
}

/** Equal sharing, or what unequal leakage and resistors make of the hold when that reverses more; the others all at their greatest capacitance. */
function beforeDump(bank: RestingBank, volts: number): { readonly victim: number; readonly others: number } {
  const { series: n } = bank.result;
  const even = { victim: volts / n, others: volts / n };
  const given = holdCaseOf(bank);
  if (given === null) return even;
  const { before } = reversedMix(given, 0);
  return before < even.victim ? { victim: before, others: (volts - before) / (n - 1) } : even;
}
