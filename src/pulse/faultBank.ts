// What the fault table must know of a bank, and the figures of it that several faults share.
import type { HoldCase, Ties } from "../bank/index.ts";
import type { BusPath } from "./busPath.ts";
import type { Fuse } from "./fuse.ts";
import type { ShortCase } from "./shortedUnit.ts";
import type { Bound } from "./verdict.ts";

/** One unit as the fault table sees it; SI, null or left out is unknown. */
export interface FaultUnit {
  readonly capacitance: number;
  readonly ratedVoltage: number;
  readonly surgeVoltage?: number | null;
  readonly toleranceLow?: number;
  readonly toleranceHigh?: number;
  readonly esr?: number | null;
  readonly esl?: number | null;
  /** Energy from outside that the case is known to hold [J]. */
  readonly ruptureEnergy?: number | null;
  /** Action integral that one shot may drive through it [A^2 s]. */
  readonly action?: number | null;
}

/** A bank and what guards it. `worstCharging`, `worstHolding`: highest voltage of any unit before a fault [V]. */
export interface FaultBank {
  readonly series: number;
  readonly parallel: number;
  readonly ties: Ties;
  readonly unit: FaultUnit;
  readonly voltage: number;
  /** The same without the charger's overshoot [V]; left out: none. */
  readonly leastVoltage?: number;
  readonly worstCharging: number;
  readonly worstHolding: number | null;
  /** Resistor in series with each unit [ohm]; left out or null: none. */
  readonly isolatingResistance?: number | null;
  /** Inductance in series with each unit of a stage, or with each string [H]; left out or null: none. */
  readonly sectionInductance?: number | null;
  /** What a shorted unit itself still resists with [ohm]; left out or null: not told. */
  readonly shortResistance?: number | null;
  /** Fuse in series with each unit; left out or null: none. */
  readonly fuse?: Fuse | null;
  /** Bus up to the point of a load short; left out or null: unknown. */
  readonly bus?: BusPath | null;
  /** The normal shot: bank peak [A], action through the worst unit [A^2 s], heat in one unit [J]. */
  readonly shot?: {
    readonly peakCurrent: number | null;
    readonly unitAction: number | null;
    readonly unitHeat: number | null;
    /** The same with the overshoot and everything that spreads at its worst, and what that current is; left out: not told. */
    readonly highest?: { readonly peakCurrent: number | null; readonly unitHeat: number | null; readonly bound: Bound };
  } | null;
  /** Balancing resistor of one position [ohm] and the hold [s] (null: for ever); null: none fitted; left out: not told. */
  readonly balance?: { readonly resistance: number; readonly hold: number | null } | null;
  /** The hold of the sound bank; null or left out: its leakage or tolerance is unknown. */
  readonly hold?: HoldCase | null;
  /** Highest voltage the charger can reach when it runs on [V]; left out or null: unknown. */
  readonly chargerHighest?: number | null;
}

/** Highest voltage of any unit before the fault [V]. */
export const worstBefore = ({ worstCharging, worstHolding }: FaultBank): number =>
  Math.max(worstCharging, worstHolding ?? 0);

/** The short case of a bank at its worst unit voltage. */
export const shortCaseOf = (bank: FaultBank): ShortCase => ({
  series: bank.series,
  parallel: bank.parallel,
  ties: bank.ties,
  capacitance: bank.unit.capacitance,
  voltage: bank.voltage,
  worst: worstBefore(bank),
});

/** Highest share [V] when `units` of one stage face `stages` others of `others` units each, at the corner of the tolerance. */
export function cornerShare(
  bank: FaultBank,
  counts: { readonly units: number; readonly others: number; readonly stages: number },
): number {
  const high = (1 + (bank.unit.toleranceHigh ?? 0)) * counts.others;
  const low = (1 - (bank.unit.toleranceLow ?? 0)) * counts.units;
  return (bank.voltage * high) / (high + counts.stages * low);
}

/** The bank with every unit at its high capacitance, as far as the tolerance is known. */
export const atHigh = (bank: FaultBank): FaultBank => ({
  ...bank,
  unit: { ...bank.unit, capacitance: bank.unit.capacitance * (1 + (bank.unit.toleranceHigh ?? 0)) },
});
