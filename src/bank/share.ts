// Worst voltage of one unit in a series string: while charging, while holding, and what a dump leaves.
//
// | symbol | in code   | unit | range       | meaning |
// | ------ | --------- | ---- | ----------- | ------- |
// | V      | voltage   | V    | > 0         | charge voltage with overshoot |
// | n      | series    | 1    | >= 1        | stages in series |
// | t_lo, t_hi | low, high | 1 | 0..1      | capacitance lies in C(1 - t_lo) .. C(1 + t_hi) |
// | m      | sharing   | 1    | >= 1        | units that share one balancing resistor |
// | R, q   | resistance, spread | ohm, 1 | > 0, 0..1 | balancing resistor R(1 +- q) |
// | I_L    | leakage   | A    | >= 0        | leakage of one unit, anywhere from 0 to I_L |
// | R_ins  | insulation | ohm | > 0         | insulation of one unit, anywhere from R_ins to none leaking |
//
// Charging: V_1 = V(1 + t_hi)/((1 + t_hi) + (n - 1)(1 - t_lo)), one stage low, the rest high.
// Holding: V_1 (1/(1 + q) + 1/((n - 1)(1 - q))) = V/((n - 1)(1 - q)) + m I_L R, one stage tight with the high resistor, the rest leaky
// with the low ones. A given insulation leaks in proportion to its own stage's voltage.
// Left after a dump from equal sharing: V/n - V_share; the low stage goes negative.
// Holds for equal units within their tolerances, ideal switches. Sources: [joulewright-design] section 3; [methods-derived] 1.2, 1.4, 2.2.

import type { Tolerance } from "../quantity/index.ts";
import { FIT } from "./energy.ts";

/** How much a unit leaks at worst; null is unknown. */
export type Leak =
  | { readonly kind: "current"; readonly amperes: number }
  | { readonly kind: "insulation"; readonly ohms: number };

/** Largest voltage of any stage while charging, V. */
export const chargingWorst = (voltage: number, series: number, { low, high }: Tolerance): number =>
  (voltage * (1 + high)) / (1 + high + (series - 1) * (1 - low));

/** Smallest voltage of any stage while charging (one high, the rest low), V. */
export const chargingLeast = (voltage: number, series: number, { low, high }: Tolerance): number =>
  (voltage * (1 - low)) / (1 - low + (series - 1) * (1 + high));

/** What the lowest-capacitance and highest-capacitance stage keep after a dump from equal sharing, V (low is negative). */
export function leftAfterDump(
  voltage: number,
  series: number,
  tolerance: Tolerance,
): { readonly low: number; readonly high: number } {
  if (series === 1) return { low: 0, high: 0 };
  const even = voltage / series;
  return {
    low: even - chargingWorst(voltage, series, tolerance),
    high: even - chargingLeast(voltage, series, tolerance),
  };
}

export interface HoldingChain {
  readonly voltage: number;
  readonly series: number;
  readonly sharing: number;
  readonly spread: number;
  readonly leak: Leak;
}

/**
 * Largest voltage of any stage after an endless hold, V; at most V. Resistance Infinity means no balancing resistor: then a leaky rest leaves
 * the whole voltage on the tight stage.
 */
export function holdingWorst(chain: HoldingChain, resistance: number): number {
  const { voltage, series, sharing, spread, leak } = chain;
  if (series === 1) return voltage;
  const insulated = leak.kind === "insulation";
  if (resistance === Number.POSITIVE_INFINITY) return insulated || leak.amperes > 0 ? voltage : voltage / series;
  // The formula times (n - 1)(1 - q)(1 + q), which leaves one division.
  const victim = (series - 1) * (1 - spread);
  const rest = 1 + spread;
  if (insulated) {
    const pull = rest * (1 + ((1 - spread) * sharing * resistance) / leak.ohms);
    return (voltage * pull) / (victim + pull);
  }
  const v = (rest * (voltage + victim * sharing * leak.amperes * resistance)) / (victim + rest);
  return Math.min(v, voltage);
}

/** The line V_1 = base + slope R of holdingWorst for a leakage current and at least two in series (V, V/ohm), before it is cut off at V. */
export function holdingLine({ voltage, series, sharing, spread, leak }: HoldingChain): {
  readonly base: number;
  readonly slope: number;
} {
  const victim = (series - 1) * (1 - spread);
  const part = (1 + spread) / (victim + 1 + spread);
  const drawn = leak.kind === "current" ? sharing * leak.amperes : 0;
  return { base: voltage * part, slope: victim * drawn * part };
}

/**
 * Largest balancing resistance for which an endless hold keeps every stage at most `limit`, ohm.
 * Infinity when any does; 0 when none does (the resistor's own spread is too wide, or the limit too low).
 */
export function largestBalance(chain: HoldingChain, limit: number): number {
  const { voltage, series, sharing, spread, leak } = chain;
  const [below, above] = [1 - spread, 1 + spread];
  const reach = limit * ((series - 1) * below + above);
  const room = reach - voltage * above;
  if (leak.kind === "insulation") {
    if (limit >= voltage) return Number.POSITIVE_INFINITY;
    return Math.max(0, (room * leak.ohms) / (below * above * (voltage - limit) * sharing));
  }
  const drawn = (series - 1) * sharing * leak.amperes;
  if (drawn === 0) return room >= -FIT * reach ? Number.POSITIVE_INFINITY : 0;
  return Math.max(0, room / (below * above * drawn));
}
