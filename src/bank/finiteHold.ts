// Worst voltage of one stage at the end of a hold of finite time: from the charging share towards the holding share.
//
// Symbols as in share.ts; C unit capacitance (F), T hold time (s), m units sharing a resistor.
// tau = (m C_1 + m C_2/(n - 1)) / (1/R_1 + 1/((n - 1) R_2)); V_1(T) = V_h + (V_c - V_h) e^(-T/tau), the largest over low and high C_1, C_2.
// The chain with one stage unlike the rest is exactly this pair, so nothing is approximated; equal leakage of the rest is the worst case.
// Without resistors the tight stage rises in a straight line by m I_L T/(C_1 + C_2/(n - 1)), at most to V.
// Sources: [joulewright-design] section 3; [methods-derived] 2.1.

import type { Tolerance } from "../quantity/index.ts";
import { worstAtHold } from "./cornersHold.ts";
import { chargingWorst, type HoldingChain, holdingWorst } from "./share.ts";

export interface FiniteHold extends HoldingChain {
  readonly capacitance: number;
  readonly tolerance: Tolerance;
  /** s; Infinity for ever. */
  readonly hold: number;
}

/** Largest voltage of any stage at the end of the hold, V. The charging share, its start, is checked apart. */
export function holdWorst(bank: FiniteHold, resistance: number): number {
  if (bank.hold === Number.POSITIVE_INFINITY || bank.series === 1) return holdingWorst(bank, resistance);
  const { low, high } = bank.tolerance;
  return Math.max(
    atHold(bank, resistance, 1 - low, 1 + high),
    atHold(bank, resistance, 1 + high, 1 - low),
    atHold(bank, resistance, 1 + high, 1 + high),
    atHold(bank, resistance, 1 - low, 1 - low),
  );
}

function atHold(bank: FiniteHold, resistance: number, first: number, rest: number): number {
  const { voltage, series, sharing, spread, leak, capacitance, hold } = bank;
  const others = series - 1;
  const start = (voltage * rest) / (rest + others * first);
  const together = sharing * capacitance * (first + rest / others);
  const g1 = 1 / (resistance * (1 + spread));
  const g2 = 1 / (resistance * (1 - spread)) + (leak.kind === "insulation" ? sharing / leak.ohms : 0);
  const g = g1 + g2 / others;
  if (g === 0) {
    const rise = leak.kind === "current" ? (sharing * leak.amperes * hold) / together : 0;
    return Math.min(start + rise, voltage);
  }
  const end = holdingEnd(bank, resistance);
  return Math.min(end + (start - end) * Math.exp((-hold * g) / together), voltage);
}

/** The end state that the exponential aims at; unlike holdingWorst it may exceed V, which the leak would stop before. */
function holdingEnd({ voltage, series, sharing, spread, leak }: HoldingChain, resistance: number): number {
  const victim = 1 / (resistance * (1 + spread));
  const rest = 1 / (resistance * (1 - spread)) + (leak.kind === "insulation" ? sharing / leak.ohms : 0);
  const drawn = leak.kind === "current" ? sharing * leak.amperes : 0;
  return (voltage * rest + (series - 1) * drawn) / ((series - 1) * victim + rest);
}

/**
 * As holdWorst, or the highest voltage on the way where some of the others low and some high make that higher still, V. In about one hold in
 * seventy it is, by a third of a per cent at most: the time course decides, so a choice is proven by this one.
 */
export function holdHighest(bank: FiniteHold, resistance: number): number {
  if (bank.hold === Number.POSITIVE_INFINITY || bank.series === 1) return holdWorst(bank, resistance);
  const { leak, tolerance } = bank;
  const exact = worstAtHold({
    n: bank.series,
    m: bank.sharing,
    C: bank.capacitance,
    tLow: tolerance.low,
    tHigh: tolerance.high,
    leakage: leak.kind === "current" ? leak.amperes : 0,
    insulation: leak.kind === "insulation" ? leak.ohms : Number.POSITIVE_INFINITY,
    R: resistance === Number.POSITIVE_INFINITY ? null : resistance,
    q: bank.spread,
    V: bank.voltage,
    hold: bank.hold,
  });
  const ends = holdWorst(bank, resistance);
  const start = chargingWorst(bank.voltage, bank.series, tolerance);
  return exact.voltage > Math.max(ends, start) * (1 + 1e-9) ? exact.voltage : ends;
}

/**
 * Largest balancing resistance for which the end of the hold keeps every stage at most `limit`, ohm, by bisection to 1e-9 relative.
 * Infinity when none is needed. `endless` (ohm) is that of an endless hold: what it is where it does no better, or is 0.
 */
export function largestBalanceForHold(bank: FiniteHold, limit: number, endless: number): number {
  // With a limit above all the volts no share is in question; the endless rule still sets a resistor that bleeds.
  if (bank.hold === Number.POSITIVE_INFINITY || limit >= bank.voltage) return endless;
  const safe = (resistance: number): boolean => holdWorst(bank, resistance) <= limit * (1 + 1e-12);
  if (safe(Number.POSITIVE_INFINITY)) return Number.POSITIVE_INFINITY;
  if (endless <= 0 || !safe(endless)) return endless;
  let low = Math.log(endless);
  let high = Math.log(1e18);
  while (high - low > 1e-9) {
    const middle = (low + high) / 2;
    if (safe(Math.exp(middle))) low = middle;
    else high = middle;
  }
  return Math.exp(low);
}
