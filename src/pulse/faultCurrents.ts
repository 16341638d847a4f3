/*
 * Peak amperes of the fault loops. Each loop is a series R-L-C; what is unknown is left out, so the figure is an upper bound,
 * and with nothing known in the loop there is no figure at all.
 *
 *   loop        capacitance                 resistance                               inductance
 *   unit short  cross-tied (m - 1)C         (r + R_i)/(m - 1) + R_i + R_f            (l + L_s)/(m - 1) + L_s
 *               strings     C1 C2/(C1 + C2) (r + R_i)(n/(m - 1) + n - 1) + R_i + R_f l (n/(m - 1) + n - 1) + L_s/(m - 1) + L_s
 *   row short   cross-tied m C              (r + R_i)/m                              (l + L_s)/m
 *   load short  m C/n                       n (r + R_i)/m + bus                      n l/m + bus; L_s n/m cross-tied, L_s/m strings
 *
 * r, l ESR and ESL of one unit; R_i isolating resistor of each unit; L_s section inductance of each unit (of each string);
 * R_f what the shorted unit itself still resists with, none unless told: its own r and l are left out, for the short may sit
 * at its terminals. Source: [methods-derived].
 */
import { chargingLeast } from "../bank/index.ts";
import { type FaultBank, shortCaseOf, worstBefore } from "./faultBank.ts";
import { peakCurrentOf } from "./peaks.ts";
import { drivingCapacitance } from "./shortedUnit.ts";
import type { Bound } from "./verdict.ts";

/** Amperes and what they are, or null when nothing in the loop is known to limit them. */
export interface FaultCurrent {
  readonly amperes: number;
  readonly bound: Bound;
}

/** Resistance of a fault loop [ohm]; null when any of it is unknown. */
export interface FaultLoop {
  readonly capacitance: number;
  readonly voltage: number;
  readonly resistance: number;
  readonly inductance: number;
  readonly resistanceKnown: boolean;
  readonly inductanceKnown: boolean;
}

function loopOf(
  bank: FaultBank,
  parts: {
    capacitance: number;
    voltage: number;
    /** Units in series, as the loop sees them. */
    units: number;
    /** The same of section inductances; left out: as many as units. */
    sections?: number;
    /** The leg of the shorted unit itself. */
    faulted?: boolean;
    bus?: boolean;
  },
): FaultLoop {
  const { esr = null, esl = null } = bank.unit;
  const isolating = bank.isolatingResistance ?? 0;
  const section = bank.sectionInductance ?? 0;
  const own = parts.faulted ? 1 : 0;
  const bus = parts.bus ? (bank.bus ?? null) : { resistance: 0, inductance: 0 };
  return {
    capacitance: parts.capacitance,
    voltage: parts.voltage,
    resistance:
      ((esr ?? 0) + isolating) * parts.units + own * (isolating + (bank.shortResistance ?? 0)) + (bus?.resistance ?? 0),
    inductance: (esl ?? 0) * parts.units + section * ((parts.sections ?? parts.units) + own) + (bus?.inductance ?? 0),
    resistanceKnown: esr !== null && bus !== null,
    inductanceKnown: esl !== null && bus !== null,
  };
}

/** The loop of a shorted unit; null when there is no neighbour to feed it. */
export function unitShortLoop(bank: FaultBank): FaultLoop | null {
  const { series: n, parallel: m, ties } = bank;
  if (m < 2) return null;
  const tied = ties === "cross-tied" || n === 1;
  const units = tied ? 1 / (m - 1) : n / (m - 1) + n - 1;
  return loopOf(bank, {
    capacitance: drivingCapacitance(shortCaseOf(bank)),
    voltage: worstBefore(bank),
    units,
    sections: 1 / (m - 1),
    faulted: true,
  });
}

/** The loop of a shorted stage (cross-tied); of a string shorted end to end (strings), fed by the other strings. */
export function rowShortLoop(bank: FaultBank): FaultLoop | null {
  const { series: n, parallel: m, ties, unit, voltage } = bank;
  if (ties === "cross-tied" || n === 1) {
    return loopOf(bank, { capacitance: m * unit.capacitance, voltage: worstBefore(bank), units: 1 / m });
  }
  if (m < 2) return null;
  return loopOf(bank, {
    capacitance: ((m - 1) * unit.capacitance) / n,
    voltage,
    units: n / (m - 1),
    sections: 1 + 1 / (m - 1),
  });
}

/** The loop of a short across the bus. */
export function loadShortLoop(bank: FaultBank): FaultLoop {
  const { series: n, parallel: m, ties, unit, voltage } = bank;
  const sections = ties === "cross-tied" || n === 1 ? n / m : 1 / m;
  return loopOf(bank, { capacitance: (m * unit.capacitance) / n, voltage, units: n / m, sections, bus: true });
}

/** Peak of a fault loop; null when nothing known limits it, or there is no loop. Source: [Cona] closed form. */
export function faultPeak(loop: FaultLoop | null): FaultCurrent | null {
  if (loop === null || (loop.resistance === 0 && loop.inductance === 0)) return null;
  const known = loop.resistanceKnown && loop.inductanceKnown;
  return { amperes: peakCurrentOf(loop, loop.voltage), bound: known ? "value" : "upper bound" };
}

/** Action that a fault loop can drive [A^2 s], its energy over its resistance; null when the resistance is not known. */
export function faultAction(loop: FaultLoop | null): number | null {
  if (loop === null || !loop.resistanceKnown || loop.resistance === 0) return null;
  return (loop.capacitance * loop.voltage ** 2) / 2 / loop.resistance;
}

/**
 * Action that the neighbours surely drive through a shorted unit [A^2 s]: the least share while charging, every unit low. A stage that
 * leaked down in a hold has less, and less to pour. null when resistance or tolerance is not known. Source: [methods-derived].
 */
export function leastFaultAction(bank: FaultBank): number | null {
  const { unit, series, voltage, leastVoltage = voltage } = bank;
  const { toleranceLow: low, toleranceHigh: high } = unit;
  if (low === undefined || high === undefined) return null;
  const worstCharging = chargingLeast(leastVoltage, series, { low, high });
  const weakest = { ...unit, capacitance: unit.capacitance * (1 - low) };
  return faultAction(unitShortLoop({ ...bank, unit: weakest, worstCharging, worstHolding: null }));
}
