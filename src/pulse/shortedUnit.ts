/*
 * One unit shorts: what the others pour into it, and where they then stand.
 *
 *   symbol  name     unit   meaning
 *   n m     series, parallel          C  unit capacitance [F]       V  bank voltage
 *   V_w     worst    V      worst voltage of one unit, charging or holding, before the fault
 *   E_n     energy   J      cross-tied: (m - 1) C V_w^2/2; strings: (1/2) C1 C2/(C1 + C2) V_w^2, C1 = (m - 1)C/n,
 *                           C2 = C/(n - 1), the most that the other strings can spend in refilling the faulted one
 *   held    V/(n - 1)       units left of the faulted chain when the source (or very many strings) holds V
 *   alone   strings, no source: each survivor V m/(m(n - 1) + 1), whole bank V m(n - 1)/(m(n - 1) + 1)
 *   R_i     isolating resistor per unit: peak V_w (m - 1)/(m R_i), the faulted leg takes (m - 1)/m of E_n, each neighbour
 *           leg 1/(m(m - 1)), action through the faulted leg E_n (m - 1)/(m R_i)
 *
 * The short is ideal and instantaneous, at the unit's terminals; equal units; a ringing equalisation can swing survivors up to
 * twice the step. Source: [methods-derived], energy balance checked.
 */
import type { Ties } from "../bank/index.ts";

/** The bank at the moment of the fault. */
export interface ShortCase {
  readonly series: number;
  readonly parallel: number;
  readonly ties: Ties;
  readonly capacitance: number;
  readonly voltage: number;
  readonly worst: number;
}

/** J and V. `own`: the unit's own energy; `neighbours`: what the others pour in. `alone` null when nothing is left standing. */
export interface ShortResult {
  readonly own: number;
  readonly neighbours: number;
  readonly held: number;
  readonly survivorAlone: number;
  readonly bankAlone: number;
}

/** Capacitance that drives the fault loop [F]: the neighbours, in series with what they refill. */
export function drivingCapacitance({ series: n, parallel: m, ties, capacitance }: ShortCase): number {
  if (ties === "cross-tied" || n === 1) return (m - 1) * capacitance;
  const [others, rest] = [((m - 1) * capacitance) / n, capacitance / (n - 1)];
  return (others * rest) / (others + rest);
}

export function shortedUnit(bank: ShortCase): ShortResult {
  const { series: n, parallel: m, ties, capacitance, voltage, worst } = bank;
  const square = worst * worst;
  const strings = m * (n - 1) + 1;
  const alone = ties === "strings" ? (voltage * m) / strings : voltage / n;
  return {
    own: (capacitance * square) / 2,
    neighbours: (drivingCapacitance(bank) * square) / 2,
    held: n > 1 ? voltage / (n - 1) : 0,
    survivorAlone: n > 1 ? alone : 0,
    bankAlone: n > 1 ? alone * (n - 1) : 0,
  };
}

/** What an isolating resistor [ohm] in series with each unit of a cross-tied stage does; null without neighbours. */
export interface Isolation {
  readonly peakCurrent: number;
  readonly faultedLegEnergy: number;
  readonly neighbourLegEnergy: number;
  readonly faultedLegAction: number;
}

export function isolationOf(bank: ShortCase, resistance: number): Isolation | null {
  const m = bank.parallel;
  if (m < 2 || resistance <= 0) return null;
  const { neighbours } = shortedUnit({ ...bank, ties: "cross-tied" });
  return {
    peakCurrent: (bank.worst * (m - 1)) / (m * resistance),
    faultedLegEnergy: (neighbours * (m - 1)) / m,
    neighbourLegEnergy: neighbours / (m * (m - 1)),
    faultedLegAction: (neighbours * (m - 1)) / (m * resistance),
  };
}
